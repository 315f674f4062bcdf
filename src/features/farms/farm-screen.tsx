import { useQuery } from "@tanstack/react-query";
import { Link, useParams } from "react-router-dom";
import type { BuildingSummary } from "../../../server/contracts/buildings.ts";
import type { FarmView } from "../../../server/contracts/farms.ts";
import { BuildingOutline } from "../../components/building-outline.tsx";
import { buttonLook } from "../../components/button.tsx";
import { PageState } from "../../components/page-state.tsx";
import { verdictKind, verdictWords } from "../../components/plan/verdict.ts";
import { VerdictMark } from "../../components/plan/verdict-mark.tsx";
import { buildingsQuery, farmQuery } from "../../lib/farms-query.ts";
import { useUnits } from "../../lib/units.ts";
import { useChangeFarm } from "./api.ts";
import { FarmPeople } from "./farm-people.tsx";

function BuildingLine({ building }: { building: BuildingSummary }) {
  const units = useUnits();
  const kind = verdictKind(building.plan);
  return (
    <li className="border-b border-rule">
      <Link
        to={`/buildings/${building.id}/${building.plan ? "sizing" : "survey"}`}
        className="flex min-h-16 items-center gap-4 bg-sheet px-3 py-2 text-ink no-underline hover:bg-trough"
      >
        <BuildingOutline
          shapeType={building.shapeType}
          outline={building.outline}
          size={{ width: 56, height: 32 }}
          status={kind === "notApplicable" ? "holds" : kind}
        />
        <span className="min-w-0 flex-1">
          <b className="block">{building.name}</b>
          <span className="block text-sm text-ink-2">
            {`${units.text(building.floorAreaM2, "area")}, ${building.answered} of ${building.questions} answered`}
          </span>
        </span>
        <span className="flex items-center gap-2 text-right">
          <VerdictMark kind={kind} />
          {verdictWords(building.plan, units)}
        </span>
      </Link>
    </li>
  );
}

function Sharing({ farm }: { farm: FarmView }) {
  const change = useChangeFarm(farm.id);
  return (
    <section aria-labelledby="farm-sharing">
      <h2 id="farm-sharing" className="m-0 border-b-2 border-ink pb-1 font-sign text-lg font-bold">
        What the co-operative sees
      </h2>
      <p>
        The manager always sees whether a house holds on the coldest night. Survey and plan only if the farmer
        agrees.
      </p>
      {farm.can.share ? (
        <label className="flex min-h-11 items-center gap-3">
          <input
            type="checkbox"
            className="size-6 accent-bottle"
            checked={farm.sharedWithManager}
            disabled={change.isPending}
            onChange={(event) => change.mutate({ sharedWithManager: event.target.checked })}
          />
          The manager may open survey and plan
        </label>
      ) : (
        <p className="font-semibold">
          {farm.sharedWithManager
            ? "The farmer shares survey and plan."
            : "The farmer shares the result only."}
        </p>
      )}
      {change.error ? (
        <p role="alert" className="text-sm font-semibold text-redlead">
          {change.error.message}
        </p>
      ) : null}
    </section>
  );
}

/** One farm: its houses, its people, and what the co-operative may see. */
export function FarmScreen() {
  const { farmId = "" } = useParams();
  const farm = useQuery(farmQuery(farmId));
  const buildings = useQuery(buildingsQuery);
  if (farm.isError && farm.data === undefined) {
    return <PageState kind="error" error={farm.error} onRetry={() => void farm.refetch()} />;
  }
  if (farm.data === undefined) return <PageState kind="loading" />;
  const own = (buildings.data ?? []).filter((building) => building.farmId === farmId);
  const hidden = farm.data.buildingCount - own.length;
  return (
    <div className="mx-auto grid w-full max-w-[1180px] gap-x-12 gap-y-8 px-4 py-6 md:grid-cols-[3fr_2fr] md:px-8">
      <div className="md:col-span-2">
        <h1 className="m-0 font-sign text-2xl font-extrabold">{farm.data.name}</h1>
        <p className="m-0 text-ink-2">{farm.data.place}</p>
      </div>
      <section aria-labelledby="farm-buildings">
        <div className="flex flex-wrap items-center justify-between gap-3 border-b-2 border-ink pb-2">
          <h2 id="farm-buildings" className="m-0 font-sign text-lg font-bold">
            Buildings
          </h2>
          {farm.data.can.addBuilding ? (
            <Link to={`/map/new?farm=${farmId}`} className={buttonLook("quiet")}>
              Pin a building
            </Link>
          ) : null}
        </div>
        <ul className="m-0 list-none p-0">
          {own.map((building) => (
            <BuildingLine key={building.id} building={building} />
          ))}
        </ul>
        {farm.data.buildingCount === 0 ? <p>No buildings yet. Stand by one and pin it.</p> : null}
        {buildings.data && hidden > 0 ? (
          <p className="text-ink-2">{`${hidden} not shared with the co-operative. Compare sites shows whether they hold.`}</p>
        ) : null}
      </section>
      <div className="grid content-start gap-8">
        <FarmPeople farm={farm.data} />
        <Sharing farm={farm.data} />
      </div>
    </div>
  );
}
