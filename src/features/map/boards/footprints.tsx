import { Fragment } from "react";
import { Polygon, Polyline, useMap } from "react-leaflet";
import type { BuildingSummary } from "../../../../server/contracts/buildings.ts";
import { useSettledView } from "../../../components/sheet-map/use-view.ts";
import { corners, fromMiddle, latLng } from "../../../lib/footprint.ts";

/** Below this a house is smaller than a dot. */
const LEAST_ZOOM = 13;

interface FootprintsProps {
  buildings: BuildingSummary[];
  chosenId: string | null;
}

/** Ground plans to scale with the line of the ridge, once the map is close enough to show them. */
export function Footprints({ buildings, chosenId }: FootprintsProps) {
  const map = useMap();
  useSettledView();
  if (map.getZoom() < LEAST_ZOOM) return null;
  const view = map.getBounds().pad(0.2);
  return buildings
    .filter((building) => view.contains([building.latitudeDeg, building.longitudeDeg]))
    .map((building) => {
      const { lengthM, widthM, ridgeBearingDeg: bearingDeg } = building;
      const plan = corners(building, { lengthM, widthM, bearingDeg });
      const ridge = [-1, 1].map((end) => fromMiddle(building, bearingDeg, (end * lengthM) / 2, 0));
      return (
        <Fragment key={building.id}>
          <Polygon
            className={`map-footprint ${building.id === chosenId ? "chosen" : ""}`}
            key={`${building.id} ${building.id === chosenId}`}
            interactive={false}
            positions={plan.map(latLng)}
          />
          <Polyline className="map-ridge" interactive={false} positions={ridge.map(latLng)} />
        </Fragment>
      );
    });
}
