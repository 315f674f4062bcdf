import { useQuery } from "@tanstack/react-query";
import { Pane, Polyline, useMap } from "react-leaflet";
import type { Position } from "../../../../server/contracts/common.ts";
import { useSettledView } from "../../../components/sheet-map/use-view.ts";
import { latLng } from "../../../lib/footprint.ts";
import { nearestStationsQuery, stationQuery } from "../../../lib/stations-query.ts";

/** The weather station whose record will be used, and the way to it. */
export function StationLine({ position }: { position: Position }) {
  const map = useMap();
  useSettledView();
  const near = useQuery(nearestStationsQuery(position));
  const { data: station } = useQuery(stationQuery(near.data?.[0]?.id));
  if (station === undefined) return null;
  const { x, y } = map.latLngToLayerPoint(latLng(station));
  return (
    <>
      <Polyline className="map-ridge" interactive={false} positions={[latLng(position), latLng(station)]} />
      <Pane name="station" style={{ zIndex: 610, pointerEvents: "none" }}>
        <span
          className="map-name absolute flex -translate-y-1/2 items-center gap-2 text-sm font-semibold whitespace-nowrap"
          style={{ left: x - 9, top: y }}
        >
          <svg width="18" height="18" aria-hidden="true">
            <path
              d="M9 2 16.500 15.500H1.500Z"
              fill="var(--color-sheet)"
              stroke="var(--color-ink)"
              strokeWidth="1.800"
            />
          </svg>
          {`Weather station ${station.name}`}
        </span>
      </Pane>
    </>
  );
}
