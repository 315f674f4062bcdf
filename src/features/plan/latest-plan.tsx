import { useQuery } from "@tanstack/react-query";
import type { ReactNode } from "react";
import { Link } from "react-router-dom";
import type { BuildingView } from "../../../server/contracts/buildings.ts";
import type { LibraryView } from "../../../server/contracts/library.ts";
import type { PlanView } from "../../../server/contracts/plans.ts";
import { PageState } from "../../components/page-state.tsx";
import { BuildingHead } from "../../components/plan/building-head.tsx";
import { HatchSheet } from "../../components/section-drawing/hatches.tsx";
import { buildingQuery } from "../../lib/building-query.ts";
import { libraryQuery } from "../../lib/library-query.ts";
import { buildingPlansQuery, planQuery } from "../../lib/plan-queries.ts";
import { type Units, useUnits } from "../../lib/units.ts";

export interface LoadedPlan {
  building: BuildingView;
  plan: PlanView;
  library: LibraryView | undefined;
  units: Units;
}

interface LatestPlanProps {
  buildingId: string;
  children: (loaded: LoadedPlan) => ReactNode;
}

/** Loads a building with its newest plan; says what to do first where there is none. */
export function LatestPlan({ buildingId, children }: LatestPlanProps) {
  const units = useUnits();
  const building = useQuery(buildingQuery(buildingId));
  const plans = useQuery(buildingPlansQuery(buildingId));
  const library = useQuery(libraryQuery);
  const newest = plans.data?.[0];
  const plan = useQuery({ ...planQuery(newest?.id ?? ""), enabled: newest !== undefined });
  const failed = [building, plans, plan].find((query) => query.isError && query.data === undefined);
  if (failed) {
    return (
      <PageState
        kind="error"
        error={failed.error}
        onRetry={() => {
          void building.refetch();
          void plans.refetch();
        }}
      />
    );
  }
  if (!building.data || !plans.data) return <PageState kind="loading" />;
  if (!newest) return <NothingWorkedOut building={building.data} units={units} />;
  if (!plan.data) return <PageState kind="loading" />;
  return (
    <>
      <HatchSheet />
      {children({ building: building.data, plan: plan.data, library: library.data, units })}
    </>
  );
}

function NothingWorkedOut({ building, units }: { building: BuildingView; units: Units }) {
  return (
    <>
      <BuildingHead building={building} units={units} />
      <div className="max-w-[60ch] p-6">
        <h2 className="m-0 font-sign text-xl font-bold">Nothing is worked out yet</h2>
        <p>
          {building.can.plan
            ? "Answer what you know in the survey, then press “Work out the heat”. What is missing is filled with typical values and marked as such."
            : "Your adviser works the heat out once the survey is answered."}
        </p>
        {building.can.readSurvey ? (
          <Link
            to={`/buildings/${building.id}/survey`}
            className="inline-flex min-h-11 items-center rounded-control bg-bottle px-4 font-bold text-on-bottle no-underline hover:bg-bottle-deep"
          >
            Open the survey
          </Link>
        ) : null}
      </div>
    </>
  );
}
