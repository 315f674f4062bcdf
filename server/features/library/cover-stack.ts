import type { CoverStack } from "../../engine/envelope/cover-types.ts";
import type { CoverRow } from "./reference-data.ts";

/** A library row as the engine takes it. */
export function stackOf(row: CoverRow): CoverStack {
  return {
    layers: row.layers.map(({ thicknessMm: _thickness, ...layer }) => layer),
    gaps: row.gaps.map((gap) => ({
      kind: gap.kind,
      thicknessM: gap.thicknessM,
      coefficientWM2K: 0,
      airLeakageM3HM2: 0,
    })),
  };
}

/** Share of the sun that passes all layers at a right angle, with reflections between them. */
export function stackTransmittance(row: CoverRow): number {
  let transmittance = 1;
  let reflectance = 0;
  for (const layer of row.layers) {
    const multiple = 1 - reflectance * layer.solarReflectance;
    reflectance = layer.solarReflectance + (layer.solarTransmittance ** 2 * reflectance) / multiple;
    transmittance = (transmittance * layer.solarTransmittance) / multiple;
  }
  return transmittance;
}
