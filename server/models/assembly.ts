import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { Survey } from "../contracts/survey.ts";

/** A part of the shell that has a cover of its own. */
export type CoverPart = keyof Survey["covers"];

export class Assembly extends Model<InferAttributes<Assembly>, InferCreationAttributes<Assembly>> {
  declare id: CreationOptional<string>;
  declare buildingId: string;
  declare part: CoverPart;
  declare cover: NonNullable<Survey["covers"][CoverPart]>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static define(sequelize: Sequelize): void {
    Assembly.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        buildingId: { type: DataTypes.UUID, allowNull: false },
        part: { type: DataTypes.STRING(10), allowNull: false },
        cover: { type: DataTypes.JSON, allowNull: false },
        createdAt: DataTypes.DATE(3),
        updatedAt: DataTypes.DATE(3),
      },
      { sequelize, tableName: "assemblies", modelName: "assembly" },
    );
  }
}
