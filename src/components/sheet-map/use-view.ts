import { useCallback, useRef, useSyncExternalStore } from "react";
import { useMap } from "react-leaflet";

const MOVING = "move zoom viewreset resize";
const SETTLED = "moveend zoomend viewreset resize";

/** Counts the changes of the view, so that a component draws anew while the map moves or once it has settled. */
function useViewCount(events: string): number {
  const map = useMap();
  const count = useRef(0);
  const subscribe = useCallback(
    (changed: () => void) => {
      const moved = () => {
        count.current += 1;
        changed();
      };
      map.on(events, moved);
      return () => {
        map.off(events, moved);
      };
    },
    [map, events],
  );
  return useSyncExternalStore(subscribe, () => count.current);
}

export const useMovingView = () => useViewCount(MOVING);
export const useSettledView = () => useViewCount(SETTLED);
