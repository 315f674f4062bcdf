import { useCallback } from "react";
import { useSearchParams } from "react-router-dom";
import { type Standing, standings } from "./list/house-order.ts";

export interface MapPlace {
  latitudeDeg: number;
  longitudeDeg: number;
  zoom: number;
}

function readPlace(text: string | null): MapPlace | null {
  const [latitudeDeg, longitudeDeg, zoom] = (text ?? "").split(",").map(Number);
  const valid =
    latitudeDeg !== undefined &&
    longitudeDeg !== undefined &&
    zoom !== undefined &&
    Math.abs(latitudeDeg) <= 85 &&
    Math.abs(longitudeDeg) <= 180 &&
    zoom >= 2 &&
    zoom <= 19;
  return valid ? { latitudeDeg, longitudeDeg, zoom } : null;
}

/** What is searched, shown and chosen lives in the address, so that a view can be sent to somebody. */
export function useMapAddress() {
  const [search, setSearch] = useSearchParams();
  const set = useCallback(
    (changes: Record<string, string | null>) =>
      setSearch(
        (before) => {
          for (const [name, value] of Object.entries(changes)) {
            if (value === null || value === "") before.delete(name);
            else before.set(name, value);
          }
          return before;
        },
        { replace: true },
      ),
    [setSearch],
  );
  return {
    text: search.get("q") ?? "",
    standing: standings.find((entry) => entry === search.get("show")) ?? ("all" as Standing),
    chosenId: search.get("house"),
    place: readPlace(search.get("at")),
    set,
  };
}
