import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import type { PlaceView } from "../../server/contracts/climate.ts";
import { placeSearchQuery } from "../lib/places-query.ts";
import { TextField } from "./text-field.tsx";

interface PlaceSearchProps {
  label: string;
  hint?: string;
  onPick(place: PlaceView): void;
}

/** A field that finds towns in the bundled list; each find is a button. */
export function PlaceSearch({ label, hint, onPick }: PlaceSearchProps) {
  const [text, setText] = useState("");
  const places = useQuery(placeSearchQuery(text));
  const found = text.trim().length >= 2 ? (places.data ?? []) : [];
  return (
    <div>
      <TextField label={label} hint={hint} value={text} onValue={setText} autoComplete="off" />
      <p role="status" className="sr-only">
        {text.trim().length >= 2 && places.data ? `${found.length} towns found` : ""}
      </p>
      {found.length > 0 ? (
        <ul className="m-0 list-none border-x border-b border-rule p-0">
          {found.map((place) => (
            <li key={`${place.name} ${place.latitudeDeg} ${place.longitudeDeg}`}>
              <button
                type="button"
                className="flex min-h-11 w-full items-center justify-between gap-4 border-t border-rule bg-sheet px-3 text-left hover:bg-trough"
                onClick={() => {
                  onPick(place);
                  setText("");
                }}
              >
                <span>{place.name}</span>
                <span className="text-sm text-ink-2">{place.country}</span>
              </button>
            </li>
          ))}
        </ul>
      ) : null}
    </div>
  );
}
