import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { StationClimate } from "../engine/climate/station-climate.ts";

/** The normals with what must be said about where they come from. */
export interface StationRecord {
  climate: StationClimate;
  kind: string;
  source: string;
  period: string;
  licence: string;
  note: string;
  globalEstimated: boolean;
}

export class ClimateStation extends Model<
  InferAttributes<ClimateStation>,
  InferCreationAttributes<ClimateStation>
> {
  declare id: string;
  declare name: string;
  declare country: string;
  declare latitudeDeg: number;
  declare longitudeDeg: number;
  declare elevationM: number | null;
  declare record: StationRecord;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static define(sequelize: Sequelize): void {
    ClimateStation.init(
      {
        id: { type: DataTypes.STRING(40), primaryKey: true },
        name: { type: DataTypes.STRING(120), allowNull: false },
        country: { type: DataTypes.CHAR(2), allowNull: false },
        latitudeDeg: { type: DataTypes.DOUBLE, allowNull: false },
        longitudeDeg: { type: DataTypes.DOUBLE, allowNull: false },
        elevationM: { type: DataTypes.DOUBLE, allowNull: true },
        record: { type: DataTypes.JSON, allowNull: false },
        createdAt: DataTypes.DATE(3),
        updatedAt: DataTypes.DATE(3),
      },
      { sequelize, tableName: "climate_stations", modelName: "climateStation" },
    );
  }
}
