import { useParams } from "react-router-dom";
import { HeatPage } from "./heat/heat-page.tsx";
import { LatestPlan } from "./latest-plan.tsx";

/** The heat balance of one building, from its latest plan. */
export function HeatScreen() {
  const { buildingId = "" } = useParams();
  return <LatestPlan buildingId={buildingId}>{(loaded) => <HeatPage {...loaded} />}</LatestPlan>;
}
