import { useCallback, useSyncExternalStore } from "react";
import { useMap } from "react-leaflet";

const MOVING = "move zoom viewreset resize";
const SETTLED = "moveend zoomend viewreset resize";

/** Draws a component anew when the view has changed. What is compared is the view itself, so no change is missed. */
function useView(events: string): void {
  const map = useMap();
  const subscribe = useCallback(
    (changed: () => void) => {
      map.on(events, changed);
      return () => {
        map.off(events, changed);
      };
    },
    [map, events],
  );
  useSyncExternalStore(subscribe, () => {
    const { lat, lng } = map.getCenter();
    const { x, y } = map.getSize();
    return `${lat} ${lng} ${map.getZoom()} ${x} ${y}`;
  });
}

export const useMovingView = () => useView(MOVING);
/** For what is too heavy to be drawn while the map moves; layers move with it anyway. */
export const useSettledView = () => useView(SETTLED);
