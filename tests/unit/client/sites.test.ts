import { describe, expect, test } from "vitest";
import type { PlanSummary } from "../../../server/contracts/buildings.ts";
import type { SiteRow } from "../../../server/contracts/sites.ts";
import { countStandings, findHouses, urgency } from "../../../src/features/map/list/house-order.ts";
import { stripScale } from "../../../src/features/sites/night-strip.tsx";
import { degreesBelow, sortSites } from "../../../src/features/sites/site-order.ts";
import { sitesCsv } from "../../../src/features/sites/sites-csv.ts";
import { nightDetail, nightWords } from "../../../src/features/sites/standing.ts";
import { unitsFor } from "../../../src/lib/units.ts";
import { buildingFixture } from "../../components/support/plan-fixture.ts";

const si = unitsFor("si");
const us = unitsFor("us");

function summary(change: Partial<PlanSummary> = {}): PlanSummary {
  return {
    id: "p",
    number: 1,
    status: "draft",
    createdAt: "2026-11-24T10:00:00Z",
    outdated: false,
    requiredW: 64_000,
    installedW: 45_000,
    shortW: 19_000,
    verdict: "belowCritical",
    verdictEveryday: "holds",
    onceInYearsDesignC: -8.5,
    settlesAtC: 5,
    setpointC: 14,
    hoursToCriticalLow: 0.8,
    hoursToCriticalHigh: 2.1,
    heaterKwh: 100_000,
    heaterKwhM2: 289,
    knownFrac: 0.7,
    ...change,
  };
}

function site(name: string, plan: PlanSummary | null): SiteRow {
  return {
    buildingId: name,
    buildingName: name,
    farmId: "f",
    farmName: "Low Sallow",
    place: "Kelderness",
    country: "XX",
    latitudeDeg: 54,
    longitudeDeg: -1,
    kind: "greenhouse",
    shapeType: "gothicArch",
    outline: [],
    floorAreaM2: 346,
    answered: 18,
    questions: 34,
    advisorName: "Ana",
    farmerName: null,
    plan,
    canOpen: true,
  };
}

const holds = summary({ verdict: "holds", requiredW: 30_000, shortW: 0, settlesAtC: 14 });
const tight = summary({ verdict: "holds", requiredW: 44_000, shortW: 0, settlesAtC: 14 });
const cool = summary({ verdict: "belowSetpoint", settlesAtC: 12, shortW: 4_000 });
const rows = [
  site("unknown", null),
  site("holds", holds),
  site("cold", summary()),
  site("cool", cool),
  site("tight", tight),
];
const names = (sorted: SiteRow[]) => sorted.map((row) => row.buildingName);

describe("the manager's table", () => {
  test("puts the coldest first and what nobody knows before what holds", () => {
    expect(names(sortSites(rows, "urgency", false))).toEqual(["cold", "cool", "tight", "unknown", "holds"]);
  });

  test("keeps houses without a figure last, whichever way it is sorted", () => {
    expect(names(sortSites(rows, "below", false)).at(-1)).toBe("unknown");
    expect(names(sortSites(rows, "below", true)).at(-1)).toBe("unknown");
    expect(names(sortSites(rows, "below", false))[0]).toBe("cold");
  });

  test("sorting loses no house", () => {
    for (const key of ["urgency", "name", "short", "below", "hours", "kwh", "floor", "known"] as const) {
      expect(names(sortSites(rows, key, true)).sort()).toEqual(names(rows).sort());
    }
  });

  test("a house above its set-point is not short by any degrees, an unknown one has no figure", () => {
    expect(degreesBelow(site("a", holds))).toBe(0);
    expect(degreesBelow(site("a", summary()))).toBe(9);
    expect(degreesBelow(site("a", null))).toBeNull();
  });

  test("tells a lost crop from a cool night, and says where each settles", () => {
    expect(nightWords(summary(), si)).toBe("Below critical");
    expect(nightWords(cool, si)).toBe("Below set-point");
    expect(nightWords(tight, si)).toBe("Nothing spare");
    expect(nightWords(null, si)).toBe("Not worked out");
    expect(nightDetail(site("a", summary()), us)).toBe("settles at 41\u00a0°F");
    expect(nightDetail(site("a", null), si)).toBe("18 of 34 answered");
  });

  test("all strips stand on one scale that holds the coldest air and the warmest wish", () => {
    const scale = stripScale([summary({ onceInYearsDesignC: -31 }), summary({ setpointC: 32 }), null]);
    expect(scale.lowC).toBeLessThanOrEqual(-31);
    expect(scale.highC).toBeGreaterThanOrEqual(32);
    expect(stripScale([])).toEqual({ lowC: 0, highC: 20 });
  });

  test("the file has one heading row with units and one row a house, and no name becomes a formula", () => {
    const lines = sitesCsv([site("=1+1", summary()), site('Shed "B", old', null)], us).split("\r\n");
    expect(lines).toHaveLength(3);
    expect(lines[0]).toContain("Short (kBtu/h)");
    expect(lines[1]).toMatch(/^'=1\+1,/);
    expect(lines[1]).toContain(",64.8,");
    expect(lines[2]).toMatch(/^"Shed ""B"", old",/);
    const columns = (line = "") => line.replaceAll(/"(?:[^"]|"")*"/g, "x").split(",").length;
    expect(columns(lines[1])).toBe(columns(lines[0]));
    expect(columns(lines[2])).toBe(columns(lines[0]));
  });
});

describe("the list beside the map", () => {
  const house = (name: string, plan: PlanSummary | null, farmName = "Low Sallow") => ({
    ...buildingFixture(),
    id: name,
    name,
    farmName,
    plan,
  });
  const houses = [
    house("Été", holds, "Ferme du Vent"),
    house("North", summary({ shortW: 5_000 })),
    house("South", summary({ shortW: 90_000 })),
    house("West", null),
    house("East", tight),
  ];

  test("comes most urgent first", () => {
    expect(findHouses(houses, { text: "", standing: "all" }).map((entry) => entry.name)).toEqual([
      "South",
      "North",
      "East",
      "West",
      "Été",
    ]);
  });

  test("however much is missing, a short house never comes after one that holds", () => {
    expect(urgency(house("x", summary({ shortW: 1e9 })))).toBeLessThan(urgency(house("y", tight)));
    expect(urgency(house("x", summary({ shortW: 0 })))).toBeLessThan(urgency(house("y", tight)));
  });

  test("finds by farm or name, without accents or case", () => {
    expect(findHouses(houses, { text: "ete vent", standing: "all" }).map((entry) => entry.name)).toEqual([
      "Été",
    ]);
    expect(findHouses(houses, { text: "nowhere", standing: "all" })).toEqual([]);
  });

  test("the filter and its counts agree", () => {
    const counts = countStandings(houses);
    expect(counts).toEqual({ all: 5, short: 2, tight: 1, unfinished: 1, holds: 1 });
    for (const standing of ["short", "tight", "unfinished", "holds"] as const) {
      expect(findHouses(houses, { text: "", standing })).toHaveLength(counts[standing]);
    }
  });
});
