import type { Origin } from "../../../server/contracts/quantity.ts";

interface Answer {
  origin: Origin;
}

function isAnswer(value: object): value is Answer {
  return "origin" in value && typeof value.origin === "string";
}

/** Every answer inside a part of a survey, with its dotted path. */
export function answersIn(part: unknown, path = ""): { path: string; answer: Answer }[] {
  if (typeof part !== "object" || part === null) return [];
  if (isAnswer(part)) return [{ path, answer: part }];
  return Object.entries(part).flatMap(([key, value]) =>
    answersIn(value, path === "" ? key : `${path}.${key}`),
  );
}

/** How many answers a person gave, and how many stand on typical values. */
export function answeredIn(parts: unknown[]): { answered: number; questions: number } {
  const all = parts.flatMap((part) => answersIn(part));
  return { answered: all.filter(({ answer }) => answer.origin !== "default").length, questions: all.length };
}

/** How many leaves differ between two surveys: the number said to the person as "changes". */
export function countChanges(before: unknown, after: unknown): number {
  if (Object.is(before, after)) return 0;
  const bothObjects =
    typeof before === "object" && before !== null && typeof after === "object" && after !== null;
  if (!bothObjects) return 1;
  if (isAnswer(before) && isAnswer(after)) return JSON.stringify(before) === JSON.stringify(after) ? 0 : 1;
  const left = before as Record<string, unknown>;
  const right = after as Record<string, unknown>;
  const keys = new Set([...Object.keys(left), ...Object.keys(right)]);
  return [...keys].reduce((sum, key) => sum + countChanges(left[key], right[key]), 0);
}
