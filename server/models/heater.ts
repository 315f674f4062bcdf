import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { SurveyHeater } from "../contracts/survey.ts";

export class Heater extends Model<InferAttributes<Heater>, InferCreationAttributes<Heater>> {
  declare id: CreationOptional<string>;
  declare buildingId: string;
  declare position: number;
  declare label: string;
  declare answers: Omit<SurveyHeater, "label">;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static define(sequelize: Sequelize): void {
    Heater.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        buildingId: { type: DataTypes.UUID, allowNull: false },
        position: { type: DataTypes.TINYINT, allowNull: false },
        label: { type: DataTypes.STRING(60), allowNull: false },
        answers: { type: DataTypes.JSON, allowNull: false },
        createdAt: DataTypes.DATE(3),
        updatedAt: DataTypes.DATE(3),
      },
      { sequelize, tableName: "heaters", modelName: "heater" },
    );
  }
}
