import { requireInRange } from "../errors.ts";

const SQRT_2_PI = Math.sqrt(2 * Math.PI);

/** Density of the standard normal distribution. Shape: number → number; any finite z. Source [ABRAMOWITZ1964]. */
export function normalDensity(z: number): number {
  requireInRange("z", z, -1e6, 1e6);
  return Math.exp((-z * z) / 2) / SQRT_2_PI;
}

/**
 * Share of the standard normal distribution below z, to about 1e-14.
 * Shape: number → share 0 to 1; any finite z. Source [ABRAMOWITZ1964]: power series near the middle, continued fraction in the tails.
 */
export function normalShareBelow(z: number): number {
  const density = normalDensity(z);
  return Math.abs(z) < 3 ? 0.5 + density * seriesAround(z) : z > 0 ? 1 - tail(z, density) : tail(-z, density);
}

/**
 * The z below which a given share of the standard normal distribution lies; the inverse of {@link normalShareBelow}.
 * Shape: share, 1e-12 to 1 − 1e-12 → number. Throws EngineInputError outside. Source [ABRAMOWITZ1964], then Newton steps.
 */
export function normalQuantile(shareBelow: number): number {
  requireInRange("shareBelow", shareBelow, 1e-12, 1 - 1e-12);
  if (shareBelow > 0.5) return -normalQuantile(1 - shareBelow);
  const t = Math.sqrt(-2 * Math.log(shareBelow));
  let z = -(
    t -
    (2.515517 + t * (0.802853 + t * 0.010328)) / (1 + t * (1.432788 + t * (0.189269 + t * 0.001308)))
  );
  for (let step = 0; step < 4; step++) z -= (normalShareBelow(z) - shareBelow) / normalDensity(z);
  return z;
}

function seriesAround(z: number): number {
  let term = z;
  let sum = z;
  for (let k = 3; Math.abs(term) > 1e-17 * Math.abs(sum) && k < 200; k += 2) {
    term *= (z * z) / k;
    sum += term;
  }
  return sum;
}

function tail(z: number, density: number): number {
  let fraction = z;
  for (let k = 60; k >= 1; k--) fraction = z + k / fraction;
  return density / fraction;
}
