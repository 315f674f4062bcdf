import type { HouseShell } from "../balance/house-losses.ts";
import type { OutsideHour } from "../balance/surface-model.ts";
import { representativeDays } from "../climate/representative-days.ts";
import type { MonthEnergy } from "../plan/plan-types.ts";
import { runTypicalDay } from "./day-run.ts";
import { EnergySum } from "./energy-sum.ts";
import type { MonthSun } from "./month-sun.ts";
import { type RoomAir, roomHours } from "./room-hours.ts";
import { type ShellResponse, shellResponse } from "./shell-response.ts";

/** Everything a month's energy is worked out from. */
export interface MonthEnergyInput {
  shell: HouseShell;
  days: number;
  meanTempC: number;
  dailySpreadK: number;
  dailyRangeK: number;
  /** Weather of an hour by its outdoor temperature, without snow. */
  outsideAt(airTempC: number): OutsideHour;
  sun: MonthSun;
  nightSetpointC: number;
  daySetpointC: number;
  /** The screen is shut in the hours without sun. */
  screenByNight: boolean;
  /** Share of the sun in the room that warms it. */
  sensibleShareFrac: number;
  /** Lamp heat in the room while lit, W, and hours a day. */
  lampHeatW: number;
  lampHours: number;
  air: RoomAir;
  stockSensibleW(insideTempC: number): number;
  /** Vents open this far above the day set-point, K. */
  ventAboveK: number;
  floorAreaM2: number;
  /** Infinity where no heater is fitted, so that the need is shown. */
  heaterLimitW: number;
  insideDewPointC: number;
}

/** Number of temperature classes and the brightness of days around the mean, which keep mean and energy. Source [CLOUDDAYS]. */
const TEMPERATURE_CLASSES = 5;
const BRIGHTNESS = [
  { factor: 0.4, weight: 0.25 },
  { factor: 1, weight: 0.5 },
  { factor: 1.6, weight: 0.25 },
] as const;

/** Heat of the floor's top layer and how it is tied to the air. Source [SOILMASS]. */
const FLOOR_HEAT_JM2K = 2.2e5;
const FLOOR_COUPLING_WM2K = 6;

/**
 * Energy of a month from typical days: classes of temperature × brightness × 24 hours, one mass node, the heater's limit.
 * Shape: month → kWh by path, hours, hourly means. Losses equal heater plus useful gains to 1 % (what the floor still holds
 * at midnight is left out). Source [ISO13790], [CLOUDDAYS], [SOILMASS].
 */
export function monthEnergy(input: MonthEnergyInput): MonthEnergy {
  const reachK = 2 * input.dailySpreadK + input.dailyRangeK / 2 + 1;
  const probes = [-reachK, 0, reachK].map((byK) => input.outsideAt(input.meanTempC + byK)) as [
    OutsideHour,
    OutsideHour,
    OutsideHour,
  ];
  const responses = monthResponses(input, probes);
  const mass = {
    capacityJK: FLOOR_HEAT_JM2K * input.floorAreaM2,
    couplingWK: FLOOR_COUPLING_WM2K * input.floorAreaM2,
  };
  const sum = new EnergySum(input.insideDewPointC);
  const days = representativeDays(
    input.meanTempC,
    input.dailySpreadK,
    input.dailyRangeK,
    TEMPERATURE_CLASSES,
  );
  for (const day of days)
    for (const { factor, weight } of BRIGHTNESS) {
      const hours = roomHours(input, responses, day.hourlyTempC, factor);
      const results = runTypicalDay(hours, mass, input.heaterLimitW);
      sum.addDay(hours, results, day.weight * weight * input.days);
    }
  return sum.result(input.days);
}

/** Set-points this near to each other share one response, K: its loss is straight in the inside temperature that far. */
const SHARED_WITHIN_K = 5;

/** Without a screen and with like set-points, night and day differ by nothing the response does not hold itself. */
function monthResponses(
  input: MonthEnergyInput,
  probes: readonly [OutsideHour, OutsideHour, OutsideHour],
): Responses {
  const { nightSetpointC, daySetpointC, shell } = input;
  if (!input.screenByNight && Math.abs(nightSetpointC - daySetpointC) <= SHARED_WITHIN_K) {
    const both = shellResponse(shell, (nightSetpointC + daySetpointC) / 2, probes, "open", true);
    return { night: both, day: both };
  }
  return {
    night: shellResponse(shell, nightSetpointC, probes, input.screenByNight ? "shut" : "open", false),
    day: shellResponse(shell, daySetpointC, probes, "open", true),
  };
}

export interface Responses {
  night: ShellResponse;
  day: ShellResponse;
}
