import {
  displayUnit,
  fromSi,
  type UnitId,
  type UnitKind,
  type UnitSystem,
  units,
} from "../../server/engine/units.ts";

/**
 * The only place where numbers, dates and spans of time become text.
 * A minus is U+2212, a space between number and unit is U+00A0, thousands take a comma, decimals a point.
 */
const MINUS = "\u2212";
const NO_BREAK = "\u00a0";
const MISSING = "\u2013";

/** A number and its unit apart, so that the unit can be set smaller and greyer. */
export interface Figure {
  value: string;
  unit: string;
}

export const monthShort = [
  "Jan",
  "Feb",
  "Mar",
  "Apr",
  "May",
  "Jun",
  "Jul",
  "Aug",
  "Sep",
  "Oct",
  "Nov",
  "Dec",
];
export const monthLong = [
  "January",
  "February",
  "March",
  "April",
  "May",
  "June",
  "July",
  "August",
  "September",
  "October",
  "November",
  "December",
];

/** Name of a month by its number, 1 to 12. */
export function monthName(month: number): string {
  return monthLong[month - 1] ?? MISSING;
}

export function monthAbbreviation(month: number): string {
  return monthShort[month - 1] ?? MISSING;
}

/** A plain number with a fixed count of decimals; a dash where there is none. */
export function number(value: number | null | undefined, decimals = 0): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return MISSING;
  const text = Math.abs(value).toLocaleString("en-GB", {
    minimumFractionDigits: decimals,
    maximumFractionDigits: decimals,
  });
  const isZero = !/[1-9]/.test(text);
  return value < 0 && !isZero ? `${MINUS}${text}` : text;
}

/** Decimals in which a unit is read by people of the trade, by the size of the number. */
const fixedDecimals: Partial<Record<UnitId, number>> = {
  m: 2,
  ft: 1,
  mm: 0,
  in: 1,
  km: 0,
  mi: 0,
  m2: 0,
  ft2: 0,
  m3: 0,
  ft3: 0,
  C: 1,
  F: 0,
  K: 1,
  Fdiff: 1,
  WM2K: 2,
  BtuHFt2F: 2,
  WMK: 2,
  BtuHFtF: 2,
  perHour: 2,
  ms: 1,
  mph: 0,
  kg: 1,
  lb: 1,
  deg: 0,
  percent: 0,
  each: 0,
  h: 0,
  m3h: 0,
  cfm: 0,
};

/** How many decimals `siValue` of `kind` is written with. */
export function decimalsFor(unit: UnitId, shown: number): number {
  const fixed = fixedDecimals[unit];
  if (fixed !== undefined) return fixed;
  const size = Math.abs(shown);
  if (size >= 100) return 0;
  return size >= 10 || units[unit].kind === "power" ? 1 : 2;
}

export interface FigureOptions {
  decimals?: number;
  /** Shows the number in this unit and not in the reader's usual one. */
  unit?: UnitId;
}

/** An SI number as the reader of `system` reads it, number and unit apart. */
export function figure(
  siValue: number | null | undefined,
  kind: UnitKind,
  system: UnitSystem,
  options: FigureOptions = {},
): Figure {
  const unit = options.unit ?? displayUnit(kind, system);
  if (siValue === null || siValue === undefined || !Number.isFinite(siValue))
    return { value: MISSING, unit: "" };
  const shown = fromSi(siValue, unit);
  return { value: number(shown, options.decimals ?? decimalsFor(unit, shown)), unit: units[unit].symbol };
}

/** Number and unit in one run of text, joined by a space that never breaks. */
export function text(
  siValue: number | null | undefined,
  kind: UnitKind,
  system: UnitSystem,
  options: FigureOptions = {},
): string {
  return joined(figure(siValue, kind, system, options));
}

export function joined({ value, unit }: Figure): string {
  if (unit === "") return value;
  return unit === "%" || unit === "°" ? `${value}${unit}` : `${value}${NO_BREAK}${unit}`;
}

/** A length on a drawing: no more decimals than the measure has. */
export function lengthText(siValueM: number, system: UnitSystem): string {
  const shown = fromSi(siValueM, displayUnit("length", system));
  const round = Math.abs(shown * 10 - Math.round(shown * 10)) < 0.05;
  return text(siValueM, "length", system, { decimals: round || system === "us" ? 1 : 2 });
}

