import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { BuildingKind } from "../contracts/buildings.ts";
import type { Survey } from "../contracts/survey.ts";

/** The survey without what has tables of its own: covers, months and heaters. */
export type SurveyCore = Omit<Survey, "covers" | "months" | "heaters">;

export class Building extends Model<InferAttributes<Building>, InferCreationAttributes<Building>> {
  declare id: CreationOptional<string>;
  declare farmId: string;
  declare name: string;
  declare kind: BuildingKind;
  declare latitudeDeg: number;
  declare longitudeDeg: number;
  declare stationId: CreationOptional<string | null>;
  declare stationChosen: CreationOptional<boolean>;
  declare version: CreationOptional<number>;
  declare surveyCore: SurveyCore;
  declare surveyedAt: Date;
  declare surveyedBy: CreationOptional<string | null>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static define(sequelize: Sequelize): void {
    Building.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        farmId: { type: DataTypes.UUID, allowNull: false },
        name: { type: DataTypes.STRING(80), allowNull: false },
        kind: { type: DataTypes.STRING(12), allowNull: false },
        latitudeDeg: { type: DataTypes.DOUBLE, allowNull: false },
        longitudeDeg: { type: DataTypes.DOUBLE, allowNull: false },
        stationId: { type: DataTypes.STRING(40), allowNull: true },
        stationChosen: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
        version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
        surveyCore: { type: DataTypes.JSON, allowNull: false },
        surveyedAt: { type: DataTypes.DATE(3), allowNull: false },
        surveyedBy: { type: DataTypes.UUID, allowNull: true },
        createdAt: DataTypes.DATE(3),
        updatedAt: DataTypes.DATE(3),
      },
      { sequelize, tableName: "buildings", modelName: "building" },
    );
  }
}
