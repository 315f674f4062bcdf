import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { Survey, SurveyView } from "../../server/contracts/survey.ts";
import { Assembly } from "../../server/models/assembly.ts";
import { Building } from "../../server/models/building.ts";
import { Farm } from "../../server/models/farm.ts";
import { tunnelBody } from "../support/factories.ts";
import { startTestApp, type TestApp } from "../support/test-app.ts";
import { buildWorld, type World } from "../support/world.ts";

describe("pinning and surveying", () => {
  let app: TestApp;
  let world: World;
  beforeAll(async () => {
    app = await startTestApp("survey");
    world = await buildWorld(app);
  });
  afterAll(() => app.close());

  const path = () => `/api/buildings/${world.buildingId}/survey`;
  const read = async () => (await world.advisor.get(path())).body as SurveyView;
  const save = (version: number, survey: Survey) => world.advisor.put(path(), { version, survey });

  it("keeps what was typed as it was typed", async () => {
    const { survey } = await read();
    expect(survey.shape.length).toEqual({ typed: "96", unit: "ft", origin: "measured" });
    const building = (await world.advisor.get(`/api/buildings/${world.buildingId}`)).body;
    expect(building.lengthM).toBeCloseTo(29.2608, 4);
    expect(building.station.name).toBeTruthy();
    expect(building.station.distanceKm).toBeGreaterThan(0);
  });

  it("saves a change, raises the version and counts the answer", async () => {
    const before = await read();
    const survey = structuredClone(before.survey);
    survey.frostHollow = { typed: "2.50", unit: "K", origin: "measured" };
    const saved = await save(before.version, survey);
    expect(saved.status).toBe(200);
    expect(saved.body.version).toBe(before.version + 1);
    expect(saved.body.survey.frostHollow.typed).toBe("2.50");
    expect(saved.body.answered).toBe(before.answered + 1);
  });

  it("refuses a stale save in words and stores nothing of it", async () => {
    const before = await read();
    const mine = structuredClone(before.survey);
    mine.shelter = { value: "open", origin: "measured" };
    const theirs = structuredClone(before.survey);
    theirs.shelter = { value: "sheltered", origin: "measured" };
    expect((await world.farmer.put(path(), { version: before.version, survey: theirs })).status).toBe(200);
    const refused = await save(before.version, mine);
    expect(refused.status).toBe(409);
    expect(refused.body.error.code).toBe("stale");
    expect(refused.body.error.message).toContain("Test fionn");
    expect((await read()).survey.shelter.value).toBe("sheltered");
  });

  it("lets only one of two saves at the same moment through", async () => {
    const before = await read();
    const answers = await Promise.all([
      save(before.version, before.survey),
      save(before.version, before.survey),
    ]);
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409]);
  });

  it.each([
    [
      "a set-point of 200",
      (s: Survey) => {
        s.months[0]!.nightSetpoint = { typed: "200", unit: "C", origin: "guess" };
      },
      "months.0.nightSetpoint",
      /Night temperature must lie between -5 °C and 40 °C. You typed 200 °C/,
    ],
    [
      "a negative length",
      (s: Survey) => {
        s.shape.length = { typed: "-30", unit: "m", origin: "measured" };
      },
      "shape.length",
      /Length must lie between 2 m and 1000 m. You typed -30 m/,
    ],
    [
      "words for a number",
      (s: Survey) => {
        s.elevation = { typed: "high", unit: "m", origin: "guess" };
      },
      "elevation",
      /must be a number/,
    ],
    [
      "a length in degrees",
      (s: Survey) => {
        s.shape.length = { typed: "30", unit: "C", origin: "measured" };
      },
      "shape.length",
      /cannot be given in °C/,
    ],
    [
      "a cover that is not there",
      (s: Survey) => {
        s.covers.roof.cover.value = "gold-leaf";
      },
      "covers.roof.cover",
      /gold-leaf/,
    ],
    [
      "a ceiling as a roof",
      (s: Survey) => {
        s.covers.roof.cover.value = "ceiling-r30";
      },
      "covers.roof.cover",
      /not made for this part/,
    ],
    [
      "a screen nobody knows",
      (s: Survey) => {
        s.leakage.class.value = "sieve";
      },
      "leakage.class",
      /sieve/,
    ],
  ])("refuses %s and names field, value and range", async (_name, spoil, field, words) => {
    const before = await read();
    const survey = structuredClone(before.survey);
    spoil(survey);
    const answer = await save(before.version, survey);
    expect(answer.status).toBe(422);
    const fields = answer.body.error.fields as Record<string, string>;
    const key = Object.keys(fields).find((name) => name.replace(/^survey\./, "") === field);
    expect(key).toBeDefined();
    expect(fields[key as string]).toMatch(words);
    expect(await read()).toEqual(before);
  });

  it("refuses an arch that cannot stand over its width", async () => {
    const before = await read();
    const survey = structuredClone(before.survey);
    if (survey.shape.type !== "roundArch") throw new Error("not the tunnel");
    survey.shape.rise = { typed: "45", unit: "ft", origin: "measured" };
    const answer = await save(before.version, survey);
    expect(answer.status).toBe(422);
    expect(answer.body.error.fields["shape.rise"]).toMatch(
      /Arch rise must lie between .* ft .* You typed 45 ft/,
    );
    expect((await read()).version).toBe(before.version);
  });

  it("stores nothing when the last of many rows is refused", async () => {
    const rows = await Assembly.count({ where: { buildingId: world.buildingId } });
    const before = await read();
    const survey = structuredClone(before.survey);
    survey.months[11]!.daySetpoint = { typed: "99", unit: "C", origin: "guess" };
    expect((await save(before.version, survey)).status).toBe(422);
    expect(await Assembly.count({ where: { buildingId: world.buildingId } })).toBe(rows);
  });

  const pin = (body: object) =>
    world.advisor.post(`/api/farms/${world.farmId}/buildings`, { ...tunnelBody, ...body });

  it("names swapped coordinates, a wrong sign and an impossible latitude", async () => {
    const count = await Building.count();
    const swapped = await pin({ position: { latitudeDeg: -7.48, longitudeDeg: 53.36 } });
    expect(swapped.status).toBe(422);
    expect(swapped.body.error.fields.position).toMatch(/latitude and longitude look swapped/);
    const sign = await pin({ position: { latitudeDeg: 53.36, longitudeDeg: 7.48 } });
    expect(sign.body.error.fields.position).toMatch(/sign of the longitude/);
    const impossible = await pin({ position: { latitudeDeg: 153.36, longitudeDeg: 7.48 } });
    expect(impossible.body.error.fields["position.latitudeDeg"]).toMatch(/between -90° and 90°/);
    expect(await Building.count()).toBe(count);
    const confirmed = await pin({
      position: { latitudeDeg: 53.36, longitudeDeg: 7.48 },
      farFromFarmConfirmed: true,
    });
    expect(confirmed.status).toBe(201);
  });

  it("cuts a huge body off, refuses broken JSON, and keeps working", async () => {
    const huge = await world.advisor.put(path(), { version: 1, survey: "x".repeat(3_000_000) });
    expect(huge.status).toBe(413);
    expect(huge.body.error.message).toMatch(/At most 1 MB/);
    const me = await world.advisor.get("/api/me");
    expect(me.status).toBe(200);
  });

  it("a manager opens a survey only with the farmer's consent", async () => {
    expect((await world.manager.get(path())).status).toBe(404);
    expect(
      (await world.advisor.patch(`/api/farms/${world.farmId}`, { sharedWithManager: true })).status,
    ).toBe(403);
    expect((await world.farmer.patch(`/api/farms/${world.farmId}`, { sharedWithManager: true })).status).toBe(
      200,
    );
    expect((await world.manager.get(path())).status).toBe(200);
    const current = await read();
    expect(
      (await world.manager.put(path(), { version: current.version, survey: current.survey })).status,
    ).toBe(403);
    await Farm.update({ sharedWithManager: false }, { where: { id: world.farmId } });
  });
});
