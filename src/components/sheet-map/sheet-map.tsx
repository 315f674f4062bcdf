import "./map.css";
import type { LatLngBoundsExpression, LatLngExpression, Map as LeafletMap } from "leaflet";
import type { ReactNode } from "react";
import { MapContainer } from "react-leaflet";
import { KeepSize } from "./keep-size.tsx";
import { MapFrame } from "./map-frame.tsx";
import { MapScale } from "./map-scale.tsx";
import { NamedContainer } from "./named-container.tsx";
import { PlaceNames } from "./place-names.tsx";
import { WorldLayer } from "./world-layer.tsx";

/** A little past the date line on both sides, so that a farm beside it does not stick to the edge. */
const WORLD: LatLngBoundsExpression = [
  [-85, -215],
  [85, 215],
];

export const DEEPEST_ZOOM = 19;

interface SheetMapProps {
  label: string;
  center: LatLngExpression;
  zoom: number;
  framed?: boolean;
  /** A small map must reach farther out to show the whole world. */
  leastZoom?: number;
  /** Hands out the map for moves asked for outside of it. */
  onMap?: (map: LeafletMap | null) => void;
  children?: ReactNode;
}

/** A sheet of map without a tile server: outlines, grid, names and scale, all from the product's own files. */
export function SheetMap({
  label,
  center,
  zoom,
  framed = true,
  leastZoom = 2,
  onMap,
  children,
}: SheetMapProps) {
  return (
    <section aria-label={label} className="relative isolate h-full min-h-0 w-full">
      <MapContainer
        ref={onMap}
        className="sheet-map h-full w-full"
        center={center}
        zoom={zoom}
        minZoom={leastZoom}
        zoomSnap={leastZoom < 2 ? 0.25 : 1}
        maxZoom={DEEPEST_ZOOM}
        maxBounds={WORLD}
        maxBoundsViscosity={1}
        zoomControl={false}
        attributionControl={false}
        zoomAnimation={false}
        markerZoomAnimation={false}
        fadeAnimation={false}
      >
        <NamedContainer label={label} />
        <KeepSize />
        <WorldLayer />
        <MapFrame framed={framed} />
        <PlaceNames />
        <MapScale mostPx={framed ? 190 : 110} className={framed ? "bottom-5 left-11" : "bottom-2 left-2"} />
        {children}
      </MapContainer>
    </section>
  );
}
