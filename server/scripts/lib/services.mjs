import { randomBytes } from "node:crypto";
import { existsSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { runOrFail, start, waitForLine } from "./children.mjs";
import { projectFolder } from "./paths.mjs";
import { contentHash, stampMatches } from "./stamps.mjs";

export const tsx = ["--import", "tsx"];

/** Starts the stand-ins for sign-in and mail. */
export async function startFakes() {
  const child = start(process.execPath, [...tsx, "server/fakes/index.ts"], {
    cwd: projectFolder,
    stdio: ["ignore", "pipe", "inherit"],
    env: { ...process.env, NODE_ENV: "development" },
  });
  return JSON.parse(await waitForLine(child, "ready ", "The stand-ins for sign-in and mail did not start."));
}

function sessionSecret(folder) {
  const file = join(folder, "session-secret");
  if (!existsSync(file)) writeFileSync(file, randomBytes(48).toString("base64url"), { mode: 0o600 });
  return readFileSync(file, "utf8");
}

/** The environment of a server that runs beside its own database and stand-ins. */
export function localEnvironment({ folder, database, databaseName = "glassbyre", fakes, port }) {
  return {
    ...process.env,
    NODE_ENV: "development",
    PORT: String(port),
    PUBLIC_URL: `http://127.0.0.1:${port}`,
    DB_HOST: database.host,
    DB_PORT: String(database.port),
    DB_NAME: databaseName,
    DB_USER: database.user,
    DB_PASSWORD: database.password,
    SESSION_SECRET: sessionSecret(folder),
    GOOGLE_CLIENT_ID: "glassbyre-local",
    GOOGLE_CLIENT_SECRET: "glassbyre-local-secret",
    GOOGLE_FAKE_URL: fakes.signInUrl,
    SMTP_URL: fakes.smtpUrl,
    MAIL_FAKE_URL: fakes.mailUrl,
    LOG_LEVEL: process.env.LOG_LEVEL ?? "warn",
  };
}

export async function prepareDatabase(environment) {
  await runOrFail(
    process.execPath,
    [...tsx, "server/database/prepare.ts", "--demo"],
    "The database could not be prepared.",
    { cwd: projectFolder, env: environment },
  );
}

/** Builds the pages when a source has changed since the last build. */
export async function buildPages() {
  const stamp = join(projectFolder, "dist", ".glassbyre-stamp");
  const sources = [
    "src",
    "server/contracts",
    "server/engine",
    "index.html",
    "vite.config.ts",
    "package-lock.json",
  ];
  const hash = contentHash(projectFolder, sources);
  if (stampMatches(stamp, hash)) return;
  process.stderr.write("Building the pages.\n");
  await runOrFail(
    process.execPath,
    ["node_modules/vite/bin/vite.js", "build", "--logLevel", "warn"],
    "The pages could not be built.",
    { cwd: projectFolder, env: { ...process.env, NODE_ENV: "production" } },
  );
  writeFileSync(stamp, hash);
}

/** Starts the web server and resolves once it says that it is ready. */
export function startServer(environment, args = [...tsx, "server/index.ts"]) {
  const child = start(process.execPath, args, {
    cwd: projectFolder,
    env: environment,
    stdio: ["ignore", "inherit", "inherit", "ipc"],
  });
  const ready = new Promise((resolve, reject) => {
    child.once("message", (message) => resolve(message.url));
    child.once("exit", (code) => reject(new Error(`The web server ended with code ${code}.`)));
  });
  return { child, ready };
}
