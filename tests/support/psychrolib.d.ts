declare module "psychrolib" {
  interface PsychroLib {
    readonly SI: number;
    SetUnitSystem(system: number): void;
    GetHumRatioFromRelHum(tempC: number, humidity: number, pressurePa: number): number;
    GetTDewPointFromRelHum(tempC: number, humidity: number): number;
    GetTWetBulbFromRelHum(tempC: number, humidity: number, pressurePa: number): number;
    GetHumRatioFromTDewPoint(dewPointC: number, pressurePa: number): number;
    GetMoistAirDensity(tempC: number, ratio: number, pressurePa: number): number;
    GetMoistAirEnthalpy(tempC: number, ratio: number): number;
    GetMoistAirVolume(tempC: number, ratio: number, pressurePa: number): number;
    GetSatVapPres(tempC: number): number;
    GetStandardAtmPressure(altitudeM: number): number;
  }
  const psychrolib: PsychroLib;
  export default psychrolib;
}
