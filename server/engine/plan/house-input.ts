import type { StationClimate } from "../climate/station-climate.ts";
import type { CoverStack } from "../envelope/cover-types.ts";
import type { HouseShape } from "../geometry/house-shape.ts";
import type { InputOrigin } from "./plan-types.ts";

/** The parts of a house that may be made differently. */
export type HousePart = "roof" | "sideWall" | "endWall" | "ceiling" | "kneewall";

/**
 * What a part is made of. Either a stack whose heat balance is solved, or one whole-cover U-value as a table or a maker
 * gives it, air to air with both surface films, at a wind of 6.7 m/s under an ordinary night sky.
 */
export type Assembly =
  | { kind: "stack"; name: string; stack: CoverStack; solarTransmittance: number }
  | { kind: "uValue"; name: string; uValueWM2K: number; solarTransmittance: number };

export interface ScreenInput {
  name: string;
  /** Longwave and solar properties of the closed cloth. */
  emissivityIn: number;
  emissivityOut: number;
  longwaveTransmittance: number;
  solarTransmittance: number;
  /** Share of heat loss saved through the covered area, used where the roof is given as a U-value. */
  savingFrac: number;
  /** Share of the roof covered, 0 to 1. */
  coverageFrac: number;
  /** Open slot along both long edges, m. */
  edgeGapM: number;
  opensForSnow: boolean;
}

export interface CropInput {
  name: string;
  /** Share of the absorbed sun that warms the air; the rest evaporates water. */
  sensibleShareFrac: number;
  humidityFrac: number;
}

export interface StockInput {
  classId: string;
  name: string;
  /** Winter ventilation: worked out from water, carbon dioxide and the per-head rate, or as measured. */
  ventilation:
    | {
        mode: "balance";
        perHeadM3H: number;
        /** Where the rate goes with the mass: m³/h for each kg to the power 0.75; it then takes the place of the rate per head. */
        perKg075M3H?: number | null;
      }
    | { mode: "typed"; flowM3H: number };
  humidityLimitFrac: number;
  carbonDioxideLimitPpm: number;
  heatRecoveryFrac: number;
}

export interface MonthUse {
  occupied: boolean;
  nightSetpointC: number;
  daySetpointC: number;
  headCount: number;
  massKg: number;
}

export interface HeaterInput {
  label: string;
  typeId: string;
  ratedW: number;
  basis: "input" | "output";
  /** On the gross heating value. */
  efficiencyFrac: number;
  vented: boolean;
  /** False for electric heat and heat pumps, which lose nothing to thin air. */
  burnsFuel: boolean;
  fuelId: string;
  count: number;
}

export interface FuelInput {
  id: string;
  name: string;
  unit: string;
  kwhGrossPerUnit: number;
  carbonDioxideKgPerKwh: number;
}

/** Everything a plan is worked out from. SI units; twelve months, January first. */
export interface HousePlanInput {
  kind: "greenhouse" | "barn";
  site: {
    latitudeDeg: number;
    longitudeDeg: number;
    elevationM: number;
    shelter: "open" | "normal" | "sheltered";
    /** How much colder clear nights are than at the station, K, told by the person. */
    frostHollowK: number;
  };
  climate: StationClimate;
  shape: HouseShape;
  ridgeBearingDeg: number;
  covers: Partial<Record<HousePart, Assembly>> & Record<"roof" | "sideWall" | "endWall", Assembly>;
  kneewallHeightM: number;
  screen: ScreenInput | null;
  leakageAirChangesPerHour: number;
  /** Under running fans leaks are a part of the fans' flow; "added" puts them on top, as some hand calculations do. */
  leakageUnderFans?: "part" | "added";
  floorEdgeLossWMK: number;
  /** Share of the sun that passes the clean cover and also frame, dirt and drops. */
  frameAndDirtFrac: number;
  crop: CropInput | null;
  stock: StockInput | null;
  lampsWM2: number;
  lampHoursPerDay: number;
  months: MonthUse[];
  criticalTempC: number;
  heaters: HeaterInput[];
  /** The fuel the yearly need is expressed in, and the seasonal efficiency where no heater is fitted yet. */
  fuel: FuelInput;
  fallbackEfficiencyFrac: number;
  returnPeriodYears: number;
  everydayPercent: 99.6 | 99;
  /** Origin of each answer by its dotted path in the survey. */
  origins: Record<string, InputOrigin>;
}
