import type { BuildingSummary } from "../../../../server/contracts/buildings.ts";
import { joined, spanRange } from "../../../lib/format.ts";
import type { Units } from "../../../lib/units.ts";

/** Need against fitted heat in one line, or how far the survey has come. */
export function houseLine(building: BuildingSummary, units: Units): string {
  const { plan } = building;
  if (plan === null || plan.verdict === "cannotSay") {
    return `${building.answered} of ${building.questions} answered`;
  }
  if (plan.verdict === "notApplicable") return units.text(building.floorAreaM2, "area");
  const need = units.figure(plan.requiredW, "power", { decimals: 0 });
  const have = units.figure(plan.installedW, "power", { decimals: 0 });
  return `needs ${need.value}, has ${joined(have)}`;
}

interface Fact {
  name: string;
  value: string;
}

/** What a person asks next about a chosen house. */
export function houseFacts(building: BuildingSummary, units: Units): Fact[] {
  const { plan } = building;
  if (plan === null || plan.verdict === "cannotSay") {
    return [
      { name: "Floor", value: units.text(building.floorAreaM2, "area") },
      { name: "Survey", value: `${building.answered} of ${building.questions}` },
    ];
  }
  if (plan.verdict === "notApplicable") {
    return [{ name: "Coldest night", value: units.temperature(plan.onceInYearsDesignC) }];
  }
  const facts = [
    { name: "Coldest night", value: units.temperature(plan.onceInYearsDesignC) },
    { name: "Settles at", value: units.temperature(plan.settlesAtC) },
  ];
  const { hoursToCriticalLow: low, hoursToCriticalHigh: high } = plan;
  if (low !== null && high !== null)
    facts.push({ name: "Until critical, no heat", value: spanRange(low, high) });
  return facts;
}
