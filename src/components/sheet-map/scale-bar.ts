import { fromSi, toSi, type UnitSystem } from "../../../server/engine/units.ts";

export interface ScaleBar {
  /** Length of the whole bar on the screen. */
  widthPx: number;
  /** Figures at the start, the middle and the end, in `unit`. */
  ticks: [number, number, number];
  unit: "km" | "m" | "mi" | "ft";
}

/** Largest of 1, 2, 5 × a power of ten that is not above `value`. */
function roundBelow(value: number): number {
  const power = 10 ** Math.floor(Math.log10(value));
  const lead = value / power;
  return (lead >= 5 ? 5 : lead >= 2 ? 2 : 1) * power;
}

/** A bar of a round length that fits into `mostPx`; small ones are told in metres or feet. */
export function scaleBar(metresPerPx: number, mostPx: number, system: UnitSystem): ScaleBar {
  const mostM = metresPerPx * mostPx;
  const large = system === "si" ? "km" : "mi";
  const small = system === "si" ? "m" : "ft";
  const unit = fromSi(mostM, large) >= 1 ? large : small;
  const end = roundBelow(fromSi(mostM, unit));
  return { widthPx: toSi(end, unit) / metresPerPx, ticks: [0, end / 2, end], unit };
}
