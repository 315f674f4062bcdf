import type { HouseShell, ShellHour } from "../balance/house-losses.ts";
import { houseLosses } from "../balance/house-losses.ts";
import type { OutsideHour, ScreenPosition } from "../balance/surface-model.ts";
import { type Parabola, parabolaAt, parabolaThrough } from "./parabola.ts";

/**
 * How the surfaces of a house answer to the weather of one month: the exact balance is worked out at three outdoor
 * temperatures and followed by a parabola in between; inside temperature and absorbed sun act in proportion.
 */
export interface ShellResponse {
  referenceInsideC: number;
  lossW: Parabola;
  skyW: Parabola;
  /** Change of the loss for each kelvin the room is warmer than the reference, W/K. */
  lossPerInsideWK: number;
  /** Change of the loss for each W/m² of sun on a group, m². */
  lossPerSunM2: number[];
  /** Inner face of the largest group, °C. */
  innerFaceC: Parabola;
}

/** No air: the response is that of the surfaces alone. */
const STILL_AIR = { fansM3H: 0, leaksM3H: 0, recoveryFrac: 0 };
/** Sun used to find the effect of absorbed sun, W/m². */
const PROBE_SUN_WM2 = 200;

/**
 * Prepares the response of a shell for a month.
 * Shape: shell, inside °C, three outside hours in rising temperature, screen, whether the sun matters → response. Source [LAGRANGE].
 */
export function shellResponse(
  shell: HouseShell,
  referenceInsideC: number,
  hours: readonly [OutsideHour, OutsideHour, OutsideHour],
  screen: ScreenPosition,
  withSun = true,
): ShellResponse {
  const bare = { ...shell, floorEdgeLossWMK: 0 };
  const at = (outside: OutsideHour): ShellHour => ({ outside, screen, air: STILL_AIR, groupSunWM2: [] });
  const results = hours.map((hour) => houseLosses(bare, at(hour), referenceInsideC)) as [
    ReturnType<typeof houseLosses>,
    ReturnType<typeof houseLosses>,
    ReturnType<typeof houseLosses>,
  ];
  const temps: [number, number, number] = [hours[0].airTempC, hours[1].airTempC, hours[2].airTempC];
  const warmer = houseLosses(bare, at(hours[1]), referenceInsideC + 1);
  const largest = shell.groups.reduce(
    (best, group, index) => (group.areaM2 > (shell.groups[best]?.areaM2 ?? 0) ? index : best),
    0,
  );
  const curve = (pick: (result: ReturnType<typeof houseLosses>) => number) =>
    parabolaThrough(temps, [pick(results[0]), pick(results[1]), pick(results[2])]);
  return {
    referenceInsideC,
    lossW: curve((result) => result.totalW),
    skyW: curve((result) => result.lossesW.sky),
    lossPerInsideWK: warmer.totalW - results[1].totalW,
    lossPerSunM2: !withSun
      ? []
      : shell.groups.map((group, index) => {
          const dark = results[1].fluxes[index]?.lossWM2 ?? 0;
          const lit = group.flux(referenceInsideC, hours[1], screen, PROBE_SUN_WM2).lossWM2;
          return ((lit - dark) / PROBE_SUN_WM2) * group.areaM2;
        }),
    innerFaceC: curve((result) => result.fluxes[largest]?.faceTempsC[0] ?? referenceInsideC),
  };
}

/** Loss through the surfaces in an hour, W. Shape: response, outside °C, inside °C, sun on each group W/m² → W. Source [LAGRANGE]. */
export function responseLossW(
  response: ShellResponse,
  outdoorTempC: number,
  insideTempC: number,
  groupSunWM2: readonly number[],
): number {
  const sunW = response.lossPerSunM2.reduce(
    (sum, perSun, index) => sum + perSun * (groupSunWM2[index] ?? 0),
    0,
  );
  return (
    parabolaAt(response.lossW, outdoorTempC) +
    response.lossPerInsideWK * (insideTempC - response.referenceInsideC) +
    sunW
  );
}
