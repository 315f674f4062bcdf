import { useQuery } from "@tanstack/react-query";
import type { Position } from "../../../../server/contracts/common.ts";
import { nearestStationsQuery, stationQuery } from "../../../lib/stations-query.ts";
import { useUnits } from "../../../lib/units.ts";

/** Whose weather the plan will be worked out with, before anything is kept. */
export function StationCard({ position }: { position: Position | null }) {
  const units = useUnits();
  const near = useQuery(nearestStationsQuery(position));
  const best = near.data?.[0];
  const station = useQuery(stationQuery(best?.id));
  if (position === null) {
    return (
      <p className="m-0 text-sm text-ink-2">The nearest weather station shows here once the place is set.</p>
    );
  }
  if (near.isError) {
    return (
      <p role="alert" className="m-0 border-l-[6px] border-straw bg-sheet p-3 text-sm">
        The weather stations could not be fetched. The building can be kept all the same; the nearest one is
        chosen then.
      </p>
    );
  }
  if (best === undefined) return <p className="m-0 text-sm text-ink-2">Looking for the nearest station</p>;
  const known = (tempC: number | null | undefined) =>
    tempC === null || tempC === undefined ? null : units.temperature(tempC);
  const facts = [
    { name: "Away", value: units.text(best.distanceKm * 1000, "distance") },
    {
      name: "Height",
      value: best.elevationM === null ? "not known" : units.text(best.elevationM, "length", { decimals: 0 }),
    },
    { name: "Ordinary cold night", value: known(station.data?.designColdest996C) },
    { name: "Coldest of a mean year", value: known(station.data?.meanYearlyColdestC) },
  ];
  return (
    <div className="border-[1.5px] border-rule-strong bg-sheet p-3">
      <p className="m-0 text-sm text-ink-2">Weather from</p>
      <p className="m-0 font-bold">{`${best.name}, ${best.country}`}</p>
      <dl className="m-0 mt-2 grid grid-cols-2 gap-x-4 gap-y-1">
        {facts
          .filter((fact) => fact.value !== null)
          .map((fact) => (
            <div key={fact.name} className="flex flex-col-reverse">
              <dt className="text-xs text-ink-2">{fact.name}</dt>
              <dd className="m-0 font-semibold">{fact.value}</dd>
            </div>
          ))}
      </dl>
      {best.caution ? (
        <p className="m-0 mt-2 border-l-[6px] border-straw bg-straw-tint p-2 text-sm">{best.caution}</p>
      ) : null}
      <p className="m-0 mt-2 text-xs text-ink-2">
        The survey asks how high the site lies, and the figures are corrected for the difference.
      </p>
    </div>
  );
}
