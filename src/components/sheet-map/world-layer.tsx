import { useQuery } from "@tanstack/react-query";
import L from "leaflet";
import { useEffect } from "react";
import { useMap } from "react-leaflet";
import { useSettledView } from "./use-view.ts";
import { worldOutlineQuery } from "./world-outline.ts";

/** Nearer than this the coarse outlines show their corners. */
const FINE_ZOOM = 4;

/** Land, shores and borders. Drawn as vectors with classes, so that day, evening and paper colour them. */
export function WorldLayer() {
  const map = useMap();
  useSettledView();
  const close = map.getZoom() >= FINE_ZOOM;
  const coarse = useQuery(worldOutlineQuery("coarse"));
  const fine = useQuery({ ...worldOutlineQuery("fine"), enabled: close });
  // Once fetched, the finer outlines serve every view; until then the coarse ones stand in.
  const data = fine.data ?? coarse.data;
  const isError = data === undefined && (coarse.isError || fine.isError);
  useEffect(() => {
    if (data === undefined) return;
    const renderer = L.svg({ pane: "tilePane", padding: 0.4 });
    const look = (className: string) => ({
      interactive: false,
      style: () => ({ className, renderer, smoothFactor: 1 }),
    });
    const layers = [
      L.geoJSON(data.land, look("map-land")),
      L.geoJSON(data.coast, look("map-coast")),
      L.geoJSON(data.borders, look("map-border")),
    ];
    for (const layer of layers) layer.addTo(map);
    return () => {
      for (const layer of layers) layer.remove();
      renderer.remove();
    };
  }, [data, map]);
  if (!isError) return null;
  return (
    <p
      role="status"
      className="absolute bottom-24 left-10 z-[800] m-0 border-l-[6px] border-straw bg-sheet p-3 text-sm"
    >
      The outlines of the land did not arrive. Boards and grid are right without them.
    </p>
  );
}
