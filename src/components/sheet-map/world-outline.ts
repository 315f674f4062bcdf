import { queryOptions } from "@tanstack/react-query";
import type { FeatureCollection, MultiLineString, Position } from "geojson";
import { feature, mesh } from "topojson-client";
import type { GeometryCollection, Topology } from "topojson-specification";
import fineUrl from "world-atlas/countries-50m.json?url";
import coarseUrl from "world-atlas/countries-110m.json?url";
import { drawnOnBothSides } from "./date-line.ts";

type Atlas = Topology<{ countries: GeometryCollection; land: GeometryCollection }>;

export interface WorldOutline {
  land: FeatureCollection;
  coast: MultiLineString;
  borders: MultiLineString;
}

/** The atlas closes its polygons along the date line and the pole; nobody has seen a shore there. */
const onSeam = ([longitude = 0, latitude = 0]: Position) => Math.abs(longitude) > 179.99 || latitude < -89.9;
const isSeam = (from: Position, to: Position) =>
  (onSeam(from) && onSeam(to)) || Math.abs((from[0] ?? 0) - (to[0] ?? 0)) > 180;

function withoutSeams(lines: MultiLineString): MultiLineString {
  const kept: Position[][] = [];
  for (const line of lines.coordinates) {
    let run: Position[] = [];
    line.forEach((point, index) => {
      const before = line[index - 1];
      if (before !== undefined && isSeam(before, point)) {
        if (run.length > 1) kept.push(run);
        run = [];
      }
      run.push(point);
    });
    if (run.length > 1) kept.push(run);
  }
  return { type: "MultiLineString", coordinates: kept };
}

async function loadOutline(url: string, signal: AbortSignal): Promise<WorldOutline> {
  const response = await fetch(url, { signal });
  if (!response.ok) throw new Error(`the outlines of the map answered ${response.status}`);
  const atlas = (await response.json()) as Atlas;
  const { countries, land } = atlas.objects;
  return {
    land: drawnOnBothSides(feature(atlas, land)),
    coast: withoutSeams(mesh(atlas, countries, (a, b) => a === b)),
    borders: mesh(atlas, countries, (a, b) => a !== b),
  };
}

export type OutlineDetail = "coarse" | "fine";

/**
 * Outlines of land and countries, made of Natural Earth's sheets and bundled with the pages.
 * Whole continents are drawn from the 1:110 million sheet, a sixth of the size of the 1:50 million one:
 * it is there sooner where the signal is weak.
 */
export function worldOutlineQuery(detail: OutlineDetail) {
  return queryOptions({
    queryKey: ["world-outline", detail],
    queryFn: ({ signal }) => loadOutline(detail === "coarse" ? coarseUrl : fineUrl, signal),
    staleTime: Number.POSITIVE_INFINITY,
    gcTime: Number.POSITIVE_INFINITY,
  });
}
