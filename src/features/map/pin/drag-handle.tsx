import type { PointerEvent, ReactNode } from "react";
import { useMap } from "react-leaflet";
import { type GroundPoint, latLng } from "../../../lib/footprint.ts";

interface DragHandleProps {
  at: GroundPoint;
  onDrag(to: GroundPoint): void;
  children: ReactNode;
}

/**
 * A grip on the map. It is for the pointer only: whoever works by keyboard has the number fields,
 * which do the same and say what they do.
 */
export function DragHandle({ at, onDrag, children }: DragHandleProps) {
  const map = useMap();
  const { x, y } = map.latLngToLayerPoint(latLng(at));
  const onPointerMove = (event: PointerEvent<HTMLDivElement>) => {
    if (!event.currentTarget.hasPointerCapture(event.pointerId)) return;
    const { lat, lng } = map.mouseEventToLatLng(event.nativeEvent);
    onDrag({ latitudeDeg: lat, longitudeDeg: lng });
  };
  return (
    <div
      aria-hidden="true"
      className="absolute flex size-11 -translate-x-1/2 -translate-y-1/2 cursor-grab touch-none items-center justify-center active:cursor-grabbing"
      style={{ left: x, top: y }}
      onPointerDown={(event) => event.currentTarget.setPointerCapture(event.pointerId)}
      onPointerMove={onPointerMove}
    >
      {children}
    </div>
  );
}
