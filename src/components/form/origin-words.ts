import type { Origin } from "../../../server/contracts/quantity.ts";

/** How each origin is called in the form, and how strong it is as evidence. */
export const originWords: Record<
  Origin,
  { short: string; long: string; strength: "known" | "told" | "assumed" }
> = {
  measured: { short: "measured", long: "Measured on site", strength: "known" },
  plate: { short: "plate", long: "Read from a plate", strength: "known" },
  bill: { short: "bill", long: "Taken from a bill", strength: "known" },
  guess: { short: "told", long: "Told or estimated", strength: "told" },
  default: { short: "typical", long: "Typical value, not checked", strength: "assumed" },
};

export const originOrder: Origin[] = ["measured", "plate", "bill", "guess", "default"];
