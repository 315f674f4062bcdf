import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { Role } from "../contracts/people.ts";
import type { PlanAnswer } from "../contracts/plans.ts";

export class PlanMessage extends Model<InferAttributes<PlanMessage>, InferCreationAttributes<PlanMessage>> {
  declare id: CreationOptional<string>;
  declare planId: string;
  declare authorId: string | null;
  declare authorRole: Role;
  declare text: string;
  declare answer: PlanAnswer | null;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static define(sequelize: Sequelize): void {
    PlanMessage.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        planId: { type: DataTypes.UUID, allowNull: false },
        authorId: { type: DataTypes.UUID, allowNull: true },
        authorRole: { type: DataTypes.STRING(10), allowNull: false },
        text: { type: DataTypes.TEXT, allowNull: false },
        answer: { type: DataTypes.STRING(10), allowNull: true },
        createdAt: DataTypes.DATE(3),
        updatedAt: DataTypes.DATE(3),
      },
      { sequelize, tableName: "plan_messages", modelName: "planMessage" },
    );
  }
}
