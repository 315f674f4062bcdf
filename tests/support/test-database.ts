import type { Sequelize } from "sequelize";
import { connect, type DatabaseAddress } from "../../server/database/connection.ts";
import { migrateUp } from "../../server/database/migrate.ts";
import { seedReferenceData } from "../../server/database/seeds/index.ts";
import { forgetStationPlaces } from "../../server/features/climate/station-choice.ts";
import { bindModels } from "../../server/models/associations.ts";

function required(name: string): string {
  const value = process.env[name];
  if (value === undefined) throw new Error(`${name} is missing. Run these tests through npm test.`);
  return value;
}

/** Address of a database of this name on the throw-away server of the test run. */
export function testAddress(name: string): DatabaseAddress {
  return {
    host: required("GLASSBYRE_TEST_DB_HOST"),
    port: Number(required("GLASSBYRE_TEST_DB_PORT")),
    user: required("GLASSBYRE_TEST_DB_USER"),
    password: required("GLASSBYRE_TEST_DB_PASSWORD"),
    name: `glassbyre_test_${name}`,
  };
}

/** An empty database of its own for one test file, made anew. */
export async function emptyDatabase(name: string): Promise<Sequelize> {
  const address = testAddress(name);
  const admin = connect({ ...address, name: "glassbyre" });
  await admin.getQueryInterface().dropDatabase(address.name);
  await admin
    .getQueryInterface()
    .createDatabase(address.name, { charset: "utf8mb4", collate: "utf8mb4_unicode_ci" });
  await admin.close();
  return connect(address);
}

/** The same with all tables and the reference rows. */
export async function preparedDatabase(name: string): Promise<Sequelize> {
  const sequelize = await emptyDatabase(name);
  bindModels(sequelize);
  await migrateUp(sequelize);
  await seedReferenceData();
  forgetStationPlaces();
  return sequelize;
}
