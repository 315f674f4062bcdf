import { mkdirSync, rmSync } from "node:fs";
import { join } from "node:path";
import { run } from "./lib/children.mjs";
import { withCleanUp } from "./lib/lifecycle.mjs";
import { startDatabase } from "./lib/mariadb.mjs";
import { checkNode, installDebianPackages, installPackages } from "./lib/packages.mjs";
import { dataFolder, projectFolder } from "./lib/paths.mjs";
import { buildPages, tsx } from "./lib/services.mjs";

/** Measures on a throw-away database; what is printed comes from tests/bench/run.ts. */
withCleanUp(async ({ onEnd, end }) => {
  checkNode();
  const folder = join(dataFolder, `bench-${process.pid}`);
  mkdirSync(folder, { recursive: true });
  onEnd(async () => rmSync(folder, { recursive: true, force: true }));
  await installPackages();
  await installDebianPackages(["/usr/bin/chromium"], ["chromium"]);
  const database = await startDatabase(folder);
  onEnd(() => database.stop());
  await buildPages();
  const code = await run(process.execPath, [...tsx, "tests/bench/run.ts", ...process.argv.slice(2)], {
    cwd: projectFolder,
    env: {
      ...process.env,
      NODE_ENV: "test",
      GLASSBYRE_TEST_DB_HOST: database.host,
      GLASSBYRE_TEST_DB_PORT: String(database.port),
      GLASSBYRE_TEST_DB_USER: database.user,
      GLASSBYRE_TEST_DB_PASSWORD: database.password,
    },
  });
  return end(code);
});
