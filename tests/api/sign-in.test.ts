import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { demoPeople } from "../../server/database/demo/people.ts";
import { Person } from "../../server/models/person.ts";
import { routes } from "../../server/routes.ts";
import { buildCooperative, buildPerson, emailOf } from "../support/factories.ts";
import { startTestApp, type TestApp } from "../support/test-app.ts";

describe("signing in", () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await startTestApp("sign_in");
    await buildPerson("ines", await buildCooperative(), ["advisor"]);
  });
  afterAll(() => app.close());

  const open = (path: string, cookie = "") =>
    fetch(path.startsWith("http") ? path : `${app.url}${path}`, { redirect: "manual", headers: { cookie } });
  const cookieOf = (response: Response) => (response.headers.get("set-cookie") ?? "").split(";")[0] ?? "";

  async function walk(email: string, to = "/") {
    const start = await open(`/auth/google?as=${email}&to=${encodeURIComponent(to)}`);
    const chosen = await open(start.headers.get("location") ?? "");
    const back = await open(chosen.headers.get("location") ?? "", cookieOf(start));
    return { start, back, callback: chosen.headers.get("location") ?? "" };
  }

  it("goes through the redirect and back to where it began, with a session of its own", async () => {
    const { start, back } = await walk(emailOf("ines"), "/farms");
    expect(start.headers.get("location")).toMatch(/code_challenge=.*&|state=/);
    expect(back.headers.get("location")).toBe("/farms");
    expect(cookieOf(back)).not.toBe(cookieOf(start));
    expect(back.headers.get("set-cookie")).toMatch(/HttpOnly/);
    expect(back.headers.get("set-cookie")).toMatch(/SameSite=Lax/);
    expect((await open("/api/me", cookieOf(start))).status).toBe(401);
  });

  it("never goes back to another site", async () => {
    for (const to of ["https://evil.example", "//evil.example", "/\\evil.example"]) {
      const { back } = await walk(emailOf("ines"), to);
      expect(back.headers.get("location")).toBe("/");
    }
  });

  it("lets nobody in who is on no list, and stores nothing about them", async () => {
    const before = await Person.count();
    const { back } = await walk(emailOf("gus"));
    expect(back.headers.get("location")).toBe("/no-access");
    expect((await open("/api/me", cookieOf(back))).status).toBe(401);
    expect(await Person.count()).toBe(before);
  });

  it("refuses a callback without the state it gave out", async () => {
    const { callback } = await walk(emailOf("ines"));
    const forged = await open(callback);
    expect(forged.headers.get("location")).toBe("/sign-in?failed=1");
  });

  it("keeps two people apart who sign in at once", async () => {
    await buildPerson("brigid", await buildCooperative("Second"), ["manager"]);
    const [one, two] = await Promise.all([app.signIn(emailOf("ines")), app.signIn(emailOf("brigid"))]);
    expect((await one.get("/api/me")).body.email).toBe(emailOf("ines"));
    expect((await two.get("/api/me")).body.email).toBe(emailOf("brigid"));
  });

  it("ends with sign-out", async () => {
    const client = await app.signIn(emailOf("ines"));
    expect((await client.post("/auth/sign-out")).status).toBe(204);
    expect((await client.get("/api/me")).status).toBe(401);
  });

  it("refuses a change whose token is not the session's", async () => {
    const { back } = await walk(emailOf("ines"));
    const response = await fetch(`${app.url}/api/me/preferences`, {
      method: "PATCH",
      headers: { cookie: cookieOf(back), "content-type": "application/json", "x-csrf-token": "guessed" },
      body: "{}",
    });
    expect(response.status).toBe(403);
    expect(((await response.json()) as { error: { code: string } }).error.code).toBe("bad_csrf");
  });

  it("shows the demonstration's people only while the stand-in is used", async () => {
    const shown = (await (await open("/api/sign-in-options")).json()) as { fakePeople: unknown[] };
    expect(shown.fakePeople).toHaveLength(demoPeople.length);
  });
});

describe("the server", () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await startTestApp("server", { rateLimitPerMinute: 12 });
  });
  afterAll(() => app.close());

  it("tells its health with the database included", async () => {
    const health = await app.visitor().get("/api/health");
    expect(health.body).toMatchObject({ status: "ok", database: "ok" });
  });

  it("describes every route", async () => {
    const { body } = await app.visitor().get("/api/openapi.json");
    for (const route of routes) {
      const described = body.paths[route.path.replace(/:(\w+)/g, "{$1}")]?.[route.method];
      expect(described?.summary, route.path).toBe(route.summary);
    }
    const create = body.paths["/api/farms/{id}/buildings"].post;
    expect(create.requestBody.content["application/json"].schema.required).toContain("footprint");
  });

  it("sends strict headers", async () => {
    const { headers } = await app.visitor().get("/api/health");
    expect(headers["content-security-policy"]).toContain("default-src 'none'");
    expect(headers["content-security-policy"]).toContain("script-src 'self'");
    expect(headers["x-powered-by"]).toBeUndefined();
  });

  it("answers in its one error body, whatever is asked", async () => {
    const unknown = await app.visitor().get("/api/nothing/here");
    expect(unknown.status).toBe(404);
    expect(unknown.body.error).toMatchObject({ code: "not_found", fields: {} });
    const broken = await fetch(`${app.url}/api/farms`, {
      method: "POST",
      headers: { "content-type": "application/json" },
      body: "{broken",
    });
    expect(broken.status).toBe(400);
    expect(await broken.json()).toMatchObject({ error: { code: "bad_json" } });
  });

  it("slows down whoever asks too much", async () => {
    const answers = await Promise.all(Array.from({ length: 20 }, () => app.visitor().get("/api/me")));
    const slowed = answers.find((answer) => answer.status === 429);
    expect(slowed?.body.error.code).toBe("too_many_requests");
  });
});
