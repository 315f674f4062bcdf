/** A heater, or a row of equal heaters, by what it gives to the room. */
export interface HeaterUnit {
  outputW: number;
  count: number;
  /** True for a heater that stands there today. */
  existing: boolean;
  label: string;
}

/** One way of fitting the house with heat. */
export interface HeaterOption {
  id: string;
  title: string;
  units: HeaterUnit[];
  totalW: number;
  /** Total minus need on the once-in-N-years night; negative is a shortfall. */
  spareW: number;
  holdsEveryday: boolean;
  holdsOnceInYears: boolean;
  /** Where the house settles on the once-in-N-years night with the largest unit out. */
  largestUnitOutSettlesAtC: number;
  largestUnitOutAboveCritical: boolean;
  /** Plain words: what this choice means. */
  note: string;
}
