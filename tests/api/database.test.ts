import { DataTypes, QueryTypes } from "sequelize";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { migrateDown, migrateUp } from "../../server/database/migrate.ts";
import { emptyDatabase } from "../support/test-database.ts";

describe("the database", () => {
  let sequelize: Awaited<ReturnType<typeof emptyDatabase>>;
  beforeAll(async () => {
    sequelize = await emptyDatabase("database");
  });
  afterAll(() => sequelize.close());

  const tables = async () => {
    const rows = await sequelize.query<{ TABLE_NAME: string }>(
      "SELECT TABLE_NAME FROM information_schema.TABLES WHERE TABLE_SCHEMA = DATABASE()",
      { type: QueryTypes.SELECT },
    );
    return rows.map((row) => row.TABLE_NAME).sort();
  };

  it("answers raw queries and removes columns through the connector wrapper", async () => {
    const [rows] = await sequelize.query("SELECT 1 + 1 AS two");
    expect(rows).toEqual([{ two: 2 }]);
    const query = sequelize.getQueryInterface();
    await query.createTable("wrapped", {
      id: { type: DataTypes.INTEGER, primaryKey: true },
      gone: DataTypes.INTEGER,
    });
    await query.removeColumn("wrapped", "gone");
    expect(Object.keys(await query.describeTable("wrapped"))).toEqual(["id"]);
    await query.dropTable("wrapped");
  });

  it("goes up, all the way down and up again", async () => {
    await migrateUp(sequelize);
    const first = await tables();
    expect(first).toContain("plans");
    await migrateDown(sequelize);
    expect(await tables()).toEqual(["applied_migrations"]);
    await migrateUp(sequelize);
    expect(await tables()).toEqual(first);
  });

  it("removes a farm with everything below it and nothing beside it", async () => {
    const keys = await sequelize.query<{ TABLE_NAME: string; DELETE_RULE: string }>(
      "SELECT TABLE_NAME, DELETE_RULE FROM information_schema.REFERENTIAL_CONSTRAINTS WHERE CONSTRAINT_SCHEMA = DATABASE() AND REFERENCED_TABLE_NAME IN ('farms', 'buildings', 'plans')",
      { type: QueryTypes.SELECT },
    );
    const cascading = keys.filter((key) => key.DELETE_RULE === "CASCADE").map((key) => key.TABLE_NAME);
    expect(new Set(cascading)).toEqual(
      new Set([
        "assemblies",
        "buildings",
        "calendars",
        "events",
        "farm_people",
        "heaters",
        "plan_messages",
        "plans",
      ]),
    );
  });
});
