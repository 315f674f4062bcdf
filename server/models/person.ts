import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

import type { Role } from "../contracts/people.ts";

export class Person extends Model<InferAttributes<Person>, InferCreationAttributes<Person>> {
  declare id: CreationOptional<string>;
  declare name: string;
  declare email: string;
  declare googleSub: CreationOptional<string | null>;
  declare units: CreationOptional<"si" | "us">;
  declare theme: CreationOptional<"day" | "evening" | "system">;
  declare activeRole: CreationOptional<Role | null>;
  declare activeCooperativeId: CreationOptional<string | null>;
  declare lastSeenAt: CreationOptional<Date | null>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static define(sequelize: Sequelize): void {
    Person.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        name: { type: DataTypes.STRING(80), allowNull: false },
        email: { type: DataTypes.STRING(200), allowNull: false },
        googleSub: { type: DataTypes.STRING(255), allowNull: true },
        units: { type: DataTypes.STRING(4), allowNull: false, defaultValue: "si" },
        theme: { type: DataTypes.STRING(10), allowNull: false, defaultValue: "system" },
        activeRole: { type: DataTypes.STRING(10), allowNull: true },
        activeCooperativeId: { type: DataTypes.UUID, allowNull: true },
        lastSeenAt: { type: DataTypes.DATE, allowNull: true },
        createdAt: DataTypes.DATE(3),
        updatedAt: DataTypes.DATE(3),
      },
      { sequelize, tableName: "people", modelName: "person" },
    );
  }
}
