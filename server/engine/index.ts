/**
 * The whole public surface of the heat engine, by topic.
 * Everything here is a pure function of its arguments: no files, no network, no clock, no chance.
 */

export {
  SOLAR_CONSTANT_WM2,
  STANDARD_PRESSURE_PA,
  STEFAN_BOLTZMANN_WM2K4,
  ZERO_CELSIUS_K,
} from "./constants.ts";
export type { InputErrorDetail, InputErrorReason } from "./errors.ts";
export { EngineInputError, requireInRange } from "./errors.ts";
// -- basics
export { ENGINE_VERSION } from "./version.ts";

// -- air

// -- sun

// -- geometry

// -- ground and leakage

// -- envelope

// -- livestock

// -- heaters

// -- fuel, money, bills

// -- failure

// -- climate

// -- house balance, months, sizing, plan
