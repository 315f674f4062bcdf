import { useEffect } from "react";
import { useMap } from "react-leaflet";

/** A sheet whose size changes (a turned phone, a resized window) must be measured again. */
export function KeepSize() {
  const map = useMap();
  useEffect(() => {
    const observer = new ResizeObserver(() => map.invalidateSize({ animate: false }));
    observer.observe(map.getContainer());
    return () => observer.disconnect();
  }, [map]);
  return null;
}
