import { useMapEvents } from "react-leaflet";
import { type GroundPoint, wrapLongitude } from "../../../lib/footprint.ts";

/** Where the map was clicked, to the decimal a click can mean. */
export function MapClicks({ onClick }: { onClick(point: GroundPoint): void }) {
  useMapEvents({
    click: ({ latlng }) =>
      onClick({
        latitudeDeg: Number(latlng.lat.toFixed(6)),
        longitudeDeg: wrapLongitude(Number(latlng.lng.toFixed(6))),
      }),
  });
  return null;
}
