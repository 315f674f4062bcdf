import type { AddressInfo } from "node:net";
import { createApp } from "./app.ts";
import { ConfigError, readConfig } from "./config.ts";
import { connect } from "./database/connection.ts";
import { migrateUp } from "./database/migrate.ts";
import { seedReferenceData } from "./database/seeds/index.ts";
import { createLog } from "./http/request-log.ts";

/** How long running requests may take to end after a stop was asked for. */
const GRACE_MS = 2000;

async function main(): Promise<void> {
  const config = readConfig(process.env);
  const log = createLog(config);
  const sequelize = connect(config.database);
  const app = createApp(config, sequelize, log);
  await migrateUp(sequelize);
  await seedReferenceData();

  const server = app.express.listen(config.port, config.host, (error) => {
    if (error) {
      log.fatal({ err: error }, "cannot listen");
      process.exit(1);
    }
    const { port } = server.address() as AddressInfo;
    log.info({ port }, "listening");
    process.send?.({ type: "ready", url: config.publicUrl });
  });

  let stopping = false;
  const stop = async () => {
    if (stopping) return;
    stopping = true;
    const closed = new Promise((resolve) => server.close(resolve));
    server.closeIdleConnections();
    setTimeout(() => server.closeAllConnections(), GRACE_MS).unref();
    await closed;
    app.close();
    await sequelize.close();
    process.exit(0);
  };
  process.once("SIGTERM", stop);
  process.once("SIGINT", stop);
  // The script that started this server is gone: nothing is left to serve for.
  process.once("disconnect", stop);
}

main().catch((error: unknown) => {
  const words =
    error instanceof ConfigError ? error.message : error instanceof Error ? error.stack : String(error);
  process.stderr.write(`${words}\n`);
  process.exit(1);
});
