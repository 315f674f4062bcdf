import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { Cooperative } from "../../server/models/cooperative.ts";
import { startTestApp, type TestApp } from "../support/test-app.ts";
import { buildWorld, type World } from "../support/world.ts";

describe("people, farms and places", () => {
  let app: TestApp;
  let world: World;
  beforeAll(async () => {
    app = await startTestApp("people");
    world = await buildWorld(app);
  });
  afterAll(() => app.close());

  const people = () => `/api/cooperatives/${world.cooperative.id}/people`;

  it("a manager invites, and a letter goes out", async () => {
    const answer = await world.manager.post(people(), {
      name: "New Adviser",
      email: "New.Adviser@example.org",
      role: "advisor",
    });
    expect(answer.status).toBe(201);
    const added = answer.body.items.find((person: { name: string }) => person.name === "New Adviser");
    expect(added).toMatchObject({ email: "new.adviser@example.org", roles: ["advisor"], hasSignedIn: false });
    await expect.poll(() => app.mails.map((mail) => mail.to[0])).toContain("new.adviser@example.org");
    const twice = await world.manager.post(people(), {
      name: "New Adviser",
      email: "new.adviser@example.org",
      role: "advisor",
    });
    expect(twice.status).toBe(422);
    expect(twice.body.error.fields.email).toMatch(/already has this role/);
  });

  it("the last manager stays", async () => {
    const list = (await world.manager.get(people())).body.items;
    const manager = list.find((person: { roles: string[] }) => person.roles.includes("manager"));
    const answer = await world.manager.delete(`${people()}/${manager.id}/manager`);
    expect(answer.status).toBe(422);
    expect(answer.body.error.fields.role).toMatch(/at least one manager/);
  });

  it("an adviser adds a farm with its farmer, and works on it at once", async () => {
    const body = {
      cooperativeId: world.cooperative.id,
      name: "Upper Field",
      place: "Somewhere",
      position: { latitudeDeg: -34.8, longitudeDeg: 149.6 },
      farmerEmail: "farmer@example.org",
      farmerName: "A. Farmer",
    };
    const farm = await world.advisor.post("/api/farms", body);
    expect(farm.status).toBe(201);
    expect(farm.body.people.map((person: { role: string }) => person.role).sort()).toEqual([
      "advisor",
      "farmer",
    ]);
    expect(farm.body.can).toMatchObject({ addBuilding: true, share: false });
    const nameless = await world.advisor.post("/api/farms", { ...body, farmerName: null });
    expect(nameless.status).toBe(422);
    expect((await world.farmer.post("/api/farms", body)).status).toBe(403);
  });

  it("advisers are assigned from the co-operative's own list only", async () => {
    const stranger = (await world.stranger.get("/api/me")).body;
    const refused = await world.manager.post(`/api/farms/${world.farmId}/advisors`, {
      personId: stranger.id,
    });
    expect(refused.status).toBe(422);
    const adviser = (await world.manager.get(people())).body.items.find(
      (person: { name: string }) => person.name === "New Adviser",
    );
    const assigned = await world.manager.post(`/api/farms/${world.farmId}/advisors`, {
      personId: adviser.id,
    });
    expect(assigned.body.people).toHaveLength(3);
    expect((await world.manager.delete(`/api/farms/${world.farmId}/advisors/${adviser.id}`)).status).toBe(
      204,
    );
  });

  it("units and theme are kept for the person", async () => {
    await world.farmer.patch("/api/me/preferences", { units: "us", theme: "evening" });
    expect((await world.farmer.get("/api/me")).body).toMatchObject({ units: "us", theme: "evening" });
    const other = await Cooperative.findOne({ where: { name: "Another Co-operative" } });
    const refused = await world.farmer.patch("/api/me/preferences", {
      activeRole: "manager",
      activeCooperativeId: other?.id,
    });
    expect(refused.status).toBe(422);
  });

  it("finds the nearest stations with distance and height", async () => {
    const { items } = (
      await world.advisor.get("/api/climate/stations?latitude=53.36&longitude=-7.48&elevationM=80")
    ).body;
    expect(items).toHaveLength(8);
    expect(items[0].name).toContain("Dublin");
    expect(items[0].distanceKm).toBeGreaterThan(60);
    const station = (await world.advisor.get(`/api/climate/stations/${items[0].id}`)).body;
    expect(station.months).toHaveLength(12);
    expect(station.licence).toBeTruthy();
    const swapped = await world.advisor.get("/api/climate/stations?latitude=149&longitude=-34");
    expect(swapped.status).toBe(422);
    expect(swapped.body.error.fields.latitude).toMatch(/may be swapped/);
  });

  it("finds towns by name and by view, across the date line", async () => {
    const found = (await world.advisor.get("/api/places/search?text=dubl")).body.items;
    expect(found[0].name).toBe("Dublin");
    const pacific = (await world.advisor.get("/api/places?south=-20&north=-15&west=175&east=185&zoom=8")).body
      .items;
    expect(pacific.map((place: { country: string }) => place.country)).toContain("FJ");
  });

  it("another station, or another place, makes a plan out of date and leaves an open survey valid", async () => {
    const plan = (await world.advisor.post(`/api/buildings/${world.buildingId}/plans`, {})).body;
    expect(plan.outdated).toBe(false);
    const survey = (await world.advisor.get(`/api/buildings/${world.buildingId}/survey`)).body;
    const { items } = (await world.advisor.get("/api/climate/stations?latitude=53.36&longitude=-7.48")).body;
    const changed = await world.advisor.patch(`/api/buildings/${world.buildingId}`, {
      stationId: items[1].id,
    });
    expect(changed.body).toMatchObject({ stationChosen: true, station: { id: items[1].id } });
    expect((await world.advisor.get(`/api/plans/${plan.id}`)).body.outdated).toBe(true);
    expect((await world.advisor.post(`/api/plans/${plan.id}/send`, { optionId: "two" })).status).toBe(409);
    const saved = await world.advisor.put(`/api/buildings/${world.buildingId}/survey`, {
      version: survey.version,
      survey: survey.survey,
    });
    expect(saved.status).toBe(200);
    const back = await world.advisor.patch(`/api/buildings/${world.buildingId}`, { stationId: null });
    expect(back.body).toMatchObject({ stationChosen: false, station: { id: items[0].id } });
    expect(
      (await world.advisor.patch(`/api/buildings/${world.buildingId}`, { stationId: "nowhere" })).status,
    ).toBe(422);
  });

  it("a house too far from any station waits for a person's choice", async () => {
    const body = (await import("../support/factories.ts")).tunnelBody;
    const pinned = await world.advisor.post(`/api/farms/${world.farmId}/buildings`, {
      ...body,
      position: { latitudeDeg: -54.4, longitudeDeg: 3.4 },
      farFromFarmConfirmed: true,
    });
    expect(pinned.status).toBe(201);
    const refused = await world.advisor.post(`/api/buildings/${pinned.body.id}/plans`, {});
    expect(refused.status).toBe(422);
    expect(refused.body.error.message).toMatch(/km away. Please choose a station yourself/);
    await world.advisor.patch(`/api/buildings/${pinned.body.id}`, { stationId: pinned.body.station.id });
    expect((await world.advisor.post(`/api/buildings/${pinned.body.id}/plans`, {})).status).toBe(201);
  });
});
