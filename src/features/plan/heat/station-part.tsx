import type { PlanResult } from "../../../../server/engine/plan/plan-types.ts";
import type { Units } from "../../../lib/units.ts";

/** Where the weather comes from, how far away and how much higher that is, and what was corrected for it. */
export function StationPart({ result, units }: { result: PlanResult; units: Units }) {
  const { station } = result;
  const higher = station.heightDifferenceM;
  const height =
    Math.abs(higher) < 1
      ? "at the same height"
      : `${units.text(Math.abs(higher), "length", { decimals: 0 })} ${higher > 0 ? "higher" : "lower"} than the house`;
  return (
    <section aria-labelledby="station-heading">
      <h2 id="station-heading" className="m-0 font-sign text-lg font-bold">
        Weather from {station.name}
      </h2>
      <p className="m-0 mt-1 text-sm">
        {units.text(station.distanceKm * 1000, "distance")} away, {height}.{" "}
        {Math.abs(station.siteCorrectionK) < 0.05 ? (
          "Its design temperatures are used as they are."
        ) : (
          <>
            Design temperatures are moved by{" "}
            <b>{units.text(station.siteCorrectionK, "temperatureDifference")}</b> to fit the site.
          </>
        )}
      </p>
      {station.reasons.length > 0 ? (
        <ul className="m-0 mt-1 list-none p-0 text-sm text-ink-2">
          {station.reasons.map((reason) => (
            <li key={reason} className="border-b border-rule py-1.5">
              {reason}
            </li>
          ))}
        </ul>
      ) : null}
    </section>
  );
}
