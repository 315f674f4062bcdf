import { EngineInputError, requireInRange } from "../errors.ts";

const LENGTHS = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31] as const;

const isLeap = (year: number) => (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0;

/** Days in a month of a year. Valid 1900 to 2200. Errors EngineInputError. Source: Gregorian calendar. */
export function daysInMonth(year: number, month: number): number {
  requireInRange("year", year, 1900, 2200);
  requireInRange("month", month, 1, 12);
  return month === 2 && isLeap(year) ? 29 : (LENGTHS[month - 1] ?? 31);
}

/**
 * Number of a day, 1 January 1970 being 0. A day that does not exist, such as 31 February, throws EngineInputError.
 *
 * Valid 1900 to 2200. Source: Gregorian calendar.
 */
export function dayNumber(year: number, month: number, day: number): number {
  if (!Number.isInteger(year) || !Number.isInteger(month) || !Number.isInteger(day))
    throw new EngineInputError({
      quantity: "day",
      value: day,
      reason: "inconsistent",
      note: "A date is made of whole numbers.",
    });
  requireInRange("day", day, 1, daysInMonth(year, month));
  const before = year - 1;
  const leaps = Math.floor(before / 4) - Math.floor(before / 100) + Math.floor(before / 400);
  let days = before * 365 + leaps;
  for (let past = 1; past < month; past += 1) days += daysInMonth(year, past);
  return days + day - 1 - 719_162;
}

/**
 * Year, month and day of a day's number, the inverse of {@link dayNumber}. Valid −25567 to 84370. Errors EngineInputError.
 * Source: Gregorian calendar.
 */
export function dateOf(number: number): { year: number; month: number; day: number } {
  requireInRange("number", number, -25_567, 84_370);
  let year = 1970 + Math.floor(number / 365.2425);
  while (dayNumber(year, 1, 1) > number) year -= 1;
  while (year < 2200 && dayNumber(year + 1, 1, 1) <= number) year += 1;
  let left = Math.floor(number) - dayNumber(year, 1, 1);
  let month = 1;
  while (left >= daysInMonth(year, month)) {
    left -= daysInMonth(year, month);
    month += 1;
  }
  return { year, month, day: left + 1 };
}
