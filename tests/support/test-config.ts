import type { Config } from "../../server/config.ts";
import { testAddress } from "./test-database.ts";

/** Configuration of an application under test; the stand-ins are given where a test needs them. */
export function testConfig(database: string, changes: Partial<Config> = {}): Config {
  return {
    production: false,
    host: "127.0.0.1",
    port: 0,
    publicUrl: "http://127.0.0.1:4999",
    database: testAddress(database),
    sessionSecret: "a secret that is long enough for a test run",
    google: { clientId: "test", clientSecret: "test-secret", fakeUrl: "http://127.0.0.1:9" },
    mail: {
      smtpUrl: "smtp://127.0.0.1:9",
      from: "Glassbyre <no-reply@glassbyre.example>",
      fakeUrl: "http://127.0.0.1:9",
    },
    trustProxy: 0,
    logLevel: "silent",
    rateLimitPerMinute: 100_000,
    clientFolder: "dist",
    ...changes,
  };
}
