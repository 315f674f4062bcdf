import { STEFAN_BOLTZMANN_WM2K4, ZERO_CELSIUS_K } from "../constants.ts";
import { requireInRange } from "../errors.ts";

/** What a black surface sends out. Units °C → W/m². Valid −273 to 6000 °C. Errors EngineInputError. Source [SI2019], fourth-power law. */
export function blackBodyWM2(tempC: number): number {
  requireInRange("tempC", tempC, -273.15, 6000, "°C");
  return STEFAN_BOLTZMANN_WM2K4 * (tempC + ZERO_CELSIUS_K) ** 4;
}

/**
 * Net longwave flow between two large parallel grey plates, with screens between them.
 *
 * Units °C, 0 to 1 → W/m², positive from plate 1 to plate 2. Each screen has one emissivity per side.
 * Valid emissivity 0.01 to 1. Errors EngineInputError. Source [NETWORK].
 */
export function parallelPlatesWM2(
  temp1C: number,
  emissivity1: number,
  temp2C: number,
  emissivity2: number,
  screens: { emissivity1: number; emissivity2: number }[] = [],
): number {
  const gap = (a: number, b: number) =>
    1 / requireInRange("emissivity", a, 0.01, 1) + 1 / requireInRange("emissivity", b, 0.01, 1) - 1;
  const resistance = screens.reduce(
    (sum, screen) => sum + gap(screen.emissivity1, screen.emissivity2),
    gap(emissivity1, emissivity2),
  );
  return (blackBodyWM2(temp1C) - blackBodyWM2(temp2C)) / resistance;
}

/**
 * Temperature at which a body turns equally to the sun on one side and to cold space all around: absorbed sun and sent-out heat
 * are equal.
 *
 * Units W/m², 0 to 1 → °C. `areaRatio` is the sending over the catching area (4 for a ball). Valid irradiance 0 to 1e8 W/m².
 * Errors EngineInputError. Source: balance of absorbed sun and fourth-power law [SI2019].
 */
export function radiativeBalanceTempC(
  irradianceWM2: number,
  absorptance = 1,
  emissivity = 1,
  areaRatio = 4,
): number {
  requireInRange("irradianceWM2", irradianceWM2, 0, 1e8, "W/m²");
  requireInRange("absorptance", absorptance, 0, 1);
  requireInRange("emissivity", emissivity, 0.01, 1);
  requireInRange("areaRatio", areaRatio, 0.1, 100);
  const power = (absorptance * irradianceWM2) / (emissivity * areaRatio * STEFAN_BOLTZMANN_WM2K4);
  return power ** 0.25 - ZERO_CELSIUS_K;
}
