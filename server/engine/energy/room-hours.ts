import { airHeatWK } from "../balance/air-heat.ts";
import type { AirFlows } from "../balance/house-losses.ts";
import { heatRecoveryFrac } from "../livestock/minimum-ventilation.ts";
import type { GainPath } from "../plan/plan-types.ts";
import type { RoomHour } from "./day-run.ts";
import type { MonthEnergyInput, Responses } from "./month-energy.ts";
import { parabolaAt } from "./parabola.ts";
import { responseLossW } from "./shell-response.ts";

/** Air that leaves the house, by the outdoor temperature. */
export type RoomAir = (insideTempC: number, outdoorTempC: number) => AirFlows;

/** A room hour with its parts kept apart, so that the month can be told by path. */
export interface SplitRoomHour extends RoomHour {
  outdoorTempC: number;
  gainsW: Record<GainPath, number>;
  /** Radiated to the sky, W; loss by air and floor edge for each kelvin, W/K. What is left leaves through the cover. */
  skyW: number;
  airWK: number;
  groundWK: number;
  innerFaceC: number;
}

/** Share of the sensible sun that first warms the floor. Source [ISO13790]. */
const SUN_TO_MASS = 0.5;

/**
 * The 24 hours of a typical day as the room feels them.
 * Shape: month, responses by night and day, hourly outdoor temperature °C, brightness factor → 24 hours. Source [ISO13790].
 */
export function roomHours(
  input: MonthEnergyInput,
  responses: Responses,
  hourlyTempC: readonly number[],
  brightness: number,
): SplitRoomHour[] {
  return hourlyTempC.map((outdoorTempC, hour) => {
    const day = input.sun.daylight[hour] ?? false;
    const response = day ? responses.day : responses.night;
    const setpointC = day ? input.daySetpointC : input.nightSetpointC;
    const groupSun = day ? (input.sun.groupSunWM2[hour] ?? []).map((value) => value * brightness) : [];
    const air = input.air(setpointC, outdoorTempC);
    const recovered = heatRecoveryFrac(air.recoveryFrac, setpointC, outdoorTempC);
    const airWK =
      airHeatWK(air.fansM3H, input.shell.pressurePa) * (1 - recovered) +
      airHeatWK(air.leaksM3H, input.shell.pressurePa);
    const groundWK = input.shell.floorEdgeLossWMK * input.shell.perimeterM;
    const surfacesW = responseLossW(response, outdoorTempC, setpointC, groupSun);
    const skyW = parabolaAt(response.skyW, outdoorTempC);
    const differenceK = setpointC - outdoorTempC;
    const sunW = (input.sun.inRoomW[hour] ?? 0) * brightness * input.sensibleShareFrac;
    const lit = Math.abs(hour + 0.5 - 12) < input.lampHours / 2;
    const gainsW = {
      sun: sunW,
      stock: input.stockSensibleW(setpointC),
      lights: lit ? input.lampHeatW : 0,
    };
    return {
      outdoorTempC,
      referenceC: setpointC,
      lossAtReferenceW: surfacesW + (airWK + groundWK) * differenceK,
      lossPerInsideWK: response.lossPerInsideWK + airWK + groundWK,
      gainsW,
      gainAirW: gainsW.stock + gainsW.lights + (1 - SUN_TO_MASS) * sunW,
      gainMassW: SUN_TO_MASS * sunW,
      setpointC,
      ventAtC: Math.max(input.daySetpointC, input.nightSetpointC) + input.ventAboveK,
      innerFaceC: parabolaAt(response.innerFaceC, outdoorTempC),
      skyW,
      airWK,
      groundWK,
    };
  });
}
