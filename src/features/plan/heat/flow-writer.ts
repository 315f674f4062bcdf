import type { FlowsW } from "../../../components/section-drawing/heat-paths.ts";
import { joined } from "../../../lib/format.ts";
import type { Units } from "../../../lib/units.ts";

export interface FlowWriter {
  /** The bare number, for columns that carry the unit in their head. */
  plain: (heatW: number) => string;
  /** With its unit, for the drawing. */
  full: (heatW: number) => string;
}

const WHOLE_FROM = 1000;

/** One way of writing all flows of a balance, so that drawing and table show the same digits. */
export function flowWriter(flows: FlowsW, units: Units): FlowWriter {
  const greatest = Math.max(...Object.values(flows).map((flow) => units.amount(flow, "power")));
  const decimals = greatest >= WHOLE_FROM ? 0 : 1;
  const figure = (heatW: number) => units.figure(heatW, "power", { decimals });
  return { plain: (heatW) => figure(heatW).value, full: (heatW) => joined(figure(heatW)) };
}
