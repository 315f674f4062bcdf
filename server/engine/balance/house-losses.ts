import { heatRecoveryFrac } from "../livestock/minimum-ventilation.ts";
import type { LossesW } from "../plan/plan-types.ts";
import { airHeatWK } from "./air-heat.ts";
import type { FluxGroup, OutsideHour, ScreenPosition, SurfaceFlux, SurfaceModel } from "./surface-model.ts";

/** The parts of a house that lose heat, made ready for many hours. */
export interface HouseShell {
  surfaces: readonly SurfaceModel[];
  groups: readonly FluxGroup[];
  perimeterM: number;
  floorEdgeLossWMK: number;
  pressurePa: number;
}

/** Air that leaves the house in an hour. */
export interface AirFlows {
  /** Through the fans, where heat may be won back. */
  fansM3H: number;
  /** Through leaks, beyond what the fans draw. */
  leaksM3H: number;
  recoveryFrac: number;
}

/** State of one hour in which heat may be lost. */
export interface ShellHour {
  outside: OutsideHour;
  screen: ScreenPosition;
  air: AirFlows;
  /** Mean sun on each group, W/m²; empty in the dark. */
  groupSunWM2: readonly number[];
}

export interface HouseLosses {
  lossesW: LossesW;
  totalW: number;
  /** Heat through each group. */
  fluxes: SurfaceFlux[];
}

/**
 * Heat leaving a house by every path at a given inside temperature. "sky" is what a sky colder than the
 * air adds to the loss through the surfaces; "cover" is that loss under a sky as warm as the air.
 * Shape: shell, hour, inside °C → W by path, the total, and the heat through each group. Source [ASHRAEAPP], [AIRHEAT].
 */
export function houseLosses(shell: HouseShell, hour: ShellHour, insideTempC: number): HouseLosses {
  const { outside, air } = hour;
  const differenceK = insideTempC - outside.airTempC;
  const fluxes = shell.groups.map((group, index) =>
    group.flux(insideTempC, outside, hour.screen, hour.groupSunWM2[index] ?? 0),
  );
  let throughSurfacesW = 0;
  let skyW = 0;
  fluxes.forEach((flux, index) => {
    const areaM2 = shell.groups[index]?.areaM2 ?? 0;
    throughSurfacesW += flux.lossWM2 * areaM2;
    skyW += flux.toSkyWM2 * areaM2;
  });
  const recovered = heatRecoveryFrac(air.recoveryFrac, insideTempC, outside.airTempC);
  const airWK =
    airHeatWK(air.fansM3H, shell.pressurePa) * (1 - recovered) + airHeatWK(air.leaksM3H, shell.pressurePa);
  const airW = airWK * differenceK;
  const groundW = shell.floorEdgeLossWMK * shell.perimeterM * differenceK;
  return {
    lossesW: { cover: throughSurfacesW - skyW, sky: skyW, air: airW, ground: groundW },
    totalW: throughSurfacesW + airW + groundW,
    fluxes,
  };
}
