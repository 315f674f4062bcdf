import { useQuery } from "@tanstack/react-query";
import type { Map as LeafletMap } from "leaflet";
import { MapPinPlus } from "lucide-react";
import { useMemo, useState } from "react";
import { Link } from "react-router-dom";
import { buttonLook } from "../../components/button.tsx";
import { PageState } from "../../components/page-state.tsx";
import { SheetMap } from "../../components/sheet-map/sheet-map.tsx";
import { buildingsQuery, farmsQuery } from "../../lib/farms-query.ts";
import { PHONE, useMedia } from "../../lib/use-media.ts";
import { BoardsLayer } from "./boards/boards-layer.tsx";
import { Footprints } from "./boards/footprints.tsx";
import { HouseList } from "./list/house-list.tsx";
import { findHouses } from "./list/house-order.ts";
import { MapControls } from "./map-controls.tsx";
import { MapEmpty } from "./map-empty.tsx";
import { MapLegend } from "./map-legend.tsx";
import { boundsOf, FIT, MapMoves } from "./map-moves.tsx";
import { PhoneSheet } from "./phone-sheet.tsx";
import { useMapAddress } from "./use-map-address.ts";

const EVERYWHERE: [number, number] = [25, 10];
const PLACE_ZOOM = 11;

/** Where the houses stand and which will not hold: a list with search and filters beside the sheet of map. */
export function MapScreen() {
  const buildings = useQuery(buildingsQuery);
  const farms = useQuery(farmsQuery);
  const phone = useMedia(PHONE);
  const [map, setMap] = useState<LeafletMap | null>(null);
  const { text, standing, chosenId, place, set } = useMapAddress();
  const [first] = useState(place);
  const all = useMemo(() => buildings.data ?? [], [buildings.data]);
  const found = useMemo(() => findHouses(all, { text, standing }), [all, text, standing]);
  if (buildings.isError && buildings.data === undefined) {
    return <PageState kind="error" error={buildings.error} onRetry={() => void buildings.refetch()} />;
  }
  if (buildings.data === undefined) return <PageState kind="loading" words="Fetching the buildings" />;
  const choose = (id: string) => set({ house: id === chosenId ? null : id });
  const mayPin =
    farms.data === undefined || farms.data.length === 0 || farms.data.some((farm) => farm.can.addBuilding);
  const pin = mayPin ? (
    <Link to="/map/new" className={buttonLook()}>
      <MapPinPlus size={20} aria-hidden="true" />
      Pin a building
    </Link>
  ) : null;
  return (
    <div className="relative min-h-130 flex-1">
      <h1 className="sr-only">Map of the buildings</h1>
      <div className="absolute inset-0 max-md:flex max-md:flex-col md:grid md:grid-cols-[minmax(360px,424px)_minmax(0,1fr)]">
        <PhoneSheet label="Buildings">
          {all.length === 0 ? (
            <MapEmpty hasFarms={(farms.data ?? []).length > 0} />
          ) : (
            <HouseList
              all={all}
              found={found}
              text={text}
              standing={standing}
              chosenId={chosenId}
              onText={(q) => set({ q })}
              onStanding={(show) => set({ show: show === "all" ? null : show })}
              onChoose={choose}
              onPlace={(spot) => map?.setView([spot.latitudeDeg, spot.longitudeDeg], PLACE_ZOOM)}
            />
          )}
        </PhoneSheet>
        <SheetMap
          label="Map"
          center={first ? [first.latitudeDeg, first.longitudeDeg] : EVERYWHERE}
          zoom={first?.zoom ?? 2}
          framed={!phone}
          onMap={setMap}
        >
          <Footprints buildings={found} chosenId={chosenId} />
          <BoardsLayer buildings={found} chosenId={chosenId} onChoose={choose} />
          <MapMoves
            buildings={found}
            chosenId={chosenId}
            fitFirst={first === null}
            onSettled={(at) => set({ at })}
          />
          {all.length > 0 ? <MapLegend /> : null}
          <MapControls
            className={phone ? "top-2 right-2" : "top-11 right-6"}
            onAll={
              all.length === 0
                ? undefined
                : () => {
                    const bounds = boundsOf(all);
                    if (bounds) map?.fitBounds(bounds, FIT);
                  }
            }
          >
            {pin}
          </MapControls>
        </SheetMap>
      </div>
    </div>
  );
}
