import { readFileSync } from "node:fs";
import { join } from "node:path";
import type { Assembly } from "../../../server/engine/plan/house-input.ts";
import { planHouse } from "../../../server/engine/plan/plan-house.ts";
import type { PlanResult } from "../../../server/engine/plan/plan-types.ts";
import { fromSi, toSi } from "../../../server/engine/units.ts";
import { typedCover } from "../../engine/plan/example-houses.ts";
import { doubleFilmTunnel, glasshouse, gutterRange, plate } from "../../engine/plan/scenario-houses.ts";
import { type CheckRow, within } from "../record-check.ts";

export const topic = "Whole houses";

const SOURCE = "hand calculation: sum of U A dT and 0.33 Wh/(m³ K) of air";
const OWN =
  "The engine's own layers under a clear sky, with the wind of the month and the inner face wet; the U-values typed above hold for an ordinary sky and 6.7 m/s.";

interface LibraryRow {
  id: string;
  layers: { solarTransmittance: number }[];
  gaps: { kind: "still"; thicknessM: number }[];
}

/** A cover of the reference table as the engine takes it. */
function libraryCover(id: string): Assembly {
  const file = join(import.meta.dirname, "../../../data/covers.json");
  const row = (JSON.parse(readFileSync(file, "utf8")) as LibraryRow[]).find((entry) => entry.id === id);
  if (row === undefined) throw new Error(`data/covers.json has no ${id}`);
  return {
    kind: "stack",
    name: id,
    solarTransmittance: 0.7,
    stack: {
      layers: row.layers as never,
      gaps: row.gaps.map((gap) => ({ ...gap, coefficientWM2K: 0, airLeakageM3HM2: 0 })),
    },
  };
}

const btuH = (watts: number) => fromSi(watts, "BtuH");
const everyday = (plan: PlanResult, state: "screensShut" | "screensOpen") =>
  plan.months[0]?.everyday[state]?.requiredHeatW ?? Number.NaN;

const uSi = (btu: number) => toSi(btu, "BtuHFt2F");
const typed = {
  tunnel: planHouse(doubleFilmTunnel(typedCover(uSi(0.7), 0.7), typedCover(uSi(0.62), 0.7))),
  glass: planHouse(glasshouse(typedCover(6.2, 0.8))),
  range: planHouse(gutterRange(typedCover(uSi(0.65), 0.7), [plate(250, "input", 6)])),
};
const own = {
  tunnel: planHouse(doubleFilmTunnel(libraryCover("double-film-blown"), libraryCover("twin-wall-8"))),
  glass: planHouse(glasshouse(libraryCover("single-glass"))),
  range: planHouse(gutterRange(libraryCover("twin-wall-8"), [plate(250, "input", 6)])),
};

function pair(quantity: string, expected: number, ofPlan: (plans: typeof typed) => number): CheckRow[] {
  return [
    {
      quantity: `${quantity}, U typed`,
      source: SOURCE,
      computed: ofPlan(typed),
      expected,
      tolerance: within(expected, 0.05),
    },
    {
      quantity: `${quantity}, own layers`,
      source: SOURCE,
      computed: ofPlan(own),
      expected,
      tolerance: within(expected, 0.15),
      remark: OWN,
    },
  ];
}

export const rows: CheckRow[] = [
  ...pair("Double-film tunnel at 3 °F, Btu/h", 204_400, ({ tunnel }) =>
    btuH(everyday(tunnel, "screensShut")),
  ),
  ...pair("Double-film tunnel at -15 °F, Btu/h", 268_900, ({ tunnel }) =>
    btuH(tunnel.sizing.onceInYearsRequiredW),
  ),
  ...pair("Glasshouse at -10 °C, screens open, W", 4.04e6, ({ glass }) => everyday(glass, "screensOpen")),
  ...pair("Glasshouse at -10 °C, screens shut, W", 2.68e6, ({ glass }) => everyday(glass, "screensShut")),
  ...pair("Twin-wall range at -5 °F, Btu/h", 1_159_000, ({ range }) => btuH(everyday(range, "screensShut"))),
  ...pair("Twin-wall range at -20 °F, Btu/h", 1_407_000, ({ range }) =>
    btuH(range.sizing.onceInYearsRequiredW),
  ),
];
