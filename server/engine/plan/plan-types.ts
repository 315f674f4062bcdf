import type { HeaterOption } from "./sizing-types.ts";

/** Where an input came from, strongest first. */
export type InputOrigin = "measured" | "plate" | "bill" | "default" | "guess";

/** The fixed paths by which heat leaves or enters a house. Everything shown to a person uses these names. */
export type LossPath = "cover" | "sky" | "air" | "ground";
export type GainPath = "sun" | "stock" | "lights";

export type LossesW = Record<LossPath, number>;
export type GainsW = Record<GainPath, number>;

/** Can the house keep its temperature with the heat it has? */
export type HoldVerdict = "holds" | "belowSetpoint" | "belowCritical" | "cannotSay" | "notApplicable";

/** One state of the house at one design condition. */
export type HouseStateId = "screensShut" | "screensOpen" | "snowOnRoof" | "largestUnitOut";

export interface SurfaceFlow {
  surfaceId: string;
  label: string;
  role: string;
  areaM2: number;
  assemblyName: string;
  /** Heat leaving the room through this surface divided by area and air temperature difference. */
  uValueWM2K: number;
  /** Heat leaving the room through this surface, W; split into the air and the radiation to the sky. */
  lossW: number;
  toAirW: number;
  toSkyW: number;
  /** Face temperatures from the room outwards. */
  faceTempsC: number[];
  layerNames: string[];
  wetInside: boolean;
}

/** The house at one steady hour. Losses minus gains equal the heat the heaters must give. */
export interface HouseBalance {
  month: number;
  state: HouseStateId;
  outdoorTempC: number;
  skyTempC: number;
  soilTempC: number;
  windMS: number;
  insideTempC: number;
  insideHumidityFrac: number;
  lossesW: LossesW;
  gainsW: GainsW;
  /** Never negative. */
  requiredHeatW: number;
  /** Gains beyond what the house loses at set-point, carried out by more air. Never negative. */
  surplusW: number;
  surfaces: SurfaceFlow[];
  ventilationM3H: number;
  /** Which rule set the ventilation, for stock: "moisture", "carbonDioxide", "perHead", "legal", "typed", "leakage". */
  ventilationGoverns: string;
  /** Where the house would settle with all the heat that is fitted, never above the set-point. */
  settlesAtC: number;
  installedHeatW: number;
  verdict: HoldVerdict;
}

export interface MonthClimate {
  month: number;
  meanTempC: number;
  meanMinTempC: number;
  meanMaxTempC: number;
  humidityFrac: number;
  windMS: number;
  /** Mean daily sum on the flat. */
  globalKwhM2Day: number;
  everydayDesignC: number;
  onceInYearsDesignC: number;
  /** "read" | "derived" | "estimated" | "typical", by quantity. */
  origins: Record<string, string>;
}

export interface MonthResult {
  month: number;
  occupied: boolean;
  setpointNightC: number;
  setpointDayC: number;
  climate: MonthClimate;
  /** Peak requirement on the everyday design night and on the once-in-N-years night, for each state that matters. */
  everyday: Partial<Record<HouseStateId, HouseBalance>>;
  onceInYears: Partial<Record<HouseStateId, HouseBalance>>;
  /** Greatest requirement over the states in which the house is meant to hold (screens as on a normal night). */
  everydayRequiredW: number;
  onceInYearsRequiredW: number;
  energy: MonthEnergy;
}

export interface MonthEnergy {
  /** Heat from the heaters, kWh in the month. */
  heaterKwh: number;
  lossesKwh: Record<LossPath, number>;
  /** Gains that were of use; surplus is carried out by air and listed apart. */
  gainsKwh: Record<GainPath, number>;
  ventedSurplusKwh: number;
  /** Heat the fitted heaters could not give. */
  unmetKwh: number;
  heatingHours: number;
  hoursBelowSetpoint: number;
  wetCoverHours: number;
  /** Mean heater output for each hour of the day, W, 24 values in solar time. */
  heaterByHourW: number[];
  /** Mean outdoor temperature for each hour of the day. */
  outdoorByHourC: number[];
}

export interface PlanWarning {
  code: string;
  severity: "block" | "caution" | "note";
  /** One bold sentence. */
  message: string;
  /** One line of what to do. */
  action: string;
  /** Dotted path of the survey answer it concerns, where there is one. */
  field?: string;
}

export interface PlanAssumption {
  /** Dotted path of the survey answer, or of the engine's own default. */
  field: string;
  label: string;
  /** SI number, or words for a choice. */
  value: number | string;
  /** Key of engine/units.ts for a number, "" for words. */
  unit: string;
  origin: InputOrigin;
  source: string;
}

export interface PlanSizing {
  /** Worst month of each night. */
  everydayMonth: number;
  everydayRequiredW: number;
  onceInYearsMonth: number;
  onceInYearsRequiredW: number;
  marginFrac: number;
  /** What to buy for: the governing requirement with the margin. */
  targetW: number;
  installedW: number;
  verdictEveryday: HoldVerdict;
  verdictOnceInYears: HoldVerdict;
  settlesAtEverydayC: number;
  settlesAtOnceInYearsC: number;
  largestUnitOutSettlesAtC: number;
  /** Hours until the critical temperature when all heat stops on the once-in-N-years night: low and high end. */
  hoursToCriticalLow: number | null;
  hoursToCriticalHigh: number | null;
  /** Stocked barns: outdoor temperature down to which the animals' own heat is enough in the worst month; null elsewhere. */
  balanceTempC?: number | null;
  options: HeaterOption[];
  /** Filled where no heater is the right answer, with the reason in words. */
  noHeaterReason: string | null;
}

export interface PlanResult {
  engineVersion: string;
  returnPeriodYears: number;
  everydayPercent: 99.6 | 99;
  geometry: {
    floorAreaM2: number;
    volumeM3: number;
    perimeterM: number;
    coverAreaM2: number;
  };
  station: {
    id: string;
    name: string;
    distanceKm: number;
    heightDifferenceM: number;
    siteCorrectionK: number;
    reasons: string[];
  };
  months: MonthResult[];
  sizing: PlanSizing;
  annual: {
    heaterKwh: number;
    heaterKwhM2: number;
    unmetKwh: number;
    fuelId: string;
    fuelKwhGross: number;
    fuelAmount: number;
    fuelUnit: string;
    carbonDioxideKg: number;
  };
  assumptions: PlanAssumption[];
  warnings: PlanWarning[];
}
