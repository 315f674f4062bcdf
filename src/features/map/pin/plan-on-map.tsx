import { Move } from "lucide-react";
import { useEffect } from "react";
import { Pane, Polygon, Polyline, useMap } from "react-leaflet";
import type { Position } from "../../../../server/contracts/common.ts";
import { useShield } from "../../../components/sheet-map/use-shield.ts";
import { useSettledView } from "../../../components/sheet-map/use-view.ts";
import {
  afterRidgeDrag,
  afterSideDrag,
  corners,
  type Footprint,
  fromMiddle,
  type GroundPoint,
  latLng,
  wrapLongitude,
} from "../../../lib/footprint.ts";
import { lengthText } from "../../../lib/format.ts";
import { useUnits } from "../../../lib/units.ts";
import { DragHandle } from "./drag-handle.tsx";

/** Sizes that a grip may drag a house to. */
const LEAST_M = 2;
const MOST_M = 1000;
/** Smaller than this on the screen, grips would cover the house. */
const LEAST_PX = 46;
/** Smaller than this, the sizes would run into the grips. */
const LABEL_PX = 110;
const FOLLOW_ZOOM = 10;

interface PlanOnMapProps {
  position: Position;
  footprint: Footprint | null;
  onMove(position: Position): void;
  onResize(change: Partial<Footprint>): void;
}

const size = (metres: number) => Math.min(MOST_M, Math.max(LEAST_M, metres));

/** The ground plan to scale with its ridge, and grips to move, turn and size it. */
export function PlanOnMap({ position, footprint, onMove, onResize }: PlanOnMapProps) {
  const map = useMap();
  const units = useUnits();
  const layer = useShield<HTMLDivElement>();
  useSettledView();
  useEffect(() => {
    // Typed degrees may lie on the other side of the world; the map follows the pin.
    const point = latLng(position);
    if (!map.getBounds().contains(point)) map.setView(point, Math.max(map.getZoom(), FOLLOW_ZOOM));
  }, [map, position]);
  const move = (to: GroundPoint) =>
    onMove({
      latitudeDeg: Number(to.latitudeDeg.toFixed(6)),
      longitudeDeg: wrapLongitude(Number(to.longitudeDeg.toFixed(6))),
    });
  const end = footprint ? fromMiddle(position, footprint.bearingDeg, footprint.lengthM / 2, 0) : position;
  const side = footprint ? fromMiddle(position, footprint.bearingDeg, 0, footprint.widthM / 2) : position;
  const middlePx = map.latLngToLayerPoint(latLng(position));
  const endPx = map.latLngToLayerPoint(latLng(end));
  const lengthPx = middlePx.distanceTo(endPx) * 2;
  const close = footprint !== null && lengthPx > LEAST_PX;
  const sideText = fromMiddle(position, footprint?.bearingDeg ?? 0, 0, -(footprint?.widthM ?? 0) / 2);
  const label = (at: GroundPoint, text: string) => {
    const point = map.latLngToLayerPoint(latLng(at));
    return (
      <span
        className="map-name pointer-events-none absolute -translate-x-1/2 -translate-y-1/2 text-sm font-bold whitespace-nowrap"
        style={{ left: point.x, top: point.y }}
      >
        {text}
      </span>
    );
  };
  return (
    <>
      {close ? (
        <>
          <Polygon
            className="map-footprint chosen"
            interactive={false}
            positions={corners(position, footprint).map(latLng)}
          />
          <Polyline
            className="map-ridge"
            interactive={false}
            positions={[
              latLng(end),
              latLng(fromMiddle(position, footprint.bearingDeg, -footprint.lengthM / 2, 0)),
            ]}
          />
        </>
      ) : null}
      <Pane name="grips" style={{ zIndex: 640 }}>
        <div ref={layer}>
          {close ? (
            <>
              {lengthPx > LABEL_PX ? (
                <>
                  {label(
                    fromMiddle(
                      position,
                      footprint.bearingDeg,
                      -footprint.lengthM / 2 - footprint.lengthM * 0.06 - 1,
                      0,
                    ),
                    lengthText(footprint.lengthM, units.system),
                  )}
                  {label(
                    fromMiddle(sideText, footprint.bearingDeg, 0, -footprint.widthM * 0.12 - 1),
                    lengthText(footprint.widthM, units.system),
                  )}
                </>
              ) : null}
              <DragHandle
                at={end}
                onDrag={(to) => {
                  const { lengthM, bearingDeg } = afterRidgeDrag(position, to);
                  onResize({ lengthM: size(lengthM), bearingDeg });
                }}
              >
                <span className="size-4.5 rounded-full border-2 border-ink bg-sheet" />
              </DragHandle>
              <DragHandle
                at={side}
                onDrag={(to) => onResize({ widthM: size(afterSideDrag(position, footprint.bearingDeg, to)) })}
              >
                <span className="size-4 border-2 border-ink bg-sheet" />
              </DragHandle>
            </>
          ) : null}
          <DragHandle at={position} onDrag={move}>
            <span className="flex size-8 items-center justify-center rounded-full border-2 border-ink bg-bottle text-on-bottle">
              <Move size={16} />
            </span>
          </DragHandle>
        </div>
      </Pane>
    </>
  );
}
