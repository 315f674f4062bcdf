import { EngineInputError, requireInRange } from "../errors.ts";
import type { HousePlanInput } from "./house-input.ts";

/**
 * Refuses a plan input that no method is stated for, naming the quantity, its value and the range.
 * Shape: plan input → nothing. Throws EngineInputError. Source: ranges of the methods the plan is made of.
 */
export function checkPlanInput(input: HousePlanInput): void {
  const { site } = input;
  requireInRange("site.latitudeDeg", site.latitudeDeg, -90, 90, "°");
  requireInRange("site.longitudeDeg", site.longitudeDeg, -180, 180, "°");
  requireInRange("site.elevationM", site.elevationM, -430, 5000, "m");
  requireInRange("site.frostHollowK", site.frostHollowK, 0, 15, "K");
  requireInRange("leakageAirChangesPerHour", input.leakageAirChangesPerHour, 0, 50, "1/h");
  requireInRange("floorEdgeLossWMK", input.floorEdgeLossWMK, 0, 10, "W/(m·K)");
  requireInRange("frameAndDirtFrac", input.frameAndDirtFrac, 0, 1);
  requireInRange("lampsWM2", input.lampsWM2, 0, 1000, "W/m²");
  requireInRange("lampHoursPerDay", input.lampHoursPerDay, 0, 24, "h");
  requireInRange("criticalTempC", input.criticalTempC, -30, 45, "°C");
  requireInRange("returnPeriodYears", input.returnPeriodYears, 2, 500, "years");
  requireInRange("fallbackEfficiencyFrac", input.fallbackEfficiencyFrac, 0.1, 6);
  requireInRange("fuel.kwhGrossPerUnit", input.fuel.kwhGrossPerUnit, 1e-6, 1e6, "kWh");
  if (input.months.length !== 12)
    throw new EngineInputError({
      quantity: "months",
      value: input.months.length,
      reason: "length",
      note: "Twelve months are needed, January first.",
    });
  input.months.forEach((month, index) => {
    requireInRange("months.nightSetpointC", month.nightSetpointC, -30, 50, "°C", index);
    requireInRange("months.daySetpointC", month.daySetpointC, -30, 50, "°C", index);
    requireInRange("months.headCount", month.headCount, 0, 1e7, "", index);
    requireInRange("months.massKg", month.massKg, 0, 2000, "kg", index);
  });
  for (const assembly of Object.values(input.covers))
    if (assembly?.kind === "uValue")
      requireInRange("covers.uValueWM2K", assembly.uValueWM2K, 0.01, 15, "W/(m²·K)");
  checkScreen(input);
  input.heaters.forEach((heater, index) => {
    requireInRange("heaters.ratedW", heater.ratedW, 1, 1e8, "W", index);
    requireInRange("heaters.efficiencyFrac", heater.efficiencyFrac, 0.1, 1.2, "", index);
    requireInRange("heaters.count", heater.count, 0, 10_000, "", index);
  });
}

function checkScreen({ screen }: HousePlanInput): void {
  if (screen === null) return;
  requireInRange("screen.coverageFrac", screen.coverageFrac, 0, 1);
  requireInRange("screen.savingFrac", screen.savingFrac, 0, 0.95);
  requireInRange("screen.edgeGapM", screen.edgeGapM, 0, 2, "m");
  requireInRange("screen.solarTransmittance", screen.solarTransmittance, 0, 1);
}
