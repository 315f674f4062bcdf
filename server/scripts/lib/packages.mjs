import { existsSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { run, runOrFail } from "./children.mjs";
import { projectFolder } from "./paths.mjs";
import { PlainError, say } from "./say.mjs";
import { contentHash, stampMatches } from "./stamps.mjs";

export function checkNode() {
  const [major = 0, minor = 0] = process.versions.node.split(".").map(Number);
  if ((major === 20 && minor >= 19) || major > 22 || (major === 22 && minor >= 12)) return;
  throw new PlainError(
    `Node.js 20.19 or later, or 22.12 or later, is needed. This is ${process.versions.node}.`,
  );
}

/** Installs the packages when the lock file has changed since the last time. */
export async function installPackages() {
  const stamp = join(projectFolder, "node_modules", ".glassbyre-stamp");
  const hash = contentHash(projectFolder, ["package-lock.json"]);
  if (stampMatches(stamp, hash)) return;
  say("Installing packages.");
  await runOrFail(
    "npm",
    ["ci", "--no-audit", "--no-fund", "--loglevel=error"],
    "The packages could not be installed.",
    {
      cwd: projectFolder,
      stdio: ["ignore", "inherit", "inherit"],
      env: { ...process.env, NODE_ENV: "development" },
    },
  );
  writeFileSync(stamp, hash);
}

const policyFile = "/usr/sbin/policy-rc.d";

/** Installs Debian packages when one of the given programs is missing. */
export async function installDebianPackages(programs, packages) {
  if (programs.every((program) => existsSync(program))) return;
  const command = `apt-get install --no-install-recommends ${packages.join(" ")}`;
  if (process.getuid?.() !== 0) {
    throw new PlainError(
      `These Debian packages are missing. Please run this as root, then start again:\n  ${command}`,
    );
  }
  say(`Installing ${packages.join(", ")} from Debian's packages.`);
  const ownsPolicy = !existsSync(policyFile);
  // Without this a system-wide database server would be started by the package itself.
  if (ownsPolicy) writeFileSync(policyFile, "#!/bin/sh\nexit 101\n", { mode: 0o755 });
  const options = {
    stdio: ["ignore", "ignore", "inherit"],
    env: { ...process.env, DEBIAN_FRONTEND: "noninteractive" },
  };
  try {
    await run("apt-get", ["update", "-q", "-o", "DPkg::Lock::Timeout=120"], options);
    await runOrFail(
      "apt-get",
      ["install", "-y", "-q", "--no-install-recommends", "-o", "DPkg::Lock::Timeout=120", ...packages],
      `Debian's packages ${packages.join(", ")} could not be had. Try by hand:\n  ${command}`,
      options,
    );
  } finally {
    if (ownsPolicy) rmSync(policyFile, { force: true });
  }
}
