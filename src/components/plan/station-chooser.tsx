import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import type { BuildingView, StationChoice } from "../../../server/contracts/buildings.ts";
import { api } from "../../lib/api-client.ts";
import { nearestStationsQuery } from "../../lib/stations-query.ts";
import type { Units } from "../../lib/units.ts";

interface StationChooserProps {
  building: BuildingView;
  units: Units;
}

function about(station: StationChoice, units: Units): string {
  const away = `${units.text(station.distanceKm * 1000, "distance")} away`;
  if (station.elevationM === null) return away;
  return `${away}, ${units.text(station.elevationM, "length", { decimals: 0 })} above the sea`;
}

/** Whose weather this building is worked out with, and another choice where the nearest does not fit. */
export function StationChooser({ building, units }: StationChooserProps) {
  const client = useQueryClient();
  const near = useQuery(nearestStationsQuery(building));
  const choose = useMutation({
    mutationFn: (stationId: string | null) =>
      api.patch<BuildingView>(`/api/buildings/${building.id}`, { stationId }),
    onSuccess: (changed) => {
      client.setQueryData(["buildings", building.id], changed);
      return client.invalidateQueries({ queryKey: ["buildings", building.id, "plans"] });
    },
  });
  const { station } = building;
  return (
    <section aria-label="Weather station" className="border-b border-rule py-3">
      <p className="m-0">
        <span className="block text-sm text-ink-2">
          {building.stationChosen ? "Weather, chosen by a person" : "Weather, nearest station"}
        </span>
        <b>{`${station.name}, ${station.country}`}</b>
        <span className="block text-sm">{about(station, units)}</span>
      </p>
      {station.caution ? (
        <p className="m-0 mt-2 border-l-[6px] border-straw bg-straw-tint p-2 text-sm">{station.caution}</p>
      ) : null}
      {building.can.update ? (
        <details className="mt-1">
          <summary className="flex min-h-11 items-center font-semibold text-bottle underline underline-offset-4">
            Use another station
          </summary>
          {near.isError ? (
            <p className="m-0 text-sm">The stations could not be fetched. Try again later.</p>
          ) : null}
          <ul className="m-0 list-none border-t border-rule p-0">
            {(near.data ?? []).map((row) => (
              <li key={row.id} className="border-b border-rule">
                <button
                  type="button"
                  disabled={choose.isPending}
                  aria-pressed={row.id === station.id}
                  className={`flex min-h-12 w-full flex-wrap items-center justify-between gap-x-4 px-2 py-1 text-left hover:bg-trough ${row.id === station.id ? "bg-bottle-tint font-bold" : "bg-sheet"}`}
                  onClick={() => choose.mutate(row.id)}
                >
                  <span>{`${row.name}, ${row.country}`}</span>
                  <span className="text-sm font-normal text-ink-2">{about(row, units)}</span>
                </button>
              </li>
            ))}
          </ul>
          {building.stationChosen ? (
            <button
              type="button"
              disabled={choose.isPending}
              className="mt-2 min-h-11 rounded-control border-[1.5px] border-rule-strong bg-sheet px-4 font-bold hover:bg-trough"
              onClick={() => choose.mutate(null)}
            >
              Back to the nearest
            </button>
          ) : null}
        </details>
      ) : null}
      {choose.error ? (
        <p role="alert" className="m-0 mt-1 text-sm font-semibold text-redlead">
          {choose.error.message}
        </p>
      ) : null}
    </section>
  );
}
