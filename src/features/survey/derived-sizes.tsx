import type { Survey } from "../../../server/contracts/survey.ts";
import type { Units } from "../../lib/units.ts";
import { derivedSizes } from "./derive-sizes.ts";

/** What follows from the typed sizes, or why nothing follows. */
export function DerivedSizes({ survey, units }: { survey: Survey; units: Units }) {
  const derived = derivedSizes(survey, units.system);
  if (derived.problem !== null) {
    return (
      <p
        role="alert"
        className="m-0 self-start border-[1.5px] border-redlead bg-redlead-tint px-3 py-2 text-sm font-semibold"
      >
        {derived.problem}
      </p>
    );
  }
  const { sizes } = derived;
  const rows = [
    { name: "Floor", value: units.text(sizes.floorAreaM2, "area") },
    { name: "Cover, with ends", value: units.text(sizes.coverAreaM2, "area") },
    { name: "Air inside", value: units.text(sizes.volumeM3, "volume") },
    {
      name: `Cover for each ${units.symbol("area")} of floor`,
      value: units.text(sizes.coverAreaM2 / sizes.floorAreaM2, "share", { unit: "share", decimals: 2 }),
    },
  ];
  return (
    <section aria-label="What follows from these sizes">
      <h3 className="m-0 font-sign text-base font-bold">Follows from these</h3>
      <dl className="m-0 text-sm">
        {rows.map((row) => (
          <div key={row.name} className="flex justify-between gap-3 border-b border-rule py-2">
            <dt>{row.name}</dt>
            <dd className="m-0 font-bold">{row.value}</dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
