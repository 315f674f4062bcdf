import type { Assembly, HousePart, HousePlanInput } from "../house-input.ts";
import type { PlanAssumption } from "../plan-types.ts";
import { entry } from "./assumption-entry.ts";

/** Survey path of each part's cover. */
const COVER_FIELDS: Record<HousePart, { field: string; label: string }> = {
  roof: { field: "covers.roof", label: "Roof" },
  sideWall: { field: "covers.sides", label: "Side walls" },
  endWall: { field: "covers.ends", label: "End walls" },
  ceiling: { field: "covers.ceiling", label: "Ceiling" },
  kneewall: { field: "covers.kneewall", label: "Kneewall" },
};

/** Covers of a house, each as its U-value or its layers. Shape: input → list. */
export function coverAssumptions(input: HousePlanInput): PlanAssumption[] {
  const parts = Object.entries(input.covers) as [HousePart, Assembly | undefined][];
  return parts.flatMap(([part, assembly]) => {
    if (!assembly) return [];
    const { field, label } = COVER_FIELDS[part];
    return assembly.kind === "uValue"
      ? [
          entry(
            input,
            field,
            `${label}: U-value as typed`,
            assembly.uValueWM2K,
            "WM2K",
            "survey; used as typed on design nights, at the wind of the hour in the year (ISO 6946 outside film)",
          ),
        ]
      : [
          entry(
            input,
            field,
            label,
            assembly.name,
            "",
            "library; balance of the layers with radiation to the sky",
          ),
        ];
  });
}

/** Leaks, floor edge, shelter and screen. Shape: input → list. */
export function houseAssumptions(input: HousePlanInput): PlanAssumption[] {
  const list = [
    entry(
      input,
      "leakage.airChanges",
      "Air changes by leaks",
      input.leakageAirChangesPerHour,
      "perHour",
      "survey or library class",
    ),
    entry(
      input,
      "floor.edgeLoss",
      "Loss along the floor edge",
      input.floorEdgeLossWMK,
      "WMK",
      "survey or library row; times the difference between inside and outside air",
    ),
    entry(input, "shelter", "Shelter from wind", input.site.shelter, "", "survey"),
    entry(
      input,
      "covers.frame",
      "Sun that passes frame and dirt",
      input.frameAndDirtFrac,
      "percent",
      "common practice, no source",
    ),
  ];
  const { screen } = input;
  if (screen)
    list.push(
      entry(
        input,
        "screen.coverage",
        "Share of the roof the screen covers",
        screen.coverageFrac,
        "percent",
        "survey",
      ),
      entry(
        input,
        "screen.screen",
        "Heat saved through a U-value behind the closed screen",
        screen.savingFrac,
        "percent",
        "library row; the layers' own balance where the roof is given as layers",
      ),
    );
  return list;
}
