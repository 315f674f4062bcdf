import psychrolib from "psychrolib";
import {
  airDensityKgM3,
  dewPointC,
  enthalpyKjKg,
  humidityRatio,
  pressureAtAltitudePa,
  specificVolumeM3Kg,
} from "../../../server/engine/air/moist-air.ts";
import { saturationPressurePa } from "../../../server/engine/air/saturation.ts";
import { wetBulbC } from "../../../server/engine/air/wet-bulb.ts";
import type { CheckRow } from "../record-check.ts";

export const topic = "Moist air, worst of a grid";

psychrolib.SetUnitSystem(psychrolib.SI);

const SOURCE = "PsychroLib (Meyer and Thevenard 2019), −40 to 45 °C, 10 to 95 %, 0 to 2500 m: 700 states";

interface State {
  tempC: number;
  humidity: number;
  pressurePa: number;
  ratio: number;
}
const states: State[] = [0, 500, 1500, 2500].flatMap((altitudeM) =>
  Array.from({ length: 35 }, (_, step) => -40 + 2.5 * step).flatMap((tempC) =>
    [0.1, 0.35, 0.6, 0.85, 0.95].map((humidity) => {
      const pressurePa = pressureAtAltitudePa(altitudeM);
      return { tempC, humidity, pressurePa, ratio: humidityRatio(tempC, humidity, pressurePa) };
    }),
  ),
);

function worst(quantity: string, tolerance: number, difference: (state: State) => number): CheckRow {
  const found = Math.max(...states.map((state) => Math.abs(difference(state))));
  return {
    quantity: `Worst difference in ${quantity}`,
    source: SOURCE,
    computed: found,
    expected: 0,
    tolerance,
  };
}

export const rows: CheckRow[] = [
  worst(
    "saturation pressure, share",
    1e-9,
    ({ tempC }) => saturationPressurePa(tempC) / psychrolib.GetSatVapPres(tempC) - 1,
  ),
  worst(
    "water, kg/kg",
    1e-8,
    ({ tempC, humidity, pressurePa, ratio }) =>
      ratio - psychrolib.GetHumRatioFromRelHum(tempC, humidity, pressurePa),
  ),
  worst(
    "dew point, K",
    0.002,
    ({ tempC, humidity }) => dewPointC(tempC, humidity) - psychrolib.GetTDewPointFromRelHum(tempC, humidity),
  ),
  worst(
    "wet bulb, K",
    0.0015,
    ({ tempC, humidity, pressurePa }) =>
      wetBulbC(tempC, humidity, pressurePa) - psychrolib.GetTWetBulbFromRelHum(tempC, humidity, pressurePa),
  ),
  worst(
    "heat content, kJ/kg",
    1e-6,
    ({ tempC, ratio }) => enthalpyKjKg(tempC, ratio) - psychrolib.GetMoistAirEnthalpy(tempC, ratio) / 1000,
  ),
  worst(
    "volume, m³/kg",
    1e-6,
    ({ tempC, ratio, pressurePa }) =>
      specificVolumeM3Kg(tempC, ratio, pressurePa) - psychrolib.GetMoistAirVolume(tempC, ratio, pressurePa),
  ),
  worst(
    "density, kg/m³",
    1e-6,
    ({ tempC, ratio, pressurePa }) =>
      airDensityKgM3(tempC, ratio, pressurePa) - psychrolib.GetMoistAirDensity(tempC, ratio, pressurePa),
  ),
];
