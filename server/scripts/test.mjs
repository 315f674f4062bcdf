import { existsSync, mkdirSync, readFileSync, rmSync } from "node:fs";
import { join } from "node:path";
import { run } from "./lib/children.mjs";
import { withCleanUp } from "./lib/lifecycle.mjs";
import { startDatabase } from "./lib/mariadb.mjs";
import { checkNode, installDebianPackages, installPackages } from "./lib/packages.mjs";
import { dataFolder, projectFolder } from "./lib/paths.mjs";
import { say } from "./lib/say.mjs";
import { buildPages } from "./lib/services.mjs";
import { countReport, createTally } from "./lib/tally.mjs";

const chromium = "/usr/bin/chromium";
const projects = ["unit", "component", "api", "browser"];

/** Steps that pass or fail as a whole. */
const checks = [
  ["format", "node_modules/@biomejs/biome/bin/biome", ["format", "."]],
  ["lint", "node_modules/@biomejs/biome/bin/biome", ["lint", "--error-on-warnings", "."]],
  ["types", "node_modules/typescript/bin/tsc", ["-p", "."]],
];

async function runProject(project, folder, environment, tally) {
  say(`Running the ${project} tests.`);
  const report = join(folder, `${project}.json`);
  await run(
    process.execPath,
    [
      "node_modules/vitest/vitest.mjs",
      "run",
      "--project",
      project,
      "--reporter=default",
      "--reporter=json",
      `--outputFile.json=${report}`,
    ],
    { cwd: projectFolder, env: environment, stdio: ["ignore", "inherit", "inherit"] },
  );
  const { passed, failed } = existsSync(report)
    ? countReport(JSON.parse(readFileSync(report, "utf8")))
    : { passed: 0, failed: 1 };
  tally.add(project, passed, failed);
}

withCleanUp(async ({ onEnd, end }) => {
  checkNode();
  const folder = join(dataFolder, `test-${process.pid}`);
  mkdirSync(folder, { recursive: true });
  onEnd(async () => rmSync(folder, { recursive: true, force: true }));
  await installPackages();
  await installDebianPackages([chromium], ["chromium"]);
  const database = await startDatabase(folder);
  onEnd(() => database.stop());
  const tally = createTally();
  for (const [name, script, args] of checks) {
    say(`Checking ${name}.`);
    const code = await run(process.execPath, [script, ...args], {
      cwd: projectFolder,
      stdio: ["ignore", "inherit", "inherit"],
    });
    tally.add(name, code === 0 ? 1 : 0, code === 0 ? 0 : 1);
  }
  await buildPages().then(
    () => tally.add("build", 1, 0),
    () => tally.add("build", 0, 1),
  );
  const environment = {
    ...process.env,
    NODE_ENV: "test",
    GLASSBYRE_TEST_DB_HOST: database.host,
    GLASSBYRE_TEST_DB_PORT: String(database.port),
    GLASSBYRE_TEST_DB_USER: database.user,
    GLASSBYRE_TEST_DB_PASSWORD: database.password,
  };
  for (const project of projects) await runProject(project, folder, environment, tally);
  for (const { name, passed, failed } of tally.rows)
    say(`${name.padEnd(10)} ${passed} passed, ${failed} failed`);
  const { passed, failed } = tally.total();
  say(`${passed} passed, ${failed} failed`);
  return end(failed === 0 ? 0 : 1);
});
