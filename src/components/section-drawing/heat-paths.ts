import type { HouseBalance } from "../../../server/engine/plan/plan-types.ts";

/** The eight ways heat takes, with the name, colour, hatch and mark they carry on every screen. */
export type HeatPath = "cover" | "sky" | "air" | "ground" | "sun" | "stock" | "lights" | "heater";

export interface HeatPathLook {
  name: string;
  direction: "out" | "in" | "bought";
}

export const heatPaths: Record<HeatPath, HeatPathLook> = {
  cover: { name: "Through the cover", direction: "out" },
  sky: { name: "To the sky", direction: "out" },
  air: { name: "Air leaving", direction: "out" },
  ground: { name: "Into the ground", direction: "out" },
  sun: { name: "From the sun", direction: "in" },
  stock: { name: "From the stock", direction: "in" },
  lights: { name: "From the lights", direction: "in" },
  heater: { name: "From the heaters", direction: "bought" },
};

/** Fixed order, so that the eye learns where each path stands. */
export const pathsOut = ["cover", "sky", "air", "ground"] as const satisfies HeatPath[];
export const pathsIn = ["heater", "sun", "stock", "lights"] as const satisfies HeatPath[];

export type FlowsW = Record<HeatPath, number>;

/** The flows of one balance. A surplus is let out by opening up, so it leaves with the air. */
export function flowsOf(balance: HouseBalance): FlowsW {
  return {
    ...balance.lossesW,
    air: balance.lossesW.air + balance.surplusW,
    ...balance.gainsW,
    heater: balance.requiredHeatW,
  };
}

export function totalOut(flows: FlowsW): number {
  return pathsOut.reduce((sum, path) => sum + flows[path], 0);
}

export function totalIn(flows: FlowsW): number {
  return pathsIn.reduce((sum, path) => sum + flows[path], 0);
}
