import { join } from "node:path";
import { start, stop } from "./lib/children.mjs";
import { withCleanUp } from "./lib/lifecycle.mjs";
import { takeLock } from "./lib/lock.mjs";
import { startDatabase } from "./lib/mariadb.mjs";
import { checkNode, installPackages } from "./lib/packages.mjs";
import { dataFolder, projectFolder } from "./lib/paths.mjs";
import { freePort } from "./lib/ports.mjs";
import { say } from "./lib/say.mjs";
import { localEnvironment, prepareDatabase, startFakes } from "./lib/services.mjs";

withCleanUp(async ({ onEnd, end }) => {
  checkNode();
  const folder = join(dataFolder, "dev");
  const lock = takeLock(join(folder, "lock.json"), "dev.mjs");
  if (!lock.taken) {
    say("npm run dev is already running.");
    return end(0);
  }
  onEnd(async () => lock.release());
  await installPackages();
  const database = await startDatabase(folder);
  onEnd(() => database.stop());
  const fakes = await startFakes();
  const apiPort = await freePort(4200);
  const pagePort = await freePort(5173);
  const environment = {
    ...localEnvironment({ folder, database, fakes, port: apiPort }),
    PUBLIC_URL: `http://127.0.0.1:${pagePort}`,
    GLASSBYRE_DEV_API_PORT: String(apiPort),
  };
  await prepareDatabase(environment);
  const options = { cwd: projectFolder, env: environment };
  const server = start(
    process.execPath,
    ["node_modules/tsx/dist/cli.mjs", "watch", "server/index.ts"],
    options,
  );
  const vite = [
    "node_modules/vite/bin/vite.js",
    "--host",
    "127.0.0.1",
    "--port",
    String(pagePort),
    "--strictPort",
  ];
  const pages = start(process.execPath, vite, options);
  onEnd(() => Promise.all([stop(server), stop(pages)]));
  say(`Glassbyre for development runs at ${environment.PUBLIC_URL}`);
});
