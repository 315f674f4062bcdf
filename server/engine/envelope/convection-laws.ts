/** A coefficient and how it changes with the difference it depends on. */
export interface Law {
  /** W/(m² K). */
  coefficient: number;
  /** Of the coefficient with the difference, W/(m² K²). */
  slope: number;
  /** Which branch of the law held: where it changes, the slope jumps. */
  branch: number;
}

/** Added inside the root, so that the slope of the law stays finite when both sides are equally warm, K. */
const SMALL_K = 1e-6;
/** Up to this difference the standard's fixed values hold; they equal the law at it, K. */
const FIXED_UP_TO_K = 5;
const ROOT_OF_FIXED = Math.cbrt(FIXED_UP_TO_K);
const DOWN_OF_FIXED = FIXED_UP_TO_K ** 0.187;

/** Natural convection inside by tilt, into `law`. Difference: air minus surface. Source [TARP-1983]. */
export function insideLaw(law: Law, differenceK: number, cosTilt: number): void {
  const steep = Math.abs(cosTilt);
  const factor = differenceK * cosTilt >= 0 ? 9.482 / (7.283 - steep) : 1.81 / (1.382 + steep);
  const size = Math.abs(differenceK) + SMALL_K;
  law.coefficient = factor * Math.cbrt(size);
  law.branch = differenceK >= 0 ? 1 : 0;
  law.slope = ((differenceK < 0 ? -1 : 1) * law.coefficient) / (3 * size);
}

/**
 * Convection of a closed air layer, into `law`, given its conduction limit and its factor for heat going down.
 * Difference: lower or inner side minus upper or outer side. Source [ISO6946] annex.
 */
export function airLayerLaw(
  law: Law,
  differenceK: number,
  cosTilt: number,
  conductionWM2K: number,
  downFactor: number,
): void {
  const size = Math.abs(differenceK);
  const strong = size > FIXED_UP_TO_K;
  const root = strong ? Math.cbrt(size) : ROOT_OF_FIXED;
  const steep = Math.abs(cosTilt);
  const rising = differenceK * cosTilt >= 0;
  const upright = (1 - steep) * 0.73 * root;
  const flat = steep * (rising ? 1.14 * root : downFactor * (strong ? size ** 0.187 : DOWN_OF_FIXED));
  const moving = upright + flat;
  if (moving <= conductionWM2K) {
    law.coefficient = conductionWM2K;
    law.slope = 0;
    law.branch = 0;
    return;
  }
  law.coefficient = moving;
  law.branch = 1 + (rising ? 1 : 0) + (strong ? 2 : 0);
  const grows = strong ? (upright + (rising ? flat : 3 * 0.187 * flat)) / (3 * size) : 0;
  law.slope = differenceK < 0 ? -grows : grows;
}
