/**
 * Every unit a person may type or read, with its way to and from SI.
 * The engine itself computes in SI only; these factors are used once, at the edge.
 * Source of the factors: [NIST811] (exact inch, pound and BTU-IT definitions), otherwise exact by definition.
 */
export type UnitKind =
  | "length"
  | "smallLength"
  | "distance"
  | "area"
  | "volume"
  | "temperature"
  | "temperatureDifference"
  | "power"
  | "energy"
  | "heatFlux"
  | "uValue"
  | "rValue"
  | "linearLoss"
  | "lossCoefficient"
  | "energyPerArea"
  | "airFlow"
  | "airChange"
  | "speed"
  | "mass"
  | "angle"
  | "share"
  | "count"
  | "hours";

export interface UnitDefinition {
  kind: UnitKind;
  /** As printed behind a number. */
  symbol: string;
  /** One of this unit in the SI unit of its kind. */
  factor: number;
  /** Added after the factor: SI = typed × factor + offset. Only temperatures have one. */
  offset: number;
}

const BTU_J = 1055.05585262;
const FOOT_M = 0.3048;
const POUND_KG = 0.45359237;
const FAHRENHEIT_STEP_K = 5 / 9;

function unit(kind: UnitKind, symbol: string, factor: number, offset = 0): UnitDefinition {
  return { kind, symbol, factor, offset };
}

/** SI base of each kind: m, m², m³, °C, K, W, kWh, W/m², W/(m² K), m² K/W, W/(m K), W/K, kWh/m², m³/h, 1/h, m/s, kg, °, 1. */
export const units = {
  m: unit("length", "m", 1),
  ft: unit("length", "ft", FOOT_M),
  mm: unit("smallLength", "mm", 0.001),
  in: unit("smallLength", "in", FOOT_M / 12),
  km: unit("distance", "km", 1000),
  mi: unit("distance", "mi", 5280 * FOOT_M),
  m2: unit("area", "m²", 1),
  ft2: unit("area", "ft²", FOOT_M ** 2),
  m3: unit("volume", "m³", 1),
  ft3: unit("volume", "ft³", FOOT_M ** 3),
  C: unit("temperature", "°C", 1),
  F: unit("temperature", "°F", FAHRENHEIT_STEP_K, -32 * FAHRENHEIT_STEP_K),
  K: unit("temperatureDifference", "K", 1),
  Fdiff: unit("temperatureDifference", "°F", FAHRENHEIT_STEP_K),
  W: unit("power", "W", 1),
  kW: unit("power", "kW", 1000),
  BtuH: unit("power", "Btu/h", BTU_J / 3600),
  kBtuH: unit("power", "kBtu/h", BTU_J / 3.6),
  kWh: unit("energy", "kWh", 1),
  MWh: unit("energy", "MWh", 1000),
  MJ: unit("energy", "MJ", 1 / 3.6),
  MMBtu: unit("energy", "MMBtu", BTU_J / 3.6),
  therm: unit("energy", "therm", BTU_J / 36),
  WM2: unit("heatFlux", "W/m²", 1),
  BtuHFt2: unit("heatFlux", "Btu/(h·ft²)", BTU_J / 3600 / FOOT_M ** 2),
  WM2K: unit("uValue", "W/(m²·K)", 1),
  BtuHFt2F: unit("uValue", "Btu/(h·ft²·°F)", BTU_J / 3600 / FOOT_M ** 2 / FAHRENHEIT_STEP_K),
  M2KW: unit("rValue", "m²·K/W", 1),
  hFt2FBtu: unit("rValue", "h·ft²·°F/Btu", (3600 * FOOT_M ** 2 * FAHRENHEIT_STEP_K) / BTU_J),
  WMK: unit("linearLoss", "W/(m·K)", 1),
  BtuHFtF: unit("linearLoss", "Btu/(h·ft·°F)", BTU_J / 3600 / FOOT_M / FAHRENHEIT_STEP_K),
  WK: unit("lossCoefficient", "W/K", 1),
  BtuHF: unit("lossCoefficient", "Btu/(h·°F)", BTU_J / 3600 / FAHRENHEIT_STEP_K),
  kWhM2: unit("energyPerArea", "kWh/m²", 1),
  kBtuFt2: unit("energyPerArea", "kBtu/ft²", BTU_J / 3600 / FOOT_M ** 2),
  m3h: unit("airFlow", "m³/h", 1),
  cfm: unit("airFlow", "cfm", FOOT_M ** 3 * 60),
  perHour: unit("airChange", "changes/h", 1),
  ms: unit("speed", "m/s", 1),
  mph: unit("speed", "mph", (5280 * FOOT_M) / 3600),
  kg: unit("mass", "kg", 1),
  lb: unit("mass", "lb", POUND_KG),
  deg: unit("angle", "°", 1),
  share: unit("share", "", 1),
  percent: unit("share", "%", 0.01),
  each: unit("count", "", 1),
  h: unit("hours", "h", 1),
} as const satisfies Record<string, UnitDefinition>;

export type UnitId = keyof typeof units;

export type UnitSystem = "si" | "us";

/** Which unit each kind is shown in when the reader has chosen a system. */
export const displayUnits: Record<UnitSystem, Record<UnitKind, UnitId>> = {
  si: {
    length: "m",
    smallLength: "mm",
    distance: "km",
    area: "m2",
    volume: "m3",
    temperature: "C",
    temperatureDifference: "K",
    power: "kW",
    energy: "kWh",
    heatFlux: "WM2",
    uValue: "WM2K",
    rValue: "M2KW",
    linearLoss: "WMK",
    lossCoefficient: "WK",
    energyPerArea: "kWhM2",
    airFlow: "m3h",
    airChange: "perHour",
    speed: "ms",
    mass: "kg",
    angle: "deg",
    share: "percent",
    count: "each",
    hours: "h",
  },
  us: {
    length: "ft",
    smallLength: "in",
    distance: "mi",
    area: "ft2",
    volume: "ft3",
    temperature: "F",
    temperatureDifference: "Fdiff",
    power: "kBtuH",
    energy: "MMBtu",
    heatFlux: "BtuHFt2",
    uValue: "BtuHFt2F",
    rValue: "hFt2FBtu",
    linearLoss: "BtuHFtF",
    lossCoefficient: "BtuHF",
    energyPerArea: "kBtuFt2",
    airFlow: "cfm",
    airChange: "perHour",
    speed: "mph",
    mass: "lb",
    angle: "deg",
    share: "percent",
    count: "each",
    hours: "h",
  },
};

/**
 * Converts a typed number to the SI unit of its kind.
 * Units: whatever `unitId` says → SI base of the kind. No range check: the caller's contract does that.
 */
export function toSi(value: number, unitId: UnitId): number {
  const definition = units[unitId];
  return value * definition.factor + definition.offset;
}

/** Converts an SI number to the given unit; the inverse of {@link toSi}. */
export function fromSi(siValue: number, unitId: UnitId): number {
  const definition = units[unitId];
  return (siValue - definition.offset) / definition.factor;
}

/** The unit in which `kind` is shown to a reader of `system`. */
export function displayUnit(kind: UnitKind, system: UnitSystem): UnitId {
  return displayUnits[system][kind];
}
