import type { MassRange } from "./house-mass.ts";
import { hoursUntil, type OutageHouse, type OutageMoment, outageCourse } from "./outage.ts";

/** Limits of one house. */
export interface OutageLimits {
  coldC: number;
  hotC: number;
  carbonDioxideFrac: number;
}

/** Hours to a limit over the uncertain heat a house holds; null where it is not reached. */
export interface HoursBand {
  low: number | null;
  likely: number | null;
  high: number | null;
}

/** What threatens first. */
export type Threat = "cold" | "hot" | "gas";

export interface OutageResult {
  toCold: HoursBand;
  toHot: HoursBand;
  toGas: HoursBand;
  /** The limit reached first in the likely course, and its shortest time over the band; null where none is reached. */
  firstThreat: { threat: Threat; soonestHours: number } | null;
  /** The likely course. */
  course: OutageMoment[];
}

export interface TwoNights {
  /** The heater stands, fans run on: the air takes the heat away within minutes. */
  heaterOut: OutageResult;
  /** Nothing runs: small animals cool, full houses overheat and run out of air. */
  everythingOff: OutageResult;
}

export interface TwoNightsInput {
  house: Omit<OutageHouse, "capacityJK" | "airM3H">;
  mass: MassRange;
  fansM3H: number;
  leaksM3H: number;
  limits: OutageLimits;
  /** How long to follow it, h. */
  hours: number;
}

/**
 * The two failures that must never be taken for one another, each over half to twice the heat the house may hold.
 *
 * Shape: house, heat held, air with and without fans, limits → hours and courses. Errors EngineInputError. Source [LUMPED],
 * [MIXEDAIR], [COOLINGMASS], [STILLAIR].
 */
export function twoNights(input: TwoNightsInput): TwoNights {
  return {
    heaterOut: outage(input, Math.max(input.fansM3H, input.leaksM3H)),
    everythingOff: outage(input, input.leaksM3H),
  };
}

function outage({ house, mass, limits, hours }: TwoNightsInput, airM3H: number): OutageResult {
  const course = (capacityJK: number) => outageCourse({ ...house, airM3H, capacityJK }, hours);
  const low = course(mass.lowJK);
  const likely = course(mass.likelyJK);
  const high = course(mass.highJK);
  const band = (
    value: (moment: OutageMoment) => number,
    limit: number,
    way: "above" | "below",
  ): HoursBand => ({
    low: hoursUntil(low, value, limit, way),
    likely: hoursUntil(likely, value, limit, way),
    high: hoursUntil(high, value, limit, way),
  });
  const temp = ({ tempC }: OutageMoment) => tempC;
  const toCold = band(temp, limits.coldC, "below");
  const toHot = band(temp, limits.hotC, "above");
  const toGas = band(({ carbonDioxideFrac }) => carbonDioxideFrac, limits.carbonDioxideFrac, "above");
  return {
    toCold,
    toHot,
    toGas,
    firstThreat: firstOf({ cold: toCold, hot: toHot, gas: toGas }),
    course: likely,
  };
}

function firstOf(bands: Record<Threat, HoursBand>): OutageResult["firstThreat"] {
  let first: OutageResult["firstThreat"] = null;
  for (const threat of ["cold", "hot", "gas"] as const) {
    const soonestHours = Math.min(
      ...[bands[threat].low, bands[threat].likely, bands[threat].high].filter((hours) => hours !== null),
    );
    if (Number.isFinite(soonestHours) && (first === null || soonestHours < first.soonestHours))
      first = { threat, soonestHours };
  }
  return first;
}
