import type { HouseBalance, PlanAssumption, PlanResult } from "../../../../server/engine/plan/plan-types.ts";
import type { HeatPath } from "../../../components/section-drawing/heat-paths.ts";
import type { Units } from "../../../lib/units.ts";
import { togetherByRoofSide } from "./roof-sides.ts";

/** A number opened to its parts: how it is worked out in words, and what went in. */
export interface Why {
  method: string;
  parts: { name: string; value: string }[];
  /** Survey answers it rests on, by the beginning of their path. */
  restsOn: string[];
}

const governing: Record<string, string> = {
  moisture: "the moisture the stock gives off",
  carbonDioxide: "the carbon dioxide the stock gives off",
  perHead: "the published rate for each animal",
  legal: "the least rate that rules ask for",
  typed: "the rate that was measured",
  leakage: "leaks alone",
};

/** Why the flow along one path is as large as it is. */
export function whyFlow(path: HeatPath, balance: HouseBalance, units: Units): Why {
  const difference = balance.insideTempC - balance.outdoorTempC;
  const inside = { name: "Inside air", value: units.temperature(balance.insideTempC) };
  const outside = { name: "Outside air", value: units.temperature(balance.outdoorTempC) };
  const step = { name: "Difference", value: units.text(difference, "temperatureDifference") };
  const surfaces = togetherByRoofSide(balance.surfaces).map((surface) => ({
    name: surface.label,
    value: `${units.text(surface.areaM2, "area")}, ${units.text(surface.uValueWM2K, "uValue")}`,
  }));
  switch (path) {
    case "cover":
      return {
        method:
          "For each surface: heat moves from the room to the inner face, through the layers, and from the outer face into the open, as if the sky were as warm as the outside air. What the cold sky adds is listed apart.",
        parts: [inside, outside, step, ...surfaces],
        restsOn: ["covers", "screen", "shape", "shelter"],
      };
    case "sky":
      return {
        method:
          "The outer faces, and the room itself where the cover lets warmth through, radiate to a sky that is colder than the air, by the fourth power of the temperatures. Listed here is what that adds: the loss under this sky less the loss under a sky as warm as the air.",
        parts: [
          { name: "Sky", value: units.temperature(balance.skyTempC) },
          outside,
          ...togetherByRoofSide(balance.surfaces)
            .filter((surface) => surface.toSkyW > 0)
            .map((surface) => ({ name: surface.label, value: units.text(surface.toSkyW, "power") })),
        ],
        restsOn: ["covers", "screen"],
      };
    case "air":
      return {
        method:
          "Air that leaves is replaced by outside air, which has to be warmed: air flow × heat held by a cubic metre × difference in temperature." +
          (balance.surplusW > 0
            ? " Heat beyond what the house needs is let out with more air and counted here."
            : ""),
        parts: [
          { name: "Air leaving", value: units.text(balance.ventilationM3H, "airFlow") },
          { name: "Set by", value: governing[balance.ventilationGoverns] ?? balance.ventilationGoverns },
          step,
          ...(balance.surplusW > 0
            ? [{ name: "Surplus let out", value: units.text(balance.surplusW, "power") }]
            : []),
        ],
        restsOn: ["leakage", "use.winterVentilation", "use.heatRecovery", "shelter"],
      };
    case "ground":
      return {
        method:
          "Most heat leaves along the edge of the floor: length of the edge × loss for each metre × difference in temperature, and a small part straight down to the soil.",
        parts: [{ name: "Soil", value: units.temperature(balance.soilTempC) }, inside, outside],
        restsOn: ["floor"],
      };
    case "sun":
      return {
        method:
          "Design hours are dark, so no sun is counted on. The month table holds the sun's share of a normal year.",
        parts: [],
        restsOn: ["covers"],
      };
    case "stock":
      return {
        method:
          "Heat the animals give off as warmth (not as moisture), by number, mass and room temperature.",
        parts: [inside],
        restsOn: ["use.animal", "months"],
      };
    case "lights":
      return {
        method: "Lamp power for each square metre × floor area, only in the hours the lamps are on.",
        parts: [],
        restsOn: ["use.lamps", "use.lampHours"],
      };
    case "heater":
      return {
        method: "What must be made up: all losses less all gains. Never less than nothing.",
        parts: [
          { name: "Fitted heaters give", value: units.text(balance.installedHeatW, "power") },
          { name: "House would settle at", value: units.temperature(balance.settlesAtC) },
        ],
        restsOn: ["heaters"],
      };
  }
}

/** The assumptions a number rests on. */
export function assumptionsFor(why: Why, result: PlanResult): PlanAssumption[] {
  return result.assumptions.filter((assumption) =>
    why.restsOn.some((path) => assumption.field === path || assumption.field.startsWith(`${path}.`)),
  );
}
