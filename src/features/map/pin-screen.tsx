import { useQuery } from "@tanstack/react-query";
import { PageState } from "../../components/page-state.tsx";
import { buildingsQuery, farmsQuery } from "../../lib/farms-query.ts";
import { meQuery } from "../../lib/me-query.ts";
import { PinPage } from "./pin/pin-page.tsx";

/** Puts a new building on the map. */
export function PinScreen() {
  const me = useQuery(meQuery);
  const farms = useQuery(farmsQuery);
  const buildings = useQuery(buildingsQuery);
  if (farms.isError && farms.data === undefined) {
    return <PageState kind="error" error={farms.error} onRetry={() => void farms.refetch()} />;
  }
  if (farms.data === undefined || me.data === undefined) return <PageState kind="loading" />;
  const own = farms.data.filter((farm) => farm.can.addBuilding);
  const mayAddFarm = me.data.activeRole === "advisor";
  if (own.length === 0 && !mayAddFarm) {
    return (
      <PageState
        kind="empty"
        title="No farm to pin a building on"
        words="Advisers and farmers pin buildings. Ask the adviser of the co-operative to add the farm first."
      />
    );
  }
  return (
    <PinPage
      farms={own}
      buildings={buildings.data ?? []}
      cooperativeId={mayAddFarm ? me.data.activeCooperativeId : null}
      system={me.data.units}
    />
  );
}
