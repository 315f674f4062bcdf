import L from "leaflet";
import { type RefObject, useEffect, useRef } from "react";

/** Keeps presses and clicks on what lies over the map from counting as presses on the map. */
export function useShield<E extends HTMLElement>(): RefObject<E | null> {
  const element = useRef<E>(null);
  useEffect(() => {
    if (element.current) L.DomEvent.disableClickPropagation(element.current);
  }, []);
  return element;
}
