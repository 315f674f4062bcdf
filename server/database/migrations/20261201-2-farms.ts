import { DataTypes } from "sequelize";
import type { Migration } from "../migrate.ts";
import { id, moments, reference } from "./columns.ts";

export const farmsMigration: Migration = {
  name: "20261201-2-farms",
  async up(query) {
    await query.createTable("climate_stations", {
      id: { type: DataTypes.STRING(40), primaryKey: true },
      name: { type: DataTypes.STRING(120), allowNull: false },
      country: { type: DataTypes.CHAR(2), allowNull: false },
      latitude_deg: { type: DataTypes.DOUBLE, allowNull: false },
      longitude_deg: { type: DataTypes.DOUBLE, allowNull: false },
      elevation_m: { type: DataTypes.DOUBLE, allowNull: true },
      record: { type: DataTypes.JSON, allowNull: false },
      ...moments,
    });
    await query.createTable("farms", {
      id,
      cooperative_id: reference("cooperatives"),
      name: { type: DataTypes.STRING(80), allowNull: false },
      place: { type: DataTypes.STRING(80), allowNull: false },
      latitude_deg: { type: DataTypes.DOUBLE, allowNull: false },
      longitude_deg: { type: DataTypes.DOUBLE, allowNull: false },
      shared_with_manager: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
      ...moments,
    });
    await query.createTable("farm_people", {
      id,
      farm_id: reference("farms"),
      person_id: reference("people"),
      role: { type: DataTypes.STRING(10), allowNull: false },
      ...moments,
    });
    await query.addIndex("farm_people", ["farm_id", "person_id", "role"], {
      unique: true,
      name: "farm_people_farm_person_role",
    });
  },
  async down(query) {
    await query.dropTable("farm_people");
    await query.dropTable("farms");
    await query.dropTable("climate_stations");
  },
};
