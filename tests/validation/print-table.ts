import { readdirSync } from "node:fs";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { type CheckRecord, type CheckRow, recordOf } from "./record-check.ts";

/** Every file named *.rows.ts below this folder gives a topic and its rows. */
async function allRecords(): Promise<CheckRecord[]> {
  const files = readdirSync(import.meta.dirname, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile() && entry.name.endsWith(".rows.ts"))
    .map((entry) => join(entry.parentPath, entry.name))
    .sort();
  const records: CheckRecord[] = [];
  for (const file of files) {
    const module = (await import(pathToFileURL(file).href)) as { topic: string; rows: CheckRow[] };
    records.push(...module.rows.map((row) => recordOf(module.topic, row)));
  }
  return records;
}

function printed(value: number): string {
  return Number.isInteger(value) ? String(value) : value.toPrecision(6);
}

const records = await allRecords();
if (process.argv.includes("--json")) {
  console.log(JSON.stringify(records, null, 2));
} else {
  console.table(
    records.map(({ topic, quantity, source, computed, expected, tolerance, verdict }) => ({
      topic,
      quantity,
      source,
      computed: printed(computed),
      expected: printed(expected),
      tolerance: tolerance.toPrecision(2),
      verdict,
    })),
  );
  const differing = records.filter((record) => record.verdict === "differs");
  console.log(`${records.length} figures, ${records.length - differing.length} agree.`);
}
if (records.some((record) => record.verdict === "differs")) process.exitCode = 1;
