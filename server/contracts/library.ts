/** Reference lists the survey chooses from. All are defaults to be shown as such. */
export interface LibraryEntry {
  id: string;
  name: string;
  group: string;
  /** Where the figures come from, or "from memory". */
  source: string;
}

export interface CoverEntry extends LibraryEntry {
  /** Which kinds of building offer it first. */
  usedFor: ("greenhouse" | "barn")[];
  parts: ("roof" | "sides" | "ends" | "ceiling" | "kneewall")[];
  /** Whole-cover U-value at the stated reference conditions, W/(m² K). */
  uValueWM2K: number;
  /** True where the U-value was read from a table and not worked out from the layers. */
  uValuePublished: boolean;
  solarTransmittance: number;
  layers: { name: string; thicknessMm: number | null }[];
}

export interface ScreenEntry extends LibraryEntry {
  savingFrac: number;
}

export interface CropEntry extends LibraryEntry {
  nightC: number;
  dayC: number;
  criticalC: number;
}

export interface AnimalEntry extends LibraryEntry {
  typicalMassKg: number;
  typicalSetpointC: number;
  criticalC: number;
  ventilationM3HHead: number;
  humidityLimitFrac: number;
}

export interface LeakageEntry extends LibraryEntry {
  airChangesPerHour: number;
}

export interface FloorEdgeEntry extends LibraryEntry {
  lossWMK: number;
}

export interface HeaterTypeEntry extends LibraryEntry {
  efficiencyFrac: number;
  vented: boolean;
  fuels: string[];
}

export interface FuelEntry extends LibraryEntry {
  unit: string;
  kwhGrossPerUnit: number;
  carbonDioxideKgPerKwh: number;
  biogenic: boolean;
}

export interface LibraryView {
  covers: CoverEntry[];
  screens: ScreenEntry[];
  crops: CropEntry[];
  animals: AnimalEntry[];
  leakage: LeakageEntry[];
  floorEdges: FloorEdgeEntry[];
  heaterTypes: HeaterTypeEntry[];
  fuels: FuelEntry[];
}
