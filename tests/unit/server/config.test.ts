import { describe, expect, it } from "vitest";
import { ConfigError, readConfig } from "../../../server/config.ts";

const complete = {
  PUBLIC_URL: "https://heat.example.org/",
  DB_NAME: "glassbyre",
  DB_USER: "glassbyre",
  DB_PASSWORD: "long-enough-password",
  SESSION_SECRET: "x".repeat(40),
  GOOGLE_CLIENT_ID: "id",
  GOOGLE_CLIENT_SECRET: "secret",
  SMTP_URL: "smtp://mail.example.org:587",
};

function problems(changes: Record<string, string | undefined>): string {
  try {
    readConfig({ ...complete, ...changes });
    return "";
  } catch (error) {
    expect(error).toBeInstanceOf(ConfigError);
    return (error as Error).message;
  }
}

describe("configuration", () => {
  it("is read once, with plain defaults", () => {
    const config = readConfig(complete);
    expect(config).toMatchObject({
      production: false,
      port: 4100,
      publicUrl: "https://heat.example.org",
      trustProxy: 0,
    });
    expect(config.google.fakeUrl).toBeNull();
  });

  it.each(Object.keys(complete))("names %s when it is missing", (name) => {
    expect(problems({ [name]: undefined })).toContain(`${name}: is missing`);
  });

  it("lists all problems at once", () => {
    const words = problems({ DB_USER: undefined, PORT: "70000", SESSION_SECRET: "short" });
    expect(words).toContain("DB_USER");
    expect(words).toContain("PORT");
    expect(words).toContain("SESSION_SECRET must have at least 32 characters");
  });

  it("refuses both stand-ins, plain http and weak passwords in production", () => {
    const production = { NODE_ENV: "production", TRUST_PROXY: "1" };
    expect(problems(production)).toBe("");
    expect(problems({ ...production, GOOGLE_FAKE_URL: "http://127.0.0.1:1" })).toContain(
      "sign-in stand-in cannot be used",
    );
    expect(problems({ ...production, MAIL_FAKE_URL: "http://127.0.0.1:1" })).toContain(
      "mail stand-in cannot be used",
    );
    expect(problems({ ...production, PUBLIC_URL: "http://heat.example.org" })).toContain(
      "must start with https://",
    );
    expect(problems({ ...production, TRUST_PROXY: "0" })).toContain("must count the proxies");
    expect(problems({ ...production, DB_PASSWORD: "short" })).toContain("at least 12 characters");
  });
});
