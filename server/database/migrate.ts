import { type QueryInterface, QueryTypes, type Sequelize } from "sequelize";
import { SequelizeStorage, Umzug } from "umzug";
import { migrations } from "./migrations/index.ts";

/** One dated change of the tables, with its way back. */
export interface Migration {
  name: string;
  up(query: QueryInterface): Promise<unknown>;
  down(query: QueryInterface): Promise<unknown>;
}

function umzug(sequelize: Sequelize) {
  return new Umzug({
    migrations: migrations.map(({ name, up, down }) => ({
      name,
      up: async () => up(sequelize.getQueryInterface()),
      down: async () => down(sequelize.getQueryInterface()),
    })),
    storage: new SequelizeStorage({ sequelize, modelName: "applied_migrations" }),
    logger: undefined,
  });
}

/** How long to wait for another process that is migrating the same database, s. */
const LOCK_WAIT_S = 60;

/**
 * Brings the tables up to date, under a lock of the database itself, so that two processes started together wait for each
 * other instead of both applying the same change.
 */
export async function migrateUp(sequelize: Sequelize): Promise<void> {
  const name = `${sequelize.getDatabaseName()}.migrate`;
  await sequelize.transaction(async (transaction) => {
    await sequelize.query("SELECT GET_LOCK(:name, :seconds)", {
      replacements: { name, seconds: LOCK_WAIT_S },
      type: QueryTypes.SELECT,
      transaction,
    });
    try {
      await umzug(sequelize).up();
    } finally {
      await sequelize.query("SELECT RELEASE_LOCK(:name)", {
        replacements: { name },
        type: QueryTypes.SELECT,
        transaction,
      });
    }
  });
}

/** Takes every change back, newest first. */
export async function migrateDown(sequelize: Sequelize): Promise<void> {
  await umzug(sequelize).down({ to: 0 });
}
