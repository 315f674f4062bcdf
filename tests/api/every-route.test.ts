import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { routes } from "../../server/routes.ts";
import { startTestApp, type TestApp } from "../support/test-app.ts";
import { buildWorld, type World } from "../support/world.ts";

/** Routes that name no record and may be read by anybody who is signed in. */
const forEverybody = new Set([
  "get /api/me",
  "patch /api/me/preferences",
  "get /api/library",
  "get /api/farms",
  "get /api/buildings",
  "get /api/climate/stations",
  "get /api/climate/stations/:id",
  "get /api/places",
  "get /api/places/search",
  "get /api/reviews",
]);

const bodies: Record<string, (world: World) => unknown> = {
  "post /api/farms": (world) => ({
    cooperativeId: world.cooperative.id,
    name: "Sneaked in",
    place: "Nowhere",
    position: { latitudeDeg: 1, longitudeDeg: 1 },
    farmerEmail: null,
    farmerName: null,
  }),
};

describe("every route", () => {
  let app: TestApp;
  let world: World;
  let planId: string;
  beforeAll(async () => {
    app = await startTestApp("every_route");
    world = await buildWorld(app);
    const plan = await world.advisor.post(`/api/buildings/${world.buildingId}/plans`, {});
    expect(plan.status).toBe(201);
    planId = plan.body.id;
  });
  afterAll(() => app.close());

  const unknown = "7f1a6c1e-3a52-4c1b-9c9b-0a4f4f6d0001";
  const fill = (path: string, id: string) =>
    path.replace(":id", id).replace(":personId", unknown).replace(":role", "advisor");
  const ownId = (path: string) => {
    if (path.startsWith("/api/plans")) return planId;
    if (path.startsWith("/api/buildings")) return world.buildingId;
    if (path.startsWith("/api/farms")) return world.farmId;
    return world.cooperative.id;
  };

  it.each(routes.map((route) => [`${route.method} ${route.path}`, route] as const))(
    "%s answers 401 to a visitor",
    async (_name, route) => {
      const answer = await world.visitor.send(
        route.method,
        fill(route.path, unknown),
        route.method === "get" ? undefined : {},
      );
      expect(answer.status).toBe(401);
      expect(answer.body.error.code).toBe("not_signed_in");
    },
  );

  const guarded = routes.filter((route) => !forEverybody.has(`${route.method} ${route.path}`));

  it.each(guarded.map((route) => [`${route.method} ${route.path}`, route] as const))(
    "%s hides another co-operative's records",
    async (name, route) => {
      const valid = bodies[name]?.(world) ?? (await validBody(name));
      const answer = await world.stranger.send(route.method, fill(route.path, ownId(route.path)), valid);
      expect([403, 404]).toContain(answer.status);
      expect(JSON.stringify(answer.body)).not.toContain("Tunnel 1");
    },
  );

  it.each(
    guarded
      .filter((route) => route.path.includes(":id"))
      .map((route) => [`${route.method} ${route.path}`, route] as const),
  )("%s answers 404 for a record that does not exist", async (name, route) => {
    const answer = await world.advisor.send(route.method, fill(route.path, unknown), await validBody(name));
    expect(answer.status).toBe(404);
  });

  const withBody = routes.filter(
    (route) => ["post", "put", "patch"].includes(route.method) && !route.path.endsWith("/plans"),
  );

  it.each(withBody.map((route) => [`${route.method} ${route.path}`, route] as const))(
    "%s refuses a body it does not know",
    async (_name, route) => {
      const answer = await world.advisor.send(route.method, fill(route.path, ownId(route.path)), {
        nonsense: true,
      });
      expect(answer.status).toBe(422);
      expect(Object.values(answer.body.error.fields as Record<string, string>).join(" ")).toMatch(
        /nonsense|missing|required|invalid|expected|option/i,
      );
    },
  );

  it("refuses a plan with unknown choices", async () => {
    const answer = await world.advisor.post(`/api/buildings/${world.buildingId}/plans`, {
      returnPeriodYears: 7,
    });
    expect(answer.status).toBe(422);
    expect(answer.body.error.fields.returnPeriodYears).toBeTruthy();
  });

  it("refuses a change without the page's token", async () => {
    const cookieOnly = await world.advisor.patch("/api/me/preferences", { units: "us" });
    expect(cookieOnly.status).toBe(200);
    const response = await fetch(`${app.url}/api/me/preferences`, { method: "PATCH", body: "{}" });
    expect(response.status).toBe(401);
  });

  /** A body that passes the contract, so that only the policy can refuse. */
  async function validBody(name: string): Promise<unknown> {
    const survey = async () => (await world.advisor.get(`/api/buildings/${world.buildingId}/survey`)).body;
    switch (name) {
      case "post /api/farms/:id/advisors":
        return { personId: unknown };
      case "patch /api/farms/:id":
        return { name: "Renamed" };
      case "post /api/farms/:id/buildings":
        return (await import("../support/factories.ts")).tunnelBody;
      case "patch /api/buildings/:id":
        return { name: "Renamed" };
      case "put /api/buildings/:id/survey": {
        const { version, survey: document } = await survey();
        return { version, survey: document };
      }
      case "post /api/buildings/:id/preview":
        return { survey: (await survey()).survey, choices: {} };
      case "post /api/plans/:id/send":
        return { optionId: "two" };
      case "post /api/plans/:id/answer":
        return { answer: "approve" };
      case "post /api/plans/:id/messages":
        return { message: "Hello" };
      case "post /api/cooperatives/:id/people":
        return { name: "New", email: "new@example.org", role: "advisor" };
      case "post /api/buildings/:id/plans":
        return {};
      default:
        return name.startsWith("get") ? undefined : {};
    }
  }
});
