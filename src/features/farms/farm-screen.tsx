import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import { Link, useParams } from "react-router-dom";
import { Button, buttonLook } from "../../components/button.tsx";
import { PageState } from "../../components/page-state.tsx";
import { buildingsQuery, farmQuery } from "../../lib/farms-query.ts";
import { useUnits } from "../../lib/units.ts";
import { BuildingLine } from "./building-line.tsx";
import { ChangeFarm } from "./change-farm.tsx";
import { FarmPeople } from "./farm-people.tsx";
import { Sharing } from "./sharing.tsx";
import { YardPlan } from "./yard-plan.tsx";

/** One farm: its houses, its people, and what the co-operative may see. */
export function FarmScreen() {
  const { farmId = "" } = useParams();
  const farm = useQuery(farmQuery(farmId));
  const buildings = useQuery(buildingsQuery);
  const units = useUnits();
  const [changing, setChanging] = useState(false);
  if (farm.isError && farm.data === undefined) {
    return <PageState kind="error" error={farm.error} onRetry={() => void farm.refetch()} />;
  }
  if (farm.data === undefined) return <PageState kind="loading" />;
  const own = (buildings.data ?? []).filter((building) => building.farmId === farmId);
  const hidden = farm.data.buildingCount - own.length;
  return (
    <div className="mx-auto grid w-full max-w-[1180px] content-start items-start gap-x-12 gap-y-8 px-4 py-6 md:grid-cols-[3fr_2fr] md:px-8">
      <div className="flex flex-wrap items-start justify-between gap-3 md:col-span-2">
        <div>
          <h1 className="m-0 font-sign text-2xl font-extrabold">{farm.data.name}</h1>
          <p className="m-0 text-ink-2">{farm.data.place}</p>
        </div>
        {farm.data.can.update ? (
          <Button kind="plain" onClick={() => setChanging(true)}>
            Change the farm
          </Button>
        ) : null}
        {changing ? <ChangeFarm farm={farm.data} onClose={() => setChanging(false)} /> : null}
      </div>
      <div className="grid content-start gap-8">
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
              <BuildingLine
                key={building.id}
                building={building}
                units={units}
                mayChange={farm.data.can.update}
              />
            ))}
          </ul>
          {farm.data.buildingCount === 0 ? <p>No buildings yet. Stand by one and pin it.</p> : null}
          {buildings.data && hidden > 0 ? (
            <p className="text-ink-2">{`${hidden} not shared with the co-operative. Compare sites shows whether they hold.`}</p>
          ) : null}
        </section>
        <YardPlan buildings={own} units={units} />
      </div>
      <div className="grid content-start gap-8">
        <FarmPeople farm={farm.data} />
        <Sharing farm={farm.data} />
      </div>
    </div>
  );
}
