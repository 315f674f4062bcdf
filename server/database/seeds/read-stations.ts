import { readFileSync } from "node:fs";
import { join } from "node:path";
import { parse } from "csv-parse/sync";
import type { ClimateFlag, StationClimate } from "../../engine/climate/station-climate.ts";
import type { StationRecord } from "../../models/climate-station.ts";

type Row = Record<string, string>;

const folder = join(import.meta.dirname, "../../../data/climate");
const months = Array.from({ length: 12 }, (_, index) => String(index + 1).padStart(2, "0"));

function rowsOf(file: string): Row[] {
  return parse(readFileSync(join(folder, file), "utf8"), { columns: true, bom: true }) as Row[];
}

function number(text: string | undefined): number | null {
  return text === undefined || text === "" ? null : Number(text);
}

/** Twelve values, or null when any is absent. */
function series(row: Row, prefix: string, scale = 1): number[] | null {
  const values = months.map((month) => number(row[`${prefix}_${month}`]));
  return values.every((value) => value !== null)
    ? values.map((value) => Number((value * scale).toFixed(6)))
    : null;
}

/** Borrowed values by station and quantity. */
function fillIns(): Map<string, number[]> {
  const key = (row: Row) => `${row.id}/${row.variable}`;
  return new Map(
    rowsOf("fill-ins.csv").map((row) => [key(row), months.map((month) => Number(row[`m${month}`]))]),
  );
}

function flag(row: Row, name: string): ClimateFlag {
  return (row[name] || "N") as ClimateFlag;
}

export interface StationRow {
  id: string;
  name: string;
  country: string;
  latitudeDeg: number;
  longitudeDeg: number;
  elevationM: number | null;
  record: StationRecord;
}

/** The bundled climate table, gaps kept as gaps. Rows without twelve mean, highest and lowest temperatures are left out. */
export function readStations(): StationRow[] {
  const borrowed = fillIns();
  const extremes = new Map(rowsOf("extreme-minima.csv").map((row) => [row.id, row]));
  return rowsOf("stations.csv").flatMap((row) => {
    const climate = climateOf(row, borrowed, extremes.get(row.id ?? ""));
    if (climate === null) return [];
    const { id, name, latitudeDeg, longitudeDeg, elevationM } = climate.climate;
    return [{ id, name, country: row.country ?? "", latitudeDeg, longitudeDeg, elevationM, record: climate }];
  });
}

function climateOf(
  row: Row,
  borrowed: Map<string, number[]>,
  extreme: Row | undefined,
): StationRecord | null {
  const meanTempC = series(row, "tmean");
  const maxTempC = series(row, "tmax");
  const minTempC = series(row, "tmin");
  if (meanTempC === null || maxTempC === null || minTempC === null) return null;
  const id = row.id ?? "";
  const fill = (name: string, scale = 1) =>
    borrowed.get(`${id}/${name}`)?.map((value) => value * scale) ?? null;
  const measuredSun = series(row, "ghi");
  const estimatedSun = series(row, "ghi_est") ?? fill("ghi_est");
  const humidity = series(row, "rh", 0.01);
  const climate: StationClimate = {
    id,
    name: row.name ?? id,
    latitudeDeg: Number(row.lat),
    longitudeDeg: Number(row.lon),
    elevationM: number(row.elev_m),
    meanTempC,
    maxTempC,
    minTempC,
    humidityFrac: humidity ?? fill("rh", 0.01),
    dewPointC: series(row, "tdew") ?? fill("tdew"),
    windMS: series(row, "wind"),
    globalKwhM2Day: measuredSun ?? estimatedSun,
    hourlySpreadK: series(row, "tsdh"),
    dailySpreadK: series(row, "tsdd"),
    design996C: number(row.dt996),
    design99C: number(row.dt99),
    yearlyColdest: extremeOf(extreme),
    flags: {
      humidity: humidity === null && fill("rh") !== null ? "B" : flag(row, "fl_rh"),
      wind: flag(row, "fl_wind"),
      global: measuredSun === null ? (estimatedSun === null ? "N" : "E") : flag(row, "fl_ghi"),
      spread: flag(row, "fl_tsd"),
      design: row.dt_flag ?? "N",
    },
  };
  return {
    climate,
    kind: row.kind ?? "",
    source: row.source ?? "",
    period: row.source_period ?? "",
    licence: row.licence ?? "",
    note: row.note ?? "",
    globalEstimated: measuredSun === null && estimatedSun !== null,
  };
}

function extremeOf(row: Row | undefined): StationClimate["yearlyColdest"] {
  if (row === undefined) return null;
  return {
    meanC: Number(row.mean_of_yearly_coldest_c),
    lowestC: Number(row.coldest_reported_c),
    winters: Number(row.winters),
  };
}
