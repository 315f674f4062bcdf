import type { SurfaceFlow } from "../../../../server/engine/plan/plan-types.ts";

const stripWords = /, strip \d+$/;

/** A curved roof side is worked out in strips; here they are one row, temperatures as the mean over their area. */
export function togetherByRoofSide(surfaces: SurfaceFlow[]): SurfaceFlow[] {
  const groups = new Map<string, SurfaceFlow[]>();
  for (const surface of surfaces) {
    const name = surface.label.replace(stripWords, "");
    groups.set(name, [...(groups.get(name) ?? []), surface]);
  }
  return [...groups].flatMap(([label, strips]) => {
    const first = strips[0];
    if (!first || strips.length === 1) return strips;
    const areaM2 = strips.reduce((sum, strip) => sum + strip.areaM2, 0);
    const sum = (pick: (strip: SurfaceFlow) => number) => strips.reduce((all, strip) => all + pick(strip), 0);
    const mean = (pick: (strip: SurfaceFlow) => number) =>
      sum((strip) => pick(strip) * strip.areaM2) / areaM2;
    return {
      ...first,
      surfaceId: label,
      label,
      areaM2,
      uValueWM2K: mean((strip) => strip.uValueWM2K),
      lossW: sum((strip) => strip.lossW),
      toAirW: sum((strip) => strip.toAirW),
      toSkyW: sum((strip) => strip.toSkyW),
      faceTempsC: first.faceTempsC.map((_, face) => mean((strip) => strip.faceTempsC[face] ?? Number.NaN)),
      wetInside: strips.some((strip) => strip.wetInside),
    };
  });
}
