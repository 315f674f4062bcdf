import { screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, test, vi } from "vitest";
import type { PlanSummary } from "../../server/contracts/buildings.ts";
import type { SiteRow, SitesView } from "../../server/contracts/sites.ts";
import { SitesScreen } from "../../src/features/sites/sites-screen.tsx";
import { buildingFixture } from "./support/plan-fixture.ts";
import { meFixture, showScreen } from "./support/with-client.tsx";

vi.mock("../../src/features/sites/sites-map.tsx", () => ({ SitesMap: () => <p>map</p> }));

function plan(change: Partial<PlanSummary>): PlanSummary {
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

function row(id: string, change: Partial<SiteRow>): SiteRow {
  return {
    buildingId: id,
    buildingName: id,
    farmId: "f1",
    farmName: "Low Sallow",
    place: "Kelderness",
    country: "XX",
    latitudeDeg: 54,
    longitudeDeg: -1,
    kind: "greenhouse",
    shapeType: "gothicArch",
    outline: buildingFixture().outline,
    floorAreaM2: 346,
    answered: 18,
    questions: 34,
    advisorName: null,
    farmerName: null,
    plan: null,
    canOpen: false,
    ...change,
  };
}

const rows = [
  row("Calf shed", { kind: "barn", plan: plan({ verdict: "notApplicable", shortW: 0 }) }),
  row("House A", {
    farmId: "f2",
    plan: plan({ verdict: "holds", requiredW: 30_000, shortW: 0, settlesAtC: 14 }),
  }),
  row("Tunnel 2", { plan: plan({}), canOpen: true }),
  row("Lambing tunnel", {}),
];

function show(sites: SiteRow[] = rows, at = "/sites") {
  const view: SitesView = { cooperativeId: "c1", cooperativeName: "Hill and Shore", rows: sites };
  return showScreen(<SitesScreen />, {
    at,
    path: "/sites",
    data: [
      [["me"], meFixture({ activeRole: "manager" })],
      [["cooperatives", "c1", "sites"], view],
    ],
  });
}

const names = () =>
  within(screen.getByRole("table", { name: "Houses of the co-operative" }))
    .getAllByRole("rowheader")
    .map((cell) => cell.textContent);

describe("the manager's page", () => {
  test("says the answer first, and counts what nobody knows apart", () => {
    show();
    expect(screen.getByText(/^\d+ will not hold/).textContent).toBe(
      "1 will not hold on the coldest night, by 19\u00a0kW together; 1 of them would fall below what crop or stock can stand.",
    );
    expect(screen.getByText(/not known/, { selector: "b" }).textContent).toContain("1 is not known");
  });

  test("opens with the house to act on first", () => {
    show();
    expect(names()[0]).toMatch(/^Tunnel 2/);
    expect(screen.getByRole("columnheader", { name: /Coldest night/ }).getAttribute("aria-sort")).toBe(
      "ascending",
    );
  });

  test("sorts by a column, turns it round, and keeps the order in the address", async () => {
    const person = userEvent.setup();
    const { router } = show();
    const head = () => screen.getByRole("columnheader", { name: /^Building/ });
    await person.click(within(head()).getByRole("button"));
    expect(names()[0]).toMatch(/^Calf shed/);
    expect(head().getAttribute("aria-sort")).toBe("ascending");
    await person.click(within(head()).getByRole("button"));
    expect(names()[0]).toMatch(/^Tunnel 2/);
    expect(router.state.location.search).toContain("by=name");
    expect(router.state.location.search).toContain("down=1");
  });

  test("shows only barns when asked, and says so when nothing is left", async () => {
    const person = userEvent.setup();
    show();
    await person.click(screen.getByRole("radio", { name: "Stock barns" }));
    expect(names()).toHaveLength(1);
    await person.click(screen.getByRole("radio", { name: "Short" }));
    expect(screen.getByText("No building fits this choice.")).toBeTruthy();
  });

  test("leads into a house only where the farmer allows it", () => {
    show();
    expect(screen.getByRole("link", { name: "Tunnel 2" })).toBeTruthy();
    expect(screen.queryByRole("link", { name: "House A" })).toBeNull();
  });

  test("an unknown house shows a dash and never a nought", () => {
    show();
    const unknown = screen.getByRole("row", { name: /Lambing tunnel/ });
    expect(within(unknown).getByText("Not worked out")).toBeTruthy();
    expect(within(unknown).getAllByText("–").length).toBeGreaterThanOrEqual(5);
    expect(within(unknown).queryByText("0")).toBeNull();
  });

  test("a co-operative without buildings is told the next step", () => {
    show([]);
    expect(screen.getByText("No buildings yet")).toBeTruthy();
  });
});
