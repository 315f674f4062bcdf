import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, statSync } from "node:fs";
import { join } from "node:path";

/** One hash over the content of files and folders, to tell whether a step must be done again. */
export function contentHash(root, entries) {
  const hash = createHash("sha256");
  for (const entry of entries) addTo(hash, join(root, entry), entry);
  return hash.digest("hex");
}

function addTo(hash, path, name) {
  if (!existsSync(path)) return;
  if (statSync(path).isDirectory()) {
    for (const child of readdirSync(path).sort()) addTo(hash, join(path, child), `${name}/${child}`);
    return;
  }
  hash.update(name).update("\0").update(readFileSync(path)).update("\0");
}

export function stampMatches(file, value) {
  return existsSync(file) && readFileSync(file, "utf8") === value;
}
