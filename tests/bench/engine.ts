import type { HousePlanInput } from "../../server/engine/plan/house-input.ts";
import { planHouse } from "../../server/engine/plan/plan-house.ts";
import { median, timings } from "./statistics.ts";

/** Engine figures on the inputs frozen with the demonstration's plans. */
export async function engineFigures(inputs: HousePlanInput[]): Promise<Record<string, number>> {
  const [first] = inputs;
  if (first === undefined) throw new Error("there is nothing to measure");
  for (const input of inputs) planHouse(input);
  const perHouse = await timings(60, () => planHouse(first));
  const start = performance.now();
  for (let index = 0; index < 1000; index += 1) planHouse(inputs[index % inputs.length] ?? first);
  return {
    "engine.planMs": median(perHouse),
    "engine.plan1000S": (performance.now() - start) / 1000,
  };
}
