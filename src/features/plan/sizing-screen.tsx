import { useParams } from "react-router-dom";
import { LatestPlan } from "./latest-plan.tsx";
import { SizingPage } from "./sizing/sizing-page.tsx";

/** Need against installed heat, and the choice of heaters, from the latest plan. */
export function SizingScreen() {
  const { buildingId = "" } = useParams();
  return <LatestPlan buildingId={buildingId}>{(loaded) => <SizingPage {...loaded} />}</LatestPlan>;
}
