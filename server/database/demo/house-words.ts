import type { Origin, Quantity } from "../../contracts/quantity.ts";
import type { Survey, SurveyCover, SurveyHeater } from "../../contracts/survey.ts";
import type { UnitId } from "../../engine/units.ts";

/** Short words to write demo surveys with. */
export const q = (typed: number | string, unit: UnitId, origin: Origin = "measured"): Quantity => ({
  typed: String(typed),
  unit,
  origin,
});

export const said = <T extends string>(value: T, origin: Origin = "measured") => ({ value, origin });

export const cover = (
  id: string,
  origin: Origin = "measured",
  uValue: Quantity | null = null,
): SurveyCover => ({
  cover: said(id, origin),
  uValue,
});

export interface DemoHeater {
  label: string;
  type: string;
  rating: Quantity;
  basis: "input" | "output";
  efficiency: number;
  count?: number;
  fuel: string;
}

export function heater(words: DemoHeater): SurveyHeater {
  return {
    label: words.label,
    type: said(words.type, "plate"),
    rating: words.rating,
    basis: said(words.basis, "plate"),
    efficiency: q(words.efficiency, "percent", "plate"),
    count: q(words.count ?? 1, "each"),
    fuel: said(words.fuel),
  };
}

export interface MonthWords {
  night: Quantity;
  day: Quantity;
  heads?: Quantity;
  mass?: Quantity;
  /** Months in use, 1 to 12; left out, all. */
  inUse?: number[];
}

/** The same answers in every month, with the months in which the house stands empty. */
export function sameMonths(survey: Survey, words: MonthWords): Survey["months"] {
  return survey.months.map((month, index) => ({
    occupied: words.inUse === undefined || words.inUse.includes(index + 1),
    nightSetpoint: words.night,
    daySetpoint: words.day,
    headCount: words.heads ?? month.headCount,
    mass: words.mass ?? month.mass,
  }));
}

export interface DemoHouse {
  farm: string;
  name: string;
  kind: "greenhouse" | "barn";
  /** Metres east and north of the farm's own point. */
  eastM: number;
  northM: number;
  bearingDeg: number;
  shape: Survey["shape"];
  /** What the adviser found, on top of the typical answers. */
  answers(survey: Survey): Partial<Survey>;
  /** How far the plan has come. `none`: survey unfinished, no plan yet. */
  plan: "none" | "draft" | "sent" | "asked" | "approved" | "declined";
  /** What the farmer wrote with the answer. */
  farmerSays?: string;
  advisorSays?: string;
}
