import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import { Navigate, useNavigate } from "react-router-dom";
import { Button } from "../../components/button.tsx";
import { NewFarmForm } from "../../components/new-farm-form.tsx";
import { PageState } from "../../components/page-state.tsx";
import { buildingsQuery, farmsQuery } from "../../lib/farms-query.ts";
import { counted } from "../../lib/format.ts";
import { meQuery } from "../../lib/me-query.ts";
import { useUnits } from "../../lib/units.ts";
import { FarmLine } from "./farm-line.tsx";

/** Farms the person may see. A farmer with one farm goes straight to it. */
export function FarmsScreen() {
  const navigate = useNavigate();
  const { data: me } = useQuery(meQuery);
  const farms = useQuery(farmsQuery);
  const buildings = useQuery(buildingsQuery);
  const units = useUnits();
  const [adding, setAdding] = useState(false);
  if (farms.isError && farms.data === undefined) {
    return <PageState kind="error" error={farms.error} onRetry={() => void farms.refetch()} />;
  }
  if (farms.data === undefined || me === undefined) return <PageState kind="loading" />;
  const [only] = farms.data;
  if (me.activeRole === "farmer" && farms.data.length === 1 && only !== undefined) {
    return <Navigate to={`/farms/${only.id}`} replace />;
  }
  const mayAdd = me.activeRole === "advisor" && me.activeCooperativeId !== null;
  return (
    <div className="mx-auto w-full max-w-[1180px] px-4 py-6 md:px-8">
      <div className="flex flex-wrap items-center justify-between gap-4 border-b-2 border-ink pb-3">
        <h1 className="m-0 font-sign text-2xl font-extrabold">
          {farms.data.length === 0 ? "No farms yet" : counted(farms.data.length, "farm")}
        </h1>
        {mayAdd && !adding ? <Button onClick={() => setAdding(true)}>Add a farm</Button> : null}
      </div>
      {adding && me.activeCooperativeId !== null ? (
        <div className="mt-5">
          <NewFarmForm
            cooperativeId={me.activeCooperativeId}
            onCreated={(farm) => navigate(`/farms/${farm.id}`)}
            onCancel={() => setAdding(false)}
          />
        </div>
      ) : null}
      {farms.data.length === 0 && !adding ? (
        <p className="max-w-[60ch]">
          {mayAdd
            ? "Add the first farm, then pin its buildings on the map."
            : "Farms show here once an adviser of the co-operative has added them."}
        </p>
      ) : null}
      <ul className="m-0 list-none p-0">
        {farms.data.map((farm) => (
          <FarmLine
            key={farm.id}
            farm={farm}
            buildings={(buildings.data ?? []).filter((building) => building.farmId === farm.id)}
            units={units}
          />
        ))}
      </ul>
    </div>
  );
}
