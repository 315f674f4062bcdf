import type { UnitSystem } from "../../../server/engine/units.ts";
import { temperature } from "../../lib/format.ts";
import { type FlowsW, type HeatPath, heatPaths, pathsIn, pathsOut } from "./heat-paths.ts";

export interface SectionTemperatures {
  insideC: number;
  outsideC: number;
  skyC: number;
  soilC: number;
  /** Faces of the roof from the room outwards; empty when not known. */
  faces: { name: string; tempC: number }[];
}

/** The sentence a screen reader speaks in place of the drawing. */
export function spokenFlows(
  flows: FlowsW,
  temperatures: SectionTemperatures,
  written: (heatW: number) => string,
  system: UnitSystem,
): string {
  const list = (paths: readonly HeatPath[]) =>
    paths.map((path) => `${heatPaths[path].name.toLowerCase()} ${written(flows[path])}`).join(", ");
  return (
    `Section through the house with its heat. Outside ${temperature(temperatures.outsideC, system)}, ` +
    `inside ${temperature(temperatures.insideC, system)}. Going out: ${list(pathsOut)}. Coming in: ${list(pathsIn)}.`
  );
}