/** Heat for a sentence: whole kW or kBtu/h once the number is large enough not to mislead. */
export function heat(siValueW: number | null | undefined, system: UnitSystem): string {
  if (siValueW === 0) return text(0, "power", system, { decimals: 0 });
  const shown = fromSi(siValueW ?? Number.NaN, displayUnit("power", system));
  return text(siValueW, "power", system, { decimals: Math.abs(shown) < 10 ? 1 : 0 });
}

/** A temperature for a sentence, to the whole degree. */
export function roundTemperature(siValueC: number | null | undefined, system: UnitSystem): string {
  return text(siValueC, "temperature", system, { decimals: 0 });
}

/** A temperature in a drawing or table, to the tenth in °C and the whole degree in °F. */
export function temperature(siValueC: number | null | undefined, system: UnitSystem): string {
  return text(siValueC, "temperature", system);
}

/** Energy of a year or month. Thousands of kWh are written as MWh in sentences. */
export function energy(siValueKwh: number | null | undefined, system: UnitSystem): string {
  if (system === "si" && (siValueKwh ?? 0) >= 10_000) {
    const shown = (siValueKwh ?? 0) / 1000;
    return text(siValueKwh, "energy", system, { unit: "MWh", decimals: shown < 100 ? 1 : 0 });
  }
  const shown = fromSi(siValueKwh ?? Number.NaN, displayUnit("energy", system));
  return text(siValueKwh, "energy", system, { decimals: system === "us" && shown < 100 ? 1 : 0 });
}

/** Share between 0 and 1 as a percentage. */
export function percent(frac: number | null | undefined, decimals = 0): string {
  return frac === null || frac === undefined || !Number.isFinite(frac)
    ? MISSING
    : `${number(frac * 100, decimals)}${NO_BREAK}%`;
}

/** The symbol of the unit in which `kind` is shown. */
export function unitSymbol(kind: UnitKind, system: UnitSystem): string {
  return units[displayUnit(kind, system)].symbol;
}

/** A span of hours as hours and minutes: "1 h 20 min". */
export function span(hours: number): string {
  if (hours >= 10) return `${number(hours)}${NO_BREAK}h`;
  const minutes = Math.round((hours * 60) / 5) * 5;
  const whole = Math.floor(minutes / 60);
  const rest = minutes - whole * 60;
  if (whole === 0) return `${rest}${NO_BREAK}min`;
  return rest === 0 ? `${whole}${NO_BREAK}h` : `${whole}${NO_BREAK}h ${rest}${NO_BREAK}min`;
}

/** Two spans as a range in words. */
export function spanRange(low: number, high: number): string {
  const from = span(low);
  const to = span(high);
  return from === to ? `about ${from}` : `${from} to ${to}`;
}

/** "24 Nov", with the year when it is not `now`'s. */
export function day(iso: string, now: Date = new Date()): string {
  const date = new Date(iso);
  if (Number.isNaN(date.getTime())) return MISSING;
  const words = `${date.getDate()} ${monthShort[date.getMonth()]}`;
  return date.getFullYear() === now.getFullYear() ? words : `${words} ${date.getFullYear()}`;
}

/** "16:08", always 24 hours. */
export function clock(iso: string): string {
  const date = new Date(iso);
  if (Number.isNaN(date.getTime())) return MISSING;
  return `${String(date.getHours()).padStart(2, "0")}:${String(date.getMinutes()).padStart(2, "0")}`;
}

export function dayAndClock(iso: string, now: Date = new Date()): string {
  return `${day(iso, now)}, ${clock(iso)}`;
}

/** "1 answer", "3 answers". */
export function counted(count: number, one: string, many = `${one}s`): string {
  return `${number(count)} ${count === 1 ? one : many}`;
}

const compassWords = [
  "N",
  "NNE",
  "NE",
  "ENE",
  "E",
  "ESE",
  "SE",
  "SSE",
  "S",
  "SSW",
  "SW",
  "WSW",
  "W",
  "WNW",
  "NW",
  "NNW",
];

/** Compass word of a bearing in degrees from north. */
export function compass(bearingDeg: number): string {
  const turn = ((bearingDeg % 360) + 360) % 360;
  return compassWords[Math.round(turn / 22.5) % 16] ?? MISSING;
}
