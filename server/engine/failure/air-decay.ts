import { requireInRange } from "../errors.ts";

/** A gas in a house with some air change. */
export interface GasInput {
  volumeM3: number;
  /** What animals and flames give off, m³/h. */
  sourceM3H: number;
  /** Leaks and draught left without fans, m³/h. */
  airM3H: number;
  /** Shares of the air. */
  startFrac: number;
  outdoorFrac: number;
}

/** Air changes an hour below which the air counts as still: nothing would show within a year. */
const STILL_PER_HOUR = 1e-9;

const isStill = ({ airM3H, volumeM3 }: GasInput) => airM3H < STILL_PER_HOUR * volumeM3;

function check(input: GasInput): void {
  requireInRange("volumeM3", input.volumeM3, 1, 1e8, "m³");
  requireInRange("sourceM3H", input.sourceM3H, 0, 1e6, "m³/h");
  requireInRange("airM3H", input.airM3H, 0, 1e8, "m³/h");
  requireInRange("startFrac", input.startFrac, 0, 0.3);
  requireInRange("outdoorFrac", input.outdoorFrac, 0, 0.01);
}

/** Share a gas goes towards, infinite where no air moves. Units shares of 1. Errors EngineInputError. Source [MIXEDAIR]. */
export function endGasFrac(input: GasInput): number {
  check(input);
  if (input.sourceM3H === 0) return isStill(input) ? input.startFrac : input.outdoorFrac;
  return isStill(input) ? Number.POSITIVE_INFINITY : input.outdoorFrac + input.sourceM3H / input.airM3H;
}

/** Share of a gas after so many hours. Units h → share of 1. Valid 0 to 1000 h. Errors EngineInputError. Source [MIXEDAIR]. */
export function gasAfterHoursFrac(input: GasInput, hours: number): number {
  requireInRange("hours", hours, 0, 1000, "h");
  const end = endGasFrac(input);
  if (!Number.isFinite(end)) return input.startFrac + (input.sourceM3H * hours) / input.volumeM3;
  // expm1 and log1p keep their digits where hardly any air moves.
  return input.startFrac - (end - input.startFrac) * Math.expm1((-input.airM3H * hours) / input.volumeM3);
}

/**
 * Hours until a gas reaches a limit; 0 when it is above already, null when it never does.
 *
 * Units share of 1 → h. Valid limit 0 to 0.3. Errors EngineInputError. Source [MIXEDAIR].
 */
export function hoursToGas(input: GasInput, limitFrac: number): number | null {
  requireInRange("limitFrac", limitFrac, 0, 0.3);
  const end = endGasFrac(input);
  if (input.startFrac >= limitFrac) return 0;
  if (end <= limitFrac) return null;
  if (!Number.isFinite(end)) return ((limitFrac - input.startFrac) * input.volumeM3) / input.sourceM3H;
  return (
    (-input.volumeM3 / input.airM3H) * Math.log1p((limitFrac - input.startFrac) / (input.startFrac - end))
  );
}
