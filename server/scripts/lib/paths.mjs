import { createHash } from "node:crypto";
import { tmpdir } from "node:os";
import { join, resolve } from "node:path";

export const projectFolder = resolve(import.meta.dirname, "../../..");
export const dataFolder = join(projectFolder, ".glassbyre");

/** A unix socket path may have 107 letters at most, so it lives in the system's temporary folder under a hash. */
export function socketPath(instanceFolder) {
  const hash = createHash("sha256").update(instanceFolder).digest("hex").slice(0, 12);
  return join(tmpdir(), `glassbyre-${hash}.sock`);
}
