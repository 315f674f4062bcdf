import type { Migration } from "../migrate.ts";
import { peopleMigration } from "./20261201-1-people.ts";
import { farmsMigration } from "./20261201-2-farms.ts";
import { buildingsMigration } from "./20261201-3-buildings.ts";
import { plansMigration } from "./20261201-4-plans.ts";

/** In the order in which they are applied. */
export const migrations: Migration[] = [peopleMigration, farmsMigration, buildingsMigration, plansMigration];
