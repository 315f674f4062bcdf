import type { UnitId } from "../../../server/engine/units.ts";

/** What one press of plus or minus adds, by unit; units whose sizes vary widely step by their own magnitude. */
const steps: Partial<Record<UnitId, number>> = {
  m: 0.1,
  ft: 0.5,
  mm: 5,
  in: 0.25,
  C: 1,
  F: 1,
  K: 0.5,
  Fdiff: 1,
  WM2: 5,
  BtuHFt2: 1,
  WM2K: 0.1,
  BtuHFt2F: 0.01,
  WMK: 0.05,
  BtuHFtF: 0.05,
  perHour: 0.1,
  deg: 1,
  percent: 5,
  h: 1,
};

function magnitudeStep(value: number): number {
  const size = Math.abs(value);
  return size < 1e-6 ? 1 : 10 ** (Math.floor(Math.log10(size)) - 1);
}

export function stepOf(unit: UnitId, value: number): number {
  const fixed = steps[unit];
  if (fixed !== undefined) return fixed;
  const step = magnitudeStep(value);
  return unit === "each" ? Math.max(1, step) : step;
}

/** The typed text after one step up or down; an unreadable number stays as it is. */
export function stepped(typed: string, unit: UnitId, direction: 1 | -1, steppedBy?: number): string {
  const value = Number(typed.trim().replace("\u2212", "-"));
  if (typed.trim() === "" || !Number.isFinite(value)) return typed;
  const step = steppedBy ?? stepOf(unit, value);
  const decimals = Math.max(
    0,
    Math.min(4, -Math.floor(Math.log10(step) + 1e-9)),
    (String(step).split(".")[1] ?? "").length,
  );
  const typedDecimals = (typed.split(".")[1] ?? "").length;
  const next = value + direction * step;
  return next.toFixed(Math.min(4, Math.max(decimals, Math.min(typedDecimals, 4))));
}
