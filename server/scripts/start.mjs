import { join } from "node:path";
import { stop } from "./lib/children.mjs";
import { withCleanUp } from "./lib/lifecycle.mjs";
import { takeLock } from "./lib/lock.mjs";
import { startDatabase } from "./lib/mariadb.mjs";
import { checkNode, installPackages } from "./lib/packages.mjs";
import { dataFolder } from "./lib/paths.mjs";
import { freePort } from "./lib/ports.mjs";
import { say } from "./lib/say.mjs";
import { buildPages, localEnvironment, prepareDatabase, startFakes, startServer } from "./lib/services.mjs";

const wishedPort = Number(process.env.PORT ?? 4100);

withCleanUp(async ({ onEnd, end, ending }) => {
  checkNode();
  const folder = join(dataFolder, "start");
  const lock = takeLock(join(folder, "lock.json"), "start.mjs");
  if (!lock.taken) {
    say(lock.owner.url ? `Already running: ${lock.owner.url}` : "Another start is under way.");
    return end(0);
  }
  onEnd(async () => lock.release());
  await installPackages();
  const database = await startDatabase(folder);
  onEnd(() => database.stop());
  const fakes = await startFakes();
  const port = await freePort(wishedPort);
  if (port !== wishedPort) say(`Port ${wishedPort} is taken; using ${port}.`);
  const environment = localEnvironment({ folder, database, fakes, port });
  await prepareDatabase(environment);
  await buildPages();
  const server = startServer(environment);
  onEnd(() => stop(server.child));
  const url = await server.ready;
  lock.write({ url });
  database.onEnd(() => {
    if (ending()) return;
    say("The database has ended by itself. Please start again.");
    end(1);
  });
  server.child.once("exit", () => end(1));
  say(`Glassbyre runs at ${url}`);
  say(`Letters it sends are kept at ${fakes.mailUrl}`);
  say("Ctrl-C stops it.");
});
