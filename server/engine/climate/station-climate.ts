/** How a monthly figure came about: read or measured, model grid, derived, estimated, borrowed from a neighbour, or absent. */
export type ClimateFlag = "R" | "G" | "D" | "E" | "B" | "N";

/** Monthly normals of one place. Lists hold twelve values, January first; null where the source has none. */
export interface StationClimate {
  id: string;
  name: string;
  latitudeDeg: number;
  longitudeDeg: number;
  elevationM: number | null;
  meanTempC: number[];
  maxTempC: number[];
  minTempC: number[];
  /** Relative humidity, 0 to 1. */
  humidityFrac: number[] | null;
  dewPointC: number[] | null;
  windMS: number[] | null;
  /** Mean daily sum of sun on the flat, kWh/m². */
  globalKwhM2Day: number[] | null;
  /** Standard deviation of hourly and of daily mean temperature within the month, K. */
  hourlySpreadK: number[] | null;
  dailySpreadK: number[] | null;
  /** Dry-bulb temperature exceeded in 99.6 % and 99 % of all hours of the year. */
  design996C: number | null;
  design99C: number | null;
  /** Mean and lowest of the yearly coldest temperatures. */
  yearlyColdest: { meanC: number; lowestC: number; winters: number } | null;
  flags: {
    humidity: ClimateFlag;
    wind: ClimateFlag;
    global: ClimateFlag;
    spread: ClimateFlag;
    design: string;
  };
}
