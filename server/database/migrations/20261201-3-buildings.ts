import { DataTypes } from "sequelize";
import type { Migration } from "../migrate.ts";
import { id, moments, reference } from "./columns.ts";

export const buildingsMigration: Migration = {
  name: "20261201-3-buildings",
  async up(query) {
    await query.createTable("buildings", {
      id,
      farm_id: reference("farms"),
      name: { type: DataTypes.STRING(80), allowNull: false },
      kind: { type: DataTypes.STRING(12), allowNull: false },
      latitude_deg: { type: DataTypes.DOUBLE, allowNull: false },
      longitude_deg: { type: DataTypes.DOUBLE, allowNull: false },
      station_id: {
        type: DataTypes.STRING(40),
        allowNull: true,
        references: { model: "climate_stations", key: "id" },
        onDelete: "SET NULL",
        onUpdate: "CASCADE",
      },
      station_chosen: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      survey_core: { type: DataTypes.JSON, allowNull: false },
      surveyed_at: { type: DataTypes.DATE(3), allowNull: false },
      surveyed_by: reference("people", true),
      ...moments,
    });
    await query.createTable("assemblies", {
      id,
      building_id: reference("buildings"),
      part: { type: DataTypes.STRING(10), allowNull: false },
      cover: { type: DataTypes.JSON, allowNull: false },
      ...moments,
    });
    await query.addIndex("assemblies", ["building_id", "part"], {
      unique: true,
      name: "assemblies_building_part",
    });
    await query.createTable("calendars", {
      id,
      building_id: reference("buildings"),
      month: { type: DataTypes.TINYINT, allowNull: false },
      occupied: { type: DataTypes.BOOLEAN, allowNull: false },
      answers: { type: DataTypes.JSON, allowNull: false },
      ...moments,
    });
    await query.addIndex("calendars", ["building_id", "month"], {
      unique: true,
      name: "calendars_building_month",
    });
    await query.createTable("heaters", {
      id,
      building_id: reference("buildings"),
      position: { type: DataTypes.TINYINT, allowNull: false },
      label: { type: DataTypes.STRING(60), allowNull: false },
      answers: { type: DataTypes.JSON, allowNull: false },
      ...moments,
    });
  },
  async down(query) {
    await query.dropTable("heaters");
    await query.dropTable("calendars");
    await query.dropTable("assemblies");
    await query.dropTable("buildings");
  },
};
