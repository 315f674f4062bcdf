import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { createServer } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { takeLock } from "../../../server/scripts/lib/lock.mjs";
import { socketPath } from "../../../server/scripts/lib/paths.mjs";
import { freePort } from "../../../server/scripts/lib/ports.mjs";
import { contentHash, stampMatches } from "../../../server/scripts/lib/stamps.mjs";
import { countReport, createTally } from "../../../server/scripts/lib/tally.mjs";

let folder = "";
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), "scripts-test-"));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

describe("the lock", () => {
  it("is held by one, tells its address, and is free again afterwards", () => {
    const file = join(folder, "lock.json");
    // This very process runs vitest, so its command line holds that word.
    const first = takeLock(file, "vitest");
    expect(first.taken).toBe(true);
    if (!first.taken) return;
    first.write({ url: "http://127.0.0.1:1" });
    const second = takeLock(file, "vitest");
    expect(second).toMatchObject({ taken: false, owner: { url: "http://127.0.0.1:1" } });
    first.release();
    expect(takeLock(file, "vitest").taken).toBe(true);
  });

  it("of a process that is gone, or is another program by now, is taken over", () => {
    const file = join(folder, "lock.json");
    writeFileSync(file, JSON.stringify({ pid: process.pid }));
    expect(takeLock(file, "a word no command line holds").taken).toBe(true);
    expect(JSON.parse(readFileSync(file, "utf8")).pid).toBe(process.pid);
  });
});

describe("ports", () => {
  it("are the wished one when it is free, else another", async () => {
    const server = createServer();
    const taken = await new Promise<number>((resolve) => {
      server.listen(0, "127.0.0.1", () => resolve((server.address() as { port: number }).port));
    });
    expect(await freePort(taken)).not.toBe(taken);
    await new Promise((resolve) => server.close(resolve));
    expect(await freePort(taken)).toBe(taken);
  });
});

describe("stamps", () => {
  it("change with content and name, and with nothing else", () => {
    writeFileSync(join(folder, "a"), "one");
    const before = contentHash(folder, ["a", "missing"]);
    expect(contentHash(folder, ["a", "missing"])).toBe(before);
    writeFileSync(join(folder, "a"), "two");
    expect(contentHash(folder, ["a"])).not.toBe(before);
    writeFileSync(join(folder, "stamp"), before);
    expect(stampMatches(join(folder, "stamp"), before)).toBe(true);
    expect(stampMatches(join(folder, "none"), before)).toBe(false);
  });
});

describe("sums", () => {
  it("add up over runners", () => {
    const tally = createTally();
    tally.add("a", 3, 1);
    tally.add("b", 4, 0);
    expect(tally.total()).toEqual({ passed: 7, failed: 1 });
  });

  it("count a broken file and a run without tests as failures", () => {
    const report = {
      numPassedTests: 2,
      numFailedTests: 1,
      testResults: [{ status: "failed", assertionResults: [] }],
    };
    expect(countReport(report)).toEqual({ passed: 2, failed: 2 });
    expect(countReport({ numPassedTests: 0, numFailedTests: 0, testResults: [] })).toEqual({
      passed: 0,
      failed: 1,
    });
  });
});

describe("the socket", () => {
  it("stays short however deep the project lies", () => {
    expect(socketPath(`/${"deep/".repeat(60)}`).length).toBeLessThan(100);
  });
});
