import { useEffect } from "react";
import { useMap } from "react-leaflet";

/** The map takes the keyboard focus, so it must say what it is and what the keys do. */
export function NamedContainer({ label }: { label: string }) {
  const map = useMap();
  useEffect(() => {
    const container = map.getContainer();
    container.setAttribute("role", "group");
    container.setAttribute("aria-label", `${label}: arrow keys move it, plus and minus change the distance`);
  }, [label, map]);
  return null;
}
