import { ATTIC_AIR_CHANGES_PER_HOUR } from "../balance/attic.ts";
import { coverIsWet } from "../balance/prepare-shell.ts";
import { TABLE_WIND_MS } from "../balance/typed-u-value.ts";
import { NIGHT_HUMIDITY_FRAC } from "./house-air.ts";
import type { Assembly, HousePart, HousePlanInput } from "./house-input.ts";
import type { HouseModel } from "./house-model.ts";
import { SNOW_TEMP_C } from "./night-balances.ts";
import type { PlanClimate } from "./plan-climate.ts";
import { LAMP_SENSIBLE_SHARE } from "./plan-energy.ts";
import { PICKUP_MARGIN_FRAC } from "./plan-sizing.ts";
import type { InputOrigin, PlanAssumption } from "./plan-types.ts";

/** Survey path of each part's cover. */
const COVER_FIELDS: Record<HousePart, { field: string; label: string }> = {
  roof: { field: "covers.roof", label: "Roof" },
  sideWall: { field: "covers.sides", label: "Side walls" },
  endWall: { field: "covers.ends", label: "End walls" },
  ceiling: { field: "covers.ceiling", label: "Ceiling" },
  kneewall: { field: "covers.kneewall", label: "Kneewall" },
};

/**
 * Every assumption of a plan with where it came from: the survey's answers first, then the engine's own rules.
 * Shape: model, climate → list. Source: each entry names its own.
 */
export function planAssumptions(model: HouseModel, climate: PlanClimate): PlanAssumption[] {
  const { input } = model;
  return [
    ...coverAssumptions(input),
    ...hooccupancyAssumptions(input),
    ...occupancyAssumptions(input),
    ...climateAssumptions(input, climate),
    ...ruleAssumptions(model),
  ];
}

/** Origin of an answer: its own, else that of the group it belongs to, else a default. */
export function originOf(input: HousePlanInput, field: string): InputOrigin {
  const origins = input.origins;
  const own = origins[field];
  if (own) return own;
  const below = Object.keys(origins).find((path) => path.startsWith(`${field}.`));
  if (below) return origins[below] ?? "default";
  const parent = field.slice(0, field.lastIndexOf("."));
  return parent.length > 0 ? originOf(input, parent) : "default";
}

function entry(
  input: HousePlanInput,
  field: string,
  label: string,
  value: number | string,
  unit: string,
  source: string,
): PlanAssumption {
  return { field, label, value, unit, origin: originOf(input, field), source };
}

function coverAssumptions(input: HousePlanInput): PlanAssumption[] {
  const parts = Object.entries(input.covers) as [HousePart, Assembly | undefined][];
  return parts.flatMap(([part, assembly]) => {
    if (!assembly) return [];
    const { field, label } = COVER_FIELDS[part];
    return assembly.kind === "uValue"
      ? [
          entry(
            input,
            field,
            `${label}: U-value as typed`,
            assembly.uValueWM2K,
            "WM2K",
            "survey; used as typed on design nights, at the wind of the hour in the year (ISO 6946 outside film)",
          ),
        ]
      : [
          entry(
            input,
            field,
            label,
            assembly.name,
            "",
            "library; balance of the layers with radiation to the sky",
          ),
        ];
  });
}

function hooccupancyAssumptions(input: HousePlanInput): PlanAssumption[] {
  const list = [
    entry(
      input,
      "leakage.airChanges",
      "Air changes by leaks",
      input.leakageAirChangesPerHour,
      "perHour",
      "survey or library class",
    ),
    entry(
      input,
      "floor.edgeLoss",
      "Loss along the floor edge",
      input.floorEdgeLossWMK,
      "WMK",
      "survey or library row; times the difference between inside and outside air",
    ),
    entry(input, "shelter", "Shelter from wind", input.site.shelter, "", "survey"),
    entry(
      input,
      "covers.frame",
      "Sun that passes frame and dirt",
      input.frameAndDirtFrac,
      "percent",
      "common practice, no source",
    ),
  ];
  const { screen } = input;
  if (screen)
    list.push(
      entry(
        input,
        "screen.coverage",
        "Share of the roof the screen covers",
        screen.coverageFrac,
        "percent",
        "survey",
      ),
      entry(
        input,
        "screen.screen",
        "Heat saved through a U-value behind the closed screen",
        screen.savingFrac,
        "percent",
        "library row; the layers' own balance where the roof is given as layers",
      ),
    );
  return list;
}

