import type { Origin } from "./quantity.ts";
import type { Survey } from "./survey.ts";

export interface AnswerCount {
  /** Answers a person gave. */
  answered: number;
  questions: number;
  /** Answers that were measured or read off a plate or a bill. */
  known: number;
}

const knownOrigins: Origin[] = ["measured", "plate", "bill"];

function walk(node: unknown, count: AnswerCount): void {
  if (node === null || typeof node !== "object") return;
  if ("origin" in node) {
    const { origin } = node as { origin: Origin };
    count.questions += 1;
    if (origin !== "default") count.answered += 1;
    if (knownOrigins.includes(origin)) count.known += 1;
    return;
  }
  for (const child of Object.values(node)) walk(child, count);
}

/** One month that a person has looked at answers for the calendar: each column counts as one question. */
function monthColumns(survey: Survey): unknown {
  const strongest = (key: "nightSetpoint" | "daySetpoint" | "headCount" | "mass") =>
    survey.months.find((month) => month[key].origin !== "default")?.[key] ?? survey.months[0]?.[key];
  const setpoints = { night: strongest("nightSetpoint"), day: strongest("daySetpoint") };
  return survey.use.kind === "barn"
    ? { ...setpoints, head: strongest("headCount"), mass: strongest("mass") }
    : setpoints;
}

/** How much of a survey is answered by a person and how much still stands on typical values. */
export function countAnswers(survey: Survey): AnswerCount {
  const count: AnswerCount = { answered: 0, questions: 0, known: 0 };
  const { months: _months, ...rest } = survey;
  walk(rest, count);
  walk(monthColumns(survey), count);
  return count;
}
