/** One hour of a typical day as the room feels it. */
export interface RoomHour {
  /** Loss at `referenceC` without the mass, W, and its change for each kelvin inside, W/K. */
  lossAtReferenceW: number;
  lossPerInsideWK: number;
  referenceC: number;
  /** Heat given to the air and to the mass by sun, stock and lamps, W. */
  gainAirW: number;
  gainMassW: number;
  setpointC: number;
  /** Vents keep the room below this. */
  ventAtC: number;
}

export interface RoomMass {
  capacityJK: number;
  couplingWK: number;
}

export interface RoomHourResult {
  insideTempC: number;
  heaterW: number;
  /** Needed to hold the set-point, with no limit. */
  neededW: number;
  /** Heat carried out because the room would be too warm. */
  ventedW: number;
  /** Heat into the mass, W. */
  storedW: number;
}

const SECONDS_PER_HOUR = 3600;
/** The same day is run until its first and last hour agree this well, K, and at most so often. */
const PERIODIC_WITHIN_K = 0.02;
const MOST_RUNS = 30;

/**
 * Runs a typical day over and over until it repeats itself: the air answers at once, one mass node follows it.
 * Shape: 24 hours, mass, heater limit in W (Infinity for none) → 24 results. Source [ISO13790], [IMPLICITEULER].
 */
export function runTypicalDay(
  hours: readonly RoomHour[],
  mass: RoomMass,
  heaterLimitW: number,
): RoomHourResult[] {
  let massTempC = hours.reduce((sum, hour) => sum + hour.setpointC, 0) / hours.length;
  let results: RoomHourResult[] = [];
  for (let run = 0; run < MOST_RUNS; run++) {
    const startC = massTempC;
    results = hours.map((hour) => {
      const step = runHour(hour, mass, massTempC, heaterLimitW);
      massTempC = step.massTempC;
      return step.result;
    });
    const driftC = massTempC - startC;
    if (Math.abs(driftC) < PERIODIC_WITHIN_K) break;
    // The drift of a linear day shrinks by the same factor each run; jump to where it would end.
    massTempC += driftC * jumpFactor(hours, mass);
  }
  return results;
}

function jumpFactor(hours: readonly RoomHour[], mass: RoomMass): number {
  const lossWK = hours.reduce((sum, hour) => sum + hour.lossPerInsideWK, 0) / hours.length;
  const seriesWK = (mass.couplingWK * lossWK) / (mass.couplingWK + lossWK);
  const keep = Math.exp((-seriesWK * SECONDS_PER_HOUR * 24) / mass.capacityJK);
  return keep / (1 - keep) / 2;
}

/** One hour: mass by implicit Euler, air in balance, heater between nothing and its limit. */
function runHour(hour: RoomHour, mass: RoomMass, massBeforeC: number, heaterLimitW: number) {
  const inertiaWK = mass.capacityJK / SECONDS_PER_HOUR;
  // Heat into the mass at inside temperature T is seriesWK · (T − drivingC).
  const seriesWK = (mass.couplingWK * inertiaWK) / (inertiaWK + mass.couplingWK);
  const drivingC = massBeforeC + hour.gainMassW / inertiaWK;
  const slopeWK = hour.lossPerInsideWK + seriesWK;
  const shortAtSetpointW =
    hour.lossAtReferenceW +
    hour.lossPerInsideWK * (hour.setpointC - hour.referenceC) +
    seriesWK * (hour.setpointC - drivingC) -
    hour.gainAirW;
  const neededW = Math.max(0, shortAtSetpointW);
  const heaterW = Math.min(neededW, heaterLimitW);
  let insideTempC = hour.setpointC - (shortAtSetpointW - heaterW) / slopeWK;
  let ventedW = 0;
  if (insideTempC > hour.ventAtC) {
    ventedW = slopeWK * (insideTempC - hour.ventAtC);
    insideTempC = hour.ventAtC;
  }
  const massTempC =
    (inertiaWK * massBeforeC + mass.couplingWK * insideTempC + hour.gainMassW) /
    (inertiaWK + mass.couplingWK);
  const storedW = inertiaWK * (massTempC - massBeforeC);
  return { massTempC, result: { insideTempC, heaterW, neededW, ventedW, storedW } };
}
