import type { HousePlanInput } from "../house-input.ts";
import { LAMP_SENSIBLE_SHARE } from "../plan-energy.ts";
import type { PlanAssumption } from "../plan-types.ts";
import { entry } from "./assumption-entry.ts";

/** Crop, lamps, stock and their air. Shape: input → list. */
export function occupancyAssumptions(input: HousePlanInput): PlanAssumption[] {
  const list: PlanAssumption[] = [
    entry(input, "criticalTemp", "Critical temperature", input.criticalTempC, "C", "survey or library row"),
  ];
  if (input.crop)
    list.push(
      entry(
        input,
        "use.crop",
        "Share of the sun that warms the air",
        input.crop.sensibleShareFrac,
        "percent",
        "library row; the rest evaporates water",
      ),
    );
  if (input.lampsWM2 > 0)
    list.push(
      entry(
        input,
        "use.lamps",
        "Lamp power that warms the air",
        LAMP_SENSIBLE_SHARE,
        "percent",
        "common practice: 0.7 to 0.9",
      ),
    );
  const { stock } = input;
  if (stock) {
    const typed = stock.ventilation.mode === "typed";
    list.push(
      entry(
        input,
        "use.winterVentilation",
        typed ? "Winter ventilation as measured" : "Winter ventilation",
        stock.ventilation.mode === "typed"
          ? stock.ventilation.flowM3H
          : "the most of moisture, carbon dioxide and the rate for each animal",
        typed ? "m3h" : "",
        typed ? "survey" : "balances of water and carbon dioxide; CIGR 4th report 2002, Directive 2007/43/EC",
      ),
      entry(
        input,
        "use.animal",
        "Heat of the animals",
        stock.name,
        "",
        "CIGR 4th report 2002 at house level; on design nights at the low of the animals' night, in the year as a mean over the day",
      ),
      entry(
        input,
        "leakage.underFans",
        "Leaks under running fans",
        input.leakageUnderFans === "added" ? "on top of the fans" : "part of the fans' flow",
        "",
        "common practice, no source",
      ),
    );
  }
  return list;
}
