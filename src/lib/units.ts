import { useQueryClient } from "@tanstack/react-query";
import { useMemo, useSyncExternalStore } from "react";
import type { MeView } from "../../server/contracts/people.ts";
import { displayUnit, fromSi, type UnitKind, type UnitSystem } from "../../server/engine/units.ts";
import * as format from "./format.ts";

/** Key under which the signed-in person is cached. */
export const meKey = ["me"] as const;

/** Writes SI numbers in the reader's own units. */
export interface Units {
  system: UnitSystem;
  /** Number and unit apart, for a smaller unit. */
  figure: (
    siValue: number | null | undefined,
    kind: UnitKind,
    options?: format.FigureOptions,
  ) => format.Figure;
  /** Number and unit as one run of text. */
  text: (siValue: number | null | undefined, kind: UnitKind, options?: format.FigureOptions) => string;
  /** Heat in a sentence: whole kW or kBtu/h. */
  heat: (siValueW: number | null | undefined) => string;
  /** Temperature in a sentence: whole degrees. */
  roundTemperature: (siValueC: number | null | undefined) => string;
  temperature: (siValueC: number | null | undefined) => string;
  energy: (siValueKwh: number | null | undefined) => string;
  symbol: (kind: UnitKind) => string;
  /** The bare number in the reader's unit, for axes and files. */
  amount: (siValue: number, kind: UnitKind) => number;
}

/** The writer for one system of units. */
export function unitsFor(system: UnitSystem): Units {
  return {
    system,
    figure: (siValue, kind, options) => format.figure(siValue, kind, system, options),
    text: (siValue, kind, options) => format.text(siValue, kind, system, options),
    heat: (siValueW) => format.heat(siValueW, system),
    roundTemperature: (siValueC) => format.roundTemperature(siValueC, system),
    temperature: (siValueC) => format.temperature(siValueC, system),
    energy: (siValueKwh) => format.energy(siValueKwh, system),
    symbol: (kind) => format.unitSymbol(kind, system),
    amount: (siValue, kind) => fromSi(siValue, displayUnit(kind, system)),
  };
}

/** The units the signed-in person has chosen; SI until that is known. Follows a change at once. */
export function useUnits(): Units {
  const client = useQueryClient();
  const system = useSyncExternalStore(
    (changed) => client.getQueryCache().subscribe(changed),
    () => client.getQueryData<MeView>(meKey)?.units ?? "si",
  );
  return useMemo(() => unitsFor(system), [system]);
}
