import { spawn } from "node:child_process";
import { createInterface } from "node:readline";
import { PlainError } from "./say.mjs";

/** Every process this script started and that must end with it. */
const running = new Set();

export function start(command, args, options = {}) {
  const child = spawn(command, args, { stdio: "inherit", ...options });
  running.add(child);
  child.once("exit", () => running.delete(child));
  return child;
}

/** Runs a command to its end; resolves with its exit code. */
export function run(command, args, options = {}) {
  return new Promise((resolve, reject) => {
    const child = start(command, args, options);
    child.once("error", reject);
    child.once("exit", (code, signal) => resolve(signal ? 1 : (code ?? 1)));
  });
}

export async function runOrFail(command, args, words, options = {}) {
  const code = await run(command, args, options);
  if (code !== 0) throw new PlainError(words);
}

/** Runs a command and gives back what it printed. */
export function capture(command, args, options = {}) {
  return new Promise((resolve, reject) => {
    const child = start(command, args, { ...options, stdio: ["ignore", "pipe", "pipe"] });
    let output = "";
    child.stdout.on("data", (part) => {
      output += part;
    });
    child.stderr.on("data", (part) => {
      output += part;
    });
    child.once("error", reject);
    child.once("exit", (code) => resolve({ code: code ?? 1, output }));
  });
}

/** Resolves with the first line of a child's output that starts with `mark`, without the mark. */
export function waitForLine(child, mark, words) {
  return new Promise((resolve, reject) => {
    createInterface({ input: child.stdout }).on("line", (line) => {
      if (line.startsWith(mark)) resolve(line.slice(mark.length).trim());
    });
    child.once("exit", () => reject(new PlainError(words)));
  });
}

/** Ends a child politely, and firmly after `graceMs`. */
export function stop(child, graceMs = 8000) {
  if (child.exitCode !== null || child.signalCode !== null) return Promise.resolve();
  return new Promise((resolve) => {
    const timer = setTimeout(() => child.kill("SIGKILL"), graceMs);
    child.once("exit", () => {
      clearTimeout(timer);
      resolve();
    });
    child.kill("SIGTERM");
  });
}

export function stopAll() {
  return Promise.all([...running].map((child) => stop(child)));
}
