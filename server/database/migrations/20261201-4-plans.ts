import { DataTypes } from "sequelize";
import type { Migration } from "../migrate.ts";
import { id, moments, reference } from "./columns.ts";

export const plansMigration: Migration = {
  name: "20261201-4-plans",
  async up(query) {
    await query.createTable("plans", {
      id,
      building_id: reference("buildings"),
      number: { type: DataTypes.INTEGER, allowNull: false },
      status: { type: DataTypes.STRING(10), allowNull: false, defaultValue: "draft" },
      survey_version: { type: DataTypes.INTEGER, allowNull: false },
      engine_version: { type: DataTypes.STRING(20), allowNull: false },
      choices: { type: DataTypes.JSON, allowNull: false },
      survey: { type: DataTypes.JSON, allowNull: false },
      engine_input: { type: DataTypes.JSON, allowNull: false },
      result: { type: DataTypes.JSON, allowNull: false },
      summary: { type: DataTypes.JSON, allowNull: false },
      proposed_option_id: { type: DataTypes.STRING(60), allowNull: true },
      created_by: reference("people", true),
      sent_at: { type: DataTypes.DATE(3), allowNull: true },
      answered_at: { type: DataTypes.DATE(3), allowNull: true },
      answered_by: reference("people", true),
      ...moments,
    });
    await query.addIndex("plans", ["building_id", "number"], { unique: true, name: "plans_building_number" });
    await query.createTable("plan_messages", {
      id,
      plan_id: reference("plans"),
      author_id: reference("people", true),
      author_role: { type: DataTypes.STRING(10), allowNull: false },
      text: { type: DataTypes.TEXT, allowNull: false },
      answer: { type: DataTypes.STRING(10), allowNull: true },
      ...moments,
    });
    await query.createTable("events", {
      id,
      farm_id: reference("farms"),
      building_id: reference("buildings", true),
      person_id: reference("people", true),
      action: { type: DataTypes.STRING(40), allowNull: false },
      detail: { type: DataTypes.JSON, allowNull: false },
      ...moments,
    });
  },
  async down(query) {
    await query.dropTable("events");
    await query.dropTable("plan_messages");
    await query.dropTable("plans");
  },
};
