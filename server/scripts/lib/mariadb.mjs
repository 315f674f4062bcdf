import { spawn, spawnSync } from "node:child_process";
import { randomBytes } from "node:crypto";
import {
  chmodSync,
  chownSync,
  existsSync,
  mkdirSync,
  openSync,
  readFileSync,
  renameSync,
  rmSync,
  writeFileSync,
} from "node:fs";
import { connect } from "node:net";
import { userInfo } from "node:os";
import { join } from "node:path";
import { capture } from "./children.mjs";
import { isAlive } from "./lock.mjs";
import { installDebianPackages } from "./packages.mjs";
import { socketPath } from "./paths.mjs";
import { freePort } from "./ports.mjs";
import { PlainError } from "./say.mjs";

const server = "/usr/sbin/mariadbd";
const initialiser = "/usr/bin/mariadb-install-db";
const appUser = "glassbyre";

/** The account the database runs under: never root when the mysql account can reach the folder. */
function databaseAccount(folder) {
  if (process.getuid() !== 0) return userInfo().username;
  const probe = spawnSync("setpriv", [
    "--reuid=mysql",
    "--regid=mysql",
    "--clear-groups",
    "test",
    "-x",
    folder,
  ]);
  return probe.status === 0 ? "mysql" : "root";
}

function ownedBy(account, path) {
  if (process.getuid() !== 0 || account === "root") return;
  const uid = Number(spawnSync("id", ["-u", account], { encoding: "utf8" }).stdout);
  const gid = Number(spawnSync("id", ["-g", account], { encoding: "utf8" }).stdout);
  chownSync(path, uid, gid);
}

function secretOf(folder) {
  const file = join(folder, "database-password");
  if (!existsSync(file)) writeFileSync(file, randomBytes(24).toString("base64url"), { mode: 0o600 });
  return readFileSync(file, "utf8");
}

async function createDataFolder(folder, account) {
  const dataDir = join(folder, "database");
  if (existsSync(dataDir)) return dataDir;
  process.stderr.write("Making a database folder.\n");
  const half = join(folder, "database-half-made");
  rmSync(half, { recursive: true, force: true });
  mkdirSync(half);
  ownedBy(account, half);
  const { code, output } = await capture(initialiser, [
    "--no-defaults",
    `--datadir=${half}`,
    `--user=${account}`,
    "--auth-root-authentication-method=socket",
    "--skip-test-db",
  ]);
  if (code !== 0) throw new PlainError(`The database folder could not be made:\n${output.slice(-800)}`);
  renameSync(half, dataDir);
  return dataDir;
}

function writeInitFile(folder, account, password) {
  const file = join(folder, "database-init.sql");
  const user = `'${appUser}'@'127.0.0.1'`;
  const lines = [
    `CREATE USER IF NOT EXISTS ${user} IDENTIFIED BY '${password}';`,
    `ALTER USER ${user} IDENTIFIED BY '${password}';`,
    `GRANT ALL ON \`glassbyre\`.* TO ${user};`,
    `GRANT ALL ON \`glassbyre\\_%\`.* TO ${user};`,
    "CREATE DATABASE IF NOT EXISTS glassbyre CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci;",
  ];
  writeFileSync(file, `${lines.join("\n")}\n`, { mode: 0o600 });
  chmodSync(file, 0o600);
  ownedBy(account, file);
  return file;
}

/** Resolves when the greeting of the server arrives. */
function greeting(port) {
  return new Promise((resolve) => {
    const socket = connect(port, "127.0.0.1");
    const end = (value) => {
      socket.destroy();
      resolve(value);
    };
    socket.setTimeout(1000, () => end(false));
    socket.once("data", () => end(true));
    socket.once("error", () => end(false));
  });
}

async function waitUntilReady(port, hasEnded, log) {
  for (let tries = 0; tries < 240; tries += 1) {
    if (await greeting(port)) return;
    if (hasEnded()) break;
    await new Promise((resolve) => setTimeout(resolve, 250));
  }
  const tail = existsSync(log) ? readFileSync(log, "utf8").slice(-1200) : "";
  throw new PlainError(`The database did not start. Its log ends with:\n${tail}`);
}

function runningServer(folder, dataDir) {
  const file = join(folder, "database.json");
  if (!existsSync(file)) return null;
  const { pid, port } = JSON.parse(readFileSync(file, "utf8"));
  return isAlive(pid, `--datadir=${dataDir}`) ? { pid, port } : null;
}

function launch(folder, dataDir, account, port, initFile) {
  const log = join(folder, "database.log");
  const output = openSync(log, "a");
  const child = spawn(
    server,
    [
      "--no-defaults",
      `--datadir=${dataDir}`,
      `--socket=${socketPath(folder)}`,
      `--pid-file=${join(dataDir, "server.pid")}`,
      `--port=${port}`,
      "--bind-address=127.0.0.1",
      "--skip-name-resolve",
      "--skip-log-bin",
      "--performance-schema=OFF",
      "--innodb-buffer-pool-size=64M",
      `--user=${account}`,
      `--init-file=${initFile}`,
    ],
    // Detached, so that Ctrl-C does not end the database before the web server has closed its connections.
    { detached: true, stdio: ["ignore", output, output] },
  );
  child.unref();
  return { child, log };
}

/**
 * Starts the project's own database server in `folder`, or takes over the one that still runs there.
 * @returns {Promise<{ host: string, port: number, user: string, password: string, pid: number, onEnd(f: () => void): void, stop(): Promise<void> }>}
 */
export async function startDatabase(folder) {
  await installDebianPackages([server, initialiser], ["mariadb-server"]);
  mkdirSync(folder, { recursive: true });
  const account = databaseAccount(folder);
  const password = secretOf(folder);
  const dataDir = await createDataFolder(folder, account);
  const address = { host: "127.0.0.1", user: appUser, password };
  const found = runningServer(folder, dataDir);
  if (found && (await greeting(found.port))) return { ...address, ...found, ...control(found.pid, dataDir) };

  const stateFile = join(folder, "database.json");
  const wished = existsSync(stateFile) ? JSON.parse(readFileSync(stateFile, "utf8")).port : 0;
  const port = await freePort(wished);
  const { child, log } = launch(folder, dataDir, account, port, writeInitFile(folder, account, password));
  let ended = false;
  child.once("exit", () => {
    ended = true;
  });
  writeFileSync(stateFile, JSON.stringify({ pid: child.pid, port }));
  await waitUntilReady(port, () => ended, log);
  return { ...address, port, pid: child.pid, ...control(child.pid, dataDir) };
}

/** Watching and stopping work by process number, because the server may have been started by an earlier run. */
function control(pid, dataDir) {
  const alive = () => isAlive(pid, `--datadir=${dataDir}`);
  return {
    onEnd(callback) {
      const timer = setInterval(() => {
        if (alive()) return;
        clearInterval(timer);
        callback();
      }, 1000);
      timer.unref();
    },
    async stop() {
      if (!alive()) return;
      process.kill(pid, "SIGTERM");
      for (let tries = 0; tries < 150 && alive(); tries += 1) {
        await new Promise((resolve) => setTimeout(resolve, 100));
      }
      if (alive()) process.kill(pid, "SIGKILL");
    },
  };
}