function occupancyAssumptions(input: HousePlanInput): PlanAssumption[] {
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
        "CIGR 4th report 2002 at house level, as a mean over the day",
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

function climateAssumptions(input: HousePlanInput, climate: PlanClimate): PlanAssumption[] {
  const typical = (origin: string | undefined): InputOrigin =>
    origin === "read" || origin === "derived" ? "measured" : "default";
  const origins = climate.months[0]?.origins ?? {};
  const rows: [string, string, number | string, string, string][] = [
    [
      "climate.everyday",
      "Everyday design night",
      climate.site.everyday.tempC,
      "C",
      climate.site.everyday.how,
    ],
    [
      "climate.onceInYears",
      `Coldest night once in ${input.returnPeriodYears} years`,
      climate.site.onceInYears.tempC,
      "C",
      climate.site.onceInYears.how,
    ],
    ["climate.humidity", "Humidity", origins.humidity ?? "", "", `station normals, ${origins.humidity}`],
    ["climate.wind", "Wind", origins.wind ?? "", "", `station normals, ${origins.wind}`],
    ["climate.global", "Sun on the flat", origins.global ?? "", "", `station normals, ${origins.global}`],
  ];
  const key: Record<string, string> = {
    "climate.everyday": "everydayDesign",
    "climate.onceInYears": "onceInYearsDesign",
    "climate.humidity": "humidity",
    "climate.wind": "wind",
    "climate.global": "global",
  };
  return rows.map(([field, label, value, unit, source]) => ({
    field,
    label,
    value,
    unit,
    origin: typical(origins[key[field] ?? ""]),
    source,
  }));
}

function ruleAssumptions(model: HouseModel): PlanAssumption[] {
  const { input } = model;
  const rule = (
    field: string,
    label: string,
    value: number | string,
    unit: string,
    source: string,
  ): PlanAssumption => ({ field: `engine.${field}`, label, value, unit, origin: "default", source });
  const list = [
    rule(
      "designNight",
      "Design nights",
      "dark, clear sky, mean wind of the month",
      "",
      "common practice, no source",
    ),
    rule(
      "nightHumidity",
      "Humidity of cold outdoor air",
      NIGHT_HUMIDITY_FRAC,
      "percent",
      "common practice: 80 to 90 %",
    ),
    rule(
      "tableWind",
      "Wind of tabulated U-values",
      TABLE_WIND_MS,
      "ms",
      "ASHRAE Handbook, HVAC Applications (from memory)",
    ),
    rule(
      "margin",
      "Pick-up margin on the everyday need",
      PICKUP_MARGIN_FRAC,
      "percent",
      "common practice: 10 to 25 %",
    ),
    rule(
      "evaporation",
      "Heat taken by water that evaporates at night",
      "not counted; 7 to 11 W for each m² of floor under a full crop",
      "",
      "night transpiration 120 to 200 g/m², cucumber, Scientia Horticulturae 2005",
    ),
  ];
  if (input.screen?.opensForSnow)
    list.push(
      rule(
        "snow",
        "Snow night",
        SNOW_TEMP_C,
        "C",
        "common practice: screens open, overcast, roof kept melting",
      ),
    );
  if (input.kind === "greenhouse")
    list.push(
      rule(
        "wetCover",
        "Inner face of layered covers",
        coverIsWet(input) ? "wet, as in a cropped house" : "dry",
        "",
        "Feuilloley and Issanchou 1996: condensation changes the loss of films",
      ),
    );
  if (input.shape.type === "atticBarn")
    list.push(
      rule(
        "attic",
        "Air changes of the attic",
        ATTIC_AIR_CHANGES_PER_HOUR,
        "perHour",
        "common practice, no source",
      ),
    );
  return list;
}
