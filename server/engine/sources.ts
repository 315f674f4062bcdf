import { airSources } from "./air/sources.ts";
import { balanceSources } from "./balance/sources.ts";
import { basicSources } from "./basic-sources.ts";
import { billSources } from "./bills/sources.ts";
import { climateSources } from "./climate/sources.ts";
import { energySources } from "./energy/sources.ts";
import { envelopeSources } from "./envelope/sources.ts";
import { failureSources } from "./failure/sources.ts";
import { fuelSources } from "./fuel/sources.ts";
import { geometrySources } from "./geometry/sources.ts";
import { heaterSources } from "./heaters/sources.ts";
import { livestockSources } from "./livestock/sources.ts";
import { moneySources } from "./money/sources.ts";
import { planSources } from "./plan/sources.ts";
import { sizingSources } from "./sizing/sources.ts";
import { solarSources } from "./solar/sources.ts";

/** Where a method, a coefficient or a rule comes from, and whether it was read for this work. */
export interface Source {
  author: string;
  year: number;
  title: string;
  part?: string;
  read: "read" | "from memory" | "common practice";
}

/** Every source of the engine by the key that docstrings cite in square brackets. */
export const engineSources: Readonly<Record<string, Source>> = {
  ...basicSources,
  ...airSources,
  ...balanceSources,
  ...billSources,
  ...climateSources,
  ...energySources,
  ...envelopeSources,
  ...failureSources,
  ...fuelSources,
  ...geometrySources,
  ...heaterSources,
  ...livestockSources,
  ...moneySources,
  ...planSources,
  ...sizingSources,
  ...solarSources,
};
