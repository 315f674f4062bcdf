import { requireInRange } from "../errors.ts";

declare const kind: unique symbol;

/** Energy of a fuel with the heat of condensing its flue's water, as fuel is billed nearly everywhere, kWh. */
export type GrossKwh = number & { readonly [kind]: "gross" };
/** Energy of a fuel without that heat, kWh. */
export type NetKwh = number & { readonly [kind]: "net" };
/** Heat given to the room, kWh. */
export type DeliveredKwh = number & { readonly [kind]: "delivered" };

const MOST_KWH = 1e12;

/** Says that a number counts gross energy. Units kWh. Valid ±1e12. Errors EngineInputError. Source [HEATINGVALUE]. */
export function grossKwh(value: number): GrossKwh {
  return requireInRange("grossKwh", value, -MOST_KWH, MOST_KWH, "kWh") as GrossKwh;
}

/** Says that a number counts net energy. Units kWh. Valid ±1e12. Errors EngineInputError. Source [HEATINGVALUE]. */
export function netKwh(value: number): NetKwh {
  return requireInRange("netKwh", value, -MOST_KWH, MOST_KWH, "kWh") as NetKwh;
}

/** Says that a number counts heat given to the room. Units kWh. Valid ±1e12. Errors EngineInputError. Source [HEATINGVALUE]. */
export function deliveredKwh(value: number): DeliveredKwh {
  return requireInRange("deliveredKwh", value, -MOST_KWH, MOST_KWH, "kWh") as DeliveredKwh;
}

/** Gross energy as net. Units kWh, 0.6 to 1 → kWh. Errors EngineInputError. Source [HEATINGVALUE]. */
export function netFromGross(energy: GrossKwh, netOverGrossFrac: number): NetKwh {
  return netKwh(energy * requireInRange("netOverGrossFrac", netOverGrossFrac, 0.3, 1));
}

/** Net energy as gross. Units kWh, 0.6 to 1 → kWh. Errors EngineInputError. Source [HEATINGVALUE]. */
export function grossFromNet(energy: NetKwh, netOverGrossFrac: number): GrossKwh {
  return grossKwh(energy / requireInRange("netOverGrossFrac", netOverGrossFrac, 0.3, 1));
}

/** Heat a heater makes of fuel. Units kWh, efficiency on the gross value 0.05 to 7 → kWh. Errors EngineInputError. Source [HEATINGVALUE]. */
export function deliveredFrom(energy: GrossKwh, grossEfficiencyFrac: number): DeliveredKwh {
  return deliveredKwh(energy * requireInRange("grossEfficiencyFrac", grossEfficiencyFrac, 0.05, 7));
}

/** Fuel for a heat. Units kWh, efficiency on the gross value 0.05 to 7 → kWh. Errors EngineInputError. Source [HEATINGVALUE]. */
export function grossFor(heat: DeliveredKwh, grossEfficiencyFrac: number): GrossKwh {
  return grossKwh(heat / requireInRange("grossEfficiencyFrac", grossEfficiencyFrac, 0.05, 7));
}
