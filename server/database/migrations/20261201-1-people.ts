import { DataTypes } from "sequelize";
import type { Migration } from "../migrate.ts";
import { id, moments, reference } from "./columns.ts";

export const peopleMigration: Migration = {
  name: "20261201-1-people",
  async up(query) {
    await query.createTable("cooperatives", {
      id,
      name: { type: DataTypes.STRING(80), allowNull: false },
      country: { type: DataTypes.CHAR(2), allowNull: false },
      ...moments,
    });
    await query.createTable("people", {
      id,
      name: { type: DataTypes.STRING(80), allowNull: false },
      email: { type: DataTypes.STRING(200), allowNull: false, unique: true },
      google_sub: { type: DataTypes.STRING(255), allowNull: true, unique: true },
      units: { type: DataTypes.STRING(4), allowNull: false, defaultValue: "si" },
      theme: { type: DataTypes.STRING(10), allowNull: false, defaultValue: "system" },
      active_role: { type: DataTypes.STRING(10), allowNull: true },
      active_cooperative_id: reference("cooperatives", true),
      last_seen_at: { type: DataTypes.DATE, allowNull: true },
      ...moments,
    });
    await query.createTable("memberships", {
      id,
      person_id: reference("people"),
      cooperative_id: reference("cooperatives"),
      role: { type: DataTypes.STRING(10), allowNull: false },
      ...moments,
    });
    await query.addIndex("memberships", ["person_id", "cooperative_id", "role"], {
      unique: true,
      name: "memberships_person_cooperative_role",
    });
    await query.createTable("login_sessions", {
      sid: { type: DataTypes.STRING(64), primaryKey: true },
      expires: { type: DataTypes.DATE, allowNull: true },
      data: { type: DataTypes.TEXT("medium"), allowNull: true },
      ...moments,
    });
    await query.addIndex("login_sessions", ["expires"], { name: "login_sessions_expires" });
  },
  async down(query) {
    await query.dropTable("login_sessions");
    await query.dropTable("memberships");
    await query.dropTable("people");
    await query.dropTable("cooperatives");
  },
};
