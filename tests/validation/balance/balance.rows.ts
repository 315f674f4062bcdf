import { AIR_HEAT_WHM3K, airHeatWK } from "../../../server/engine/balance/air-heat.ts";
import { uValueAtWindWM2K } from "../../../server/engine/balance/typed-u-value.ts";
import { outsideView } from "../../../server/engine/balance/view.ts";
import { runTypicalDay } from "../../../server/engine/energy/day-run.ts";
import { houseModel } from "../../../server/engine/plan/house-model.ts";
import { usualNight } from "../../../server/engine/plan/night-balances.ts";
import { everyMonth, tunnel, typedCover } from "../../engine/plan/example-houses.ts";
import { type CheckRow, digits, within } from "../record-check.ts";

export const topic = "House balance";

/** 30 × 10 m, eave 2.5 m, ridge 5 m, U 4.0, edge 1.38 W/(m K), one air change, 33 K. */
function workedHouse() {
  const cover = typedCover(4);
  const input = tunnel({
    site: { ...tunnel().site, elevationM: 0 },
    shape: { type: "gable", lengthM: 30, widthM: 10, eaveHeightM: 2.5, ridgeHeightM: 5 },
    covers: { roof: cover, sideWall: cover, endWall: cover },
    leakageAirChangesPerHour: 1,
    floorEdgeLossWMK: 1.38,
    months: everyMonth({ nightSetpointC: 18 }),
  });
  const model = houseModel(input);
  return usualNight(model, {
    month: 1,
    use: input.months[0] ?? { occupied: true, nightSetpointC: 18, daySetpointC: 18, headCount: 0, massKg: 0 },
    outdoorTempC: -15,
    windMS: 3,
    soilTempC: 8,
    unitOutputsW: [],
  });
}

const house = workedHouse();
const HAND = "closed forms, evaluated by hand";

function coldHouseC(): number {
  const hours = Array.from({ length: 24 }, () => ({
    lossAtReferenceW: 250 * 18,
    lossPerInsideWK: 250,
    referenceC: 18,
    gainAirW: 1000,
    gainMassW: 0,
    setpointC: 18,
    ventAtC: 25,
  }));
  const results = runTypicalDay(hours, { capacityJK: 5e6, couplingWK: 500 }, 0);
  return results[23]?.insideTempC ?? Number.NaN;
}

export const rows: CheckRow[] = [
  {
    quantity: "Air, Wh/(m³ K) at sea level",
    source: "ASHRAE Handbook of Fundamentals, 1.2 kg/m³ and 1006 J/(kg K)",
    computed: AIR_HEAT_WHM3K,
    expected: 0.3353,
    tolerance: digits(4),
  },
  {
    quantity: "Air at 1524 m against sea level",
    source: "ISO 2533 pressure at 5,000 ft",
    computed: airHeatWK(1000, 84_307) / airHeatWK(1000, 101_325),
    expected: 0.832,
    tolerance: digits(3),
  },
  {
    quantity: "U 6.4 at 6.7 m/s brought to 2 m/s, W/(m² K)",
    source: "ISO 6946 outside film, evaluated by hand",
    computed: uValueAtWindWM2K(6.4, 2),
    expected: 5.28,
    tolerance: digits(2),
  },
  {
    quantity: "U 6.4 at 6.7 m/s brought to 10 m/s, W/(m² K)",
    source: "ISO 6946 outside film, evaluated by hand",
    computed: uValueAtWindWM2K(6.4, 10),
    expected: 6.74,
    tolerance: digits(2),
  },
  {
    quantity: "Sky proper seen by an upright wall",
    source: "Walton 1983, NBSIR 83-2655",
    computed: outsideView(0.5).skyFrac,
    expected: 0.35355,
    tolerance: digits(5),
  },
  {
    quantity: "Sky proper seen by a roof of 30°",
    source: "Walton 1983, NBSIR 83-2655",
    computed: outsideView(0.9330127).skyFrac,
    expected: 0.90122,
    tolerance: digits(5),
  },
  {
    quantity: "House 30 × 10 m, U 4.0, 33 K: through the cover, W",
    source: HAND,
    computed: house.lossesW.cover + house.lossesW.sky,
    expected: 73_974,
    tolerance: within(73_974, 1e-4),
  },
  {
    quantity: "House 30 × 10 m, 33 K: floor edge, W",
    source: HAND,
    computed: house.lossesW.ground,
    expected: 3643,
    tolerance: within(3643, 2e-4),
  },
  {
    quantity: "House 30 × 10 m, 33 K: one air change, W",
    source: HAND,
    computed: house.lossesW.air,
    expected: 12_437,
    tolerance: within(12_437, 1.5e-3),
    remark: "0.3353 against 0.335 Wh/(m³ K) in the hand calculation",
  },
  {
    quantity: "House 30 × 10 m, 33 K: all heat, W",
    source: HAND,
    computed: house.requiredHeatW,
    expected: 90_054,
    tolerance: within(90_054, 3e-4),
  },
  {
    quantity: "Room of 250 W/K with 1 kW and no heater, end temperature, °C",
    source: "steady balance: 1000 / 250",
    computed: coldHouseC(),
    expected: 4,
    tolerance: 0.03,
  },
];
