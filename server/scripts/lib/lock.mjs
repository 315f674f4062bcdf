import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { dirname } from "node:path";

function commandLine(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, "utf8");
  } catch {
    return "";
  }
}

/** Is this process alive, and does its command line hold `word`? A process number alone may have been given away again. */
export function isAlive(pid, word) {
  try {
    process.kill(pid, 0);
  } catch {
    return false;
  }
  return commandLine(pid).includes(word);
}

function read(file) {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch {
    return null;
  }
}

/**
 * Takes the lock file, or tells who holds it. A lock whose owner is gone is replaced.
 * @returns {{ taken: true, write(details: object): void, release(): void } | { taken: false, owner: object }}
 */
export function takeLock(file, scriptName) {
  mkdirSync(dirname(file), { recursive: true });
  const owner = existsSync(file) ? read(file) : null;
  if (owner && isAlive(owner.pid, scriptName)) return { taken: false, owner };
  rmSync(file, { force: true });
  try {
    writeFileSync(file, JSON.stringify({ pid: process.pid }), { flag: "wx" });
  } catch {
    return { taken: false, owner: read(file) ?? {} };
  }
  return {
    taken: true,
    write: (details) => writeFileSync(file, JSON.stringify({ pid: process.pid, ...details })),
    release: () => rmSync(file, { force: true }),
  };
}
