import type { AirFlows } from "../balance/house-losses.ts";
import { EngineInputError } from "../errors.ts";
import { type AnimalClass, animalClasses, massRangeKg } from "../livestock/animal-classes.ts";
import { animalHeat, type StockHeat } from "../livestock/animal-heat.ts";
import { minimumVentilation } from "../livestock/minimum-ventilation.ts";
import type { MonthUse } from "./house-input.ts";
import type { HouseModel } from "./house-model.ts";
import { nightLowRatio } from "./stock-night.ts";

/** Relative humidity of cold outdoor air at night. Source [DESIGNNIGHT]. */
export const NIGHT_HUMIDITY_FRAC = 0.85;
const NO_STOCK: StockHeat = {
  totalW: 0,
  sensibleW: 0,
  latentW: 0,
  moistureKgH: 0,
  carbonDioxideM3H: 0,
};

/** Nearer to the inside temperature than this the fans follow warmth and no longer moisture, K. Source [BARNRULE]. */
const MOISTURE_FROM_K = 10;

export interface GovernedAir {
  air: AirFlows;
  governs: string;
}

/** What the stock of one month gives off and the air it needs. */
export interface HouseAir {
  stockAt(insideTempC: number): StockHeat;
  /** Sensible heat at the low of the animals' night, as a share of its daily mean. */
  nightRatio: number;
  flowsAt(insideTempC: number, outdoorTempC: number): GovernedAir;
}

/**
 * Air and stock of a house in one month. With fans running, leaks are part of their flow; the leaks are added on top only
 * where the input says so. Shape: model, month's use → functions of temperature. Throws EngineInputError for an unknown class.
 * Source [LEAKFANS], [CIGR2002] through the livestock functions.
 */
export function houseAir(model: HouseModel, use: MonthUse): HouseAir {
  const { input, geometry, pressurePa } = model;
  const leakM3H = input.leakageAirChangesPerHour * geometry.volumeM3;
  const { stock } = input;
  const leaksAlone: GovernedAir = {
    air: { fansM3H: 0, leaksM3H: leakM3H, recoveryFrac: 0 },
    governs: "leakage",
  };
  if (stock === null || use.headCount === 0 || !use.occupied)
    return { stockAt: () => NO_STOCK, nightRatio: 1, flowsAt: () => leaksAlone };
  const animal = knownClass(stock.classId);
  const massKg = massWithin(animal, use.massKg);
  const nightRatio = nightLowRatio(animal);
  const stockAt = (houseTempC: number) =>
    animalHeat({
      animal,
      massKg,
      headCount: use.headCount,
      houseTempC: Math.min(45, Math.max(-40, houseTempC)),
    });
  const withFans = (fansM3H: number, governs: string): GovernedAir => ({
    air: {
      fansM3H,
      leaksM3H: input.leakageUnderFans === "added" ? leakM3H : Math.max(0, leakM3H - fansM3H),
      recoveryFrac: stock.heatRecoveryFrac,
    },
    governs: leakM3H > fansM3H && input.leakageUnderFans !== "added" ? "leakage" : governs,
  });
  const { ventilation } = stock;
  if (ventilation.mode === "typed")
    return { stockAt, nightRatio, flowsAt: () => withFans(ventilation.flowM3H, "typed") };
  return {
    stockAt,
    nightRatio,
    flowsAt(insideTempC, outdoorTempC) {
      const heat = stockAt(insideTempC);
      const minimum = minimumVentilation({
        moistureKgH: heat.moistureKgH,
        carbonDioxideM3H: heat.carbonDioxideM3H,
        insideTempC,
        humidityLimitFrac: stock.humidityLimitFrac,
        outdoorTempC: Math.min(outdoorTempC, insideTempC - MOISTURE_FROM_K),
        outdoorHumidityFrac: NIGHT_HUMIDITY_FRAC,
        pressurePa,
        carbonDioxideLimitPpm: stock.carbonDioxideLimitPpm,
        headCount: use.headCount,
        perHeadM3H: ventilation.perKg075M3H
          ? ventilation.perKg075M3H * massKg ** 0.75
          : ventilation.perHeadM3H,
      });
      return withFans(minimum.flowM3H, minimum.governs);
    },
  };
}

function knownClass(classId: string): AnimalClass {
  const found = animalClasses.find((known) => known === classId);
  if (found) return found;
  throw new EngineInputError({
    quantity: "stock.classId",
    value: Number.NaN,
    reason: "inconsistent",
    note: `"${classId}" is not a class of animals the engine knows.`,
  });
}

/** A mass outside the range of its class is brought to the nearest end; the plan warns of it. */
function massWithin(animal: AnimalClass, massKg: number): number {
  const range = massRangeKg(animal);
  return Math.min(range.maxKg, Math.max(range.minKg, massKg));
}
