import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { SurveyMonth } from "../contracts/survey.ts";

export class CalendarMonth extends Model<
  InferAttributes<CalendarMonth>,
  InferCreationAttributes<CalendarMonth>
> {
  declare id: CreationOptional<string>;
  declare buildingId: string;
  declare month: number;
  declare occupied: boolean;
  declare answers: Omit<SurveyMonth, "occupied">;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static define(sequelize: Sequelize): void {
    CalendarMonth.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        buildingId: { type: DataTypes.UUID, allowNull: false },
        month: { type: DataTypes.TINYINT, allowNull: false },
        occupied: { type: DataTypes.BOOLEAN, allowNull: false },
        answers: { type: DataTypes.JSON, allowNull: false },
        createdAt: DataTypes.DATE(3),
        updatedAt: DataTypes.DATE(3),
      },
      { sequelize, tableName: "calendars", modelName: "calendarMonth" },
    );
  }
}
