import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { MemoryRouter } from "react-router-dom";
import { describe, expect, test } from "vitest";
import type { BuildingView } from "../../server/contracts/buildings.ts";
import type { UnitSystem } from "../../server/engine/units.ts";
import { flowsOf, heatPaths, pathsOut } from "../../src/components/section-drawing/heat-paths.ts";
import { HeatPage } from "../../src/features/plan/heat/heat-page.tsx";
import { unitsFor } from "../../src/lib/units.ts";
import { buildingFixture, planFixture } from "./support/plan-fixture.ts";

const building: BuildingView = {
  ...buildingFixture(),
  station: {
    id: "ness",
    name: "Ness of Keld",
    country: "",
    distanceKm: 18,
    elevationM: 10,
    heightDifferenceM: -32,
    caution: null,
  },
  stationChosen: false,
  can: { update: true, delete: true, plan: true, readSurvey: true },
};

function show(system: UnitSystem = "si", address = "/") {
  const plan = planFixture();
  render(
    <MemoryRouter initialEntries={[address]}>
      <HeatPage building={building} plan={plan} library={undefined} units={unitsFor(system)} />
    </MemoryRouter>,
  );
  return plan;
}

const balanceTable = () =>
  screen.getByRole("table", { name: "Heat going out and coming in at the chosen hour" });
const drawing = () => screen.getAllByRole("img", { name: /^Section through the house with its heat/ })[0]!;

describe("the heat page", () => {
  test("says the answer first, with numbers", () => {
    show();
    expect(screen.getByText(/19\skW short on the coldest night once in 20 years/)).toBeDefined();
  });

  test.each(["si", "us"] as const)("the drawing and the table show the same digits in %s", (system) => {
    const plan = show(system);
    const balance = plan.result.months[0]?.onceInYears.screensShut;
    if (!balance) throw new Error("The example has a January.");
    const units = unitsFor(system);
    for (const path of pathsOut) {
      const engineW = flowsOf(balance)[path];
      const digits = units.figure(engineW, "power", { decimals: 1 });
      const row = within(balanceTable()).getByRole("row", { name: new RegExp(heatPaths[path].name) });
      expect(row.textContent).toContain(digits.value);
      expect(drawing().textContent).toContain(`${digits.value}\u00a0${digits.unit}`);
      expect(drawing().getAttribute("aria-label")).toContain(`${digits.value}\u00a0${digits.unit}`);
    }
  });

  test("choosing a month changes drawing and table together", async () => {
    const person = userEvent.setup();
    show();
    await person.click(screen.getByRole("radio", { name: /^July/ }));
    expect(screen.getByRole("heading", { name: /^July, coldest night/ })).toBeDefined();
    expect(drawing().textContent).toContain("25.7\u00a0kW");
    expect(within(balanceTable()).getByRole("row", { name: /All losses/ }).textContent).toContain("25.7");
  });

  test("a number opens to its method, its parts and the answers it rests on", async () => {
    const person = userEvent.setup();
    show();
    await person.click(screen.getByRole("button", { name: /Into the ground/ }));
    const opened = within(balanceTable());
    expect(opened.getByText(/length of the edge/)).toBeDefined();
    expect(opened.getByText("Edge of the floor")).toBeDefined();
    expect(opened.getByText(/library of floor edges/)).toBeDefined();
  });

  test("the address carries the view, so that it can be sent to somebody", () => {
    show("si", "/?month=3&night=everyday&state=largestUnitOut");
    expect(screen.getByRole("heading", { name: "March, ordinary cold night" })).toBeDefined();
    expect(screen.getByRole("radio", { name: "Largest heater out" })).toHaveProperty("checked", true);
  });

  test("the month table adds up to the year", () => {
    show();
    const table = screen.getByRole("table", { name: "Month by month" });
    const rows = within(table).getAllByRole("row").slice(1);
    const last = (row: HTMLElement) => Number(row.lastElementChild?.textContent?.replaceAll(",", ""));
    const months = rows.slice(0, 12).reduce((sum, row) => sum + last(row), 0);
    expect(Math.abs(months - last(rows[12]!))).toBeLessThanOrEqual(6);
  });

  test("warnings stand worst first", () => {
    show();
    const items = within(screen.getByRole("region", { name: "Warnings" })).getAllByRole("listitem");
    expect(items[0]?.textContent).toContain("Caution");
    expect(items[1]?.textContent).toContain("Note");
  });

  test("what was assumed is listed before what was measured", () => {
    show();
    const text = screen.getByRole("region", { name: "What this rests on" }).textContent ?? "";
    expect(text.indexOf("Roof bow")).toBeLessThan(text.indexOf("Roof cover"));
  });
});
