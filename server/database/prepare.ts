import { readConfig } from "../config.ts";
import { bindModels } from "../models/associations.ts";
import { connect } from "./connection.ts";
import { seedDemo } from "./demo/seed.ts";
import { migrateUp } from "./migrate.ts";
import { seedReferenceData } from "./seeds/index.ts";

/** Brings tables and reference rows up to date; with `--demo` also fills the demonstration, once. */
const sequelize = connect(readConfig(process.env).database);
bindModels(sequelize);
try {
  await migrateUp(sequelize);
  await seedReferenceData();
  if (process.argv.includes("--demo")) await seedDemo(sequelize);
} finally {
  await sequelize.close();
}
