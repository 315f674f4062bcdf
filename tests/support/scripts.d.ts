declare module "*/scripts/lib/lock.mjs" {
  type Lock =
    | { taken: true; write(details: object): void; release(): void }
    | { taken: false; owner: { pid?: number; url?: string } };
  export function takeLock(file: string, scriptName: string): Lock;
  export function isAlive(pid: number, word: string): boolean;
}
declare module "*/scripts/lib/paths.mjs" {
  export function socketPath(instanceFolder: string): string;
}
declare module "*/scripts/lib/ports.mjs" {
  export function freePort(wished?: number): Promise<number>;
}
declare module "*/scripts/lib/stamps.mjs" {
  export function contentHash(root: string, entries: string[]): string;
  export function stampMatches(file: string, value: string): boolean;
}
declare module "*/scripts/lib/tally.mjs" {
  interface Sums {
    passed: number;
    failed: number;
  }
  interface Report {
    numPassedTests: number;
    numFailedTests: number;
    testResults: { status: string; assertionResults: unknown[] }[];
  }
  export function createTally(): { add(name: string, passed: number, failed: number): void; total(): Sums };
  export function countReport(report: Report): Sums;
}
