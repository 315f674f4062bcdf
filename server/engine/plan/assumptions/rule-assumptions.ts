import { ATTIC_AIR_CHANGES_PER_HOUR } from "../../balance/attic.ts";
import { coverIsWet } from "../../balance/prepare-shell.ts";
import { TABLE_WIND_MS } from "../../balance/typed-u-value.ts";
import { NIGHT_HUMIDITY_FRAC } from "../house-air.ts";
import type { HousePlanInput } from "../house-input.ts";
import type { HouseModel } from "../house-model.ts";
import { SNOW_TEMP_C } from "../night-balances.ts";
import type { PlanClimate } from "../plan-climate.ts";
import { PICKUP_MARGIN_FRAC } from "../plan-sizing.ts";
import type { InputOrigin, PlanAssumption } from "../plan-types.ts";

/** Design nights and the station's figures. Shape: input, climate → list. */
export function climateAssumptions(input: HousePlanInput, climate: PlanClimate): PlanAssumption[] {
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

/** The engine's own rules that bear on this house. Shape: model → list. */
export function ruleAssumptions(model: HouseModel): PlanAssumption[] {
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
