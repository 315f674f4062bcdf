import { useQuery } from "@tanstack/react-query";
import { Search } from "lucide-react";
import { useDeferredValue, useEffect, useRef } from "react";
import type { BuildingSummary } from "../../../../server/contracts/buildings.ts";
import type { PlaceView } from "../../../../server/contracts/climate.ts";
import { counted } from "../../../lib/format.ts";
import { placeSearchQuery } from "../../../lib/places-query.ts";
import { useUnits } from "../../../lib/units.ts";
import { countStandings, type Standing } from "./house-order.ts";
import { HouseRow } from "./house-row.tsx";
import { StandingFilter } from "./standing-filter.tsx";

interface HouseListProps {
  /** Every building, for the counts. */
  all: BuildingSummary[];
  /** Those that fit text and standing, in the order shown. */
  found: BuildingSummary[];
  text: string;
  standing: Standing;
  chosenId: string | null;
  onText(text: string): void;
  onStanding(standing: Standing): void;
  onChoose(buildingId: string): void;
  onPlace(place: PlaceView): void;
}

const LEAST_LETTERS = 3;

function Places({ text, onPlace }: { text: string; onPlace(place: PlaceView): void }) {
  const wanted = useDeferredValue(text.trim());
  const { data: places = [] } = useQuery({
    ...placeSearchQuery(wanted),
    enabled: wanted.length >= LEAST_LETTERS,
  });
  if (wanted.length < LEAST_LETTERS || places.length === 0) return null;
  return (
    <section aria-label="Places of that name" className="border-b border-rule">
      <h2 className="m-0 bg-trough px-4 py-1 font-sans text-sm font-bold">Places</h2>
      <ul className="m-0 list-none p-0">
        {places.slice(0, 4).map((place) => (
          <li key={`${place.latitudeDeg} ${place.longitudeDeg}`}>
            <button
              type="button"
              className="flex min-h-11 w-full items-center justify-between px-4 text-left hover:bg-trough"
              onClick={() => onPlace(place)}
            >
              {place.name}
              <span className="text-sm text-ink-2">{place.country}</span>
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}

/** Search, filter and the houses, most urgent first. */
export function HouseList(props: HouseListProps) {
  const { all, found, text, standing, chosenId } = props;
  const units = useUnits();
  const list = useRef<HTMLUListElement>(null);
  useEffect(() => {
    if (chosenId === null) return;
    list.current
      ?.querySelector(`[data-house="${CSS.escape(chosenId)}"]`)
      ?.scrollIntoView?.({ block: "nearest" });
  }, [chosenId]);
  return (
    <div className="flex min-h-0 flex-1 flex-col">
      <div className="grid gap-3 border-b border-ink p-4 max-md:pt-0">
        <label className="flex min-h-11.5 items-center gap-3 rounded-control border-[1.5px] border-rule-strong bg-sheet px-3 focus-within:outline-3 focus-within:outline-offset-2 focus-within:outline-focus">
          <Search size={20} aria-hidden="true" className="flex-none" />
          <span className="sr-only">Find a farm, building or place</span>
          <input
            type="search"
            value={text}
            placeholder="Find a farm, building or place"
            onChange={(event) => props.onText(event.target.value)}
            className="w-full min-w-0 bg-transparent outline-none"
          />
        </label>
        <StandingFilter value={standing} counts={countStandings(all)} onChange={props.onStanding} />
        <p role="status" className="sr-only">
          {`${counted(found.length, "building")} shown`}
        </p>
      </div>
      <div className="min-h-0 flex-1 overflow-y-auto">
        <Places text={text} onPlace={props.onPlace} />
        <ul ref={list} className="m-0 list-none p-0" aria-label="Buildings">
          {found.map((building) => (
            <HouseRow
              key={building.id}
              building={building}
              units={units}
              chosen={building.id === chosenId}
              onChoose={() => props.onChoose(building.id)}
            />
          ))}
        </ul>
        {found.length === 0 && all.length > 0 ? (
          <p className="px-4">No building fits. Clear the search, or show all.</p>
        ) : null}
      </div>
    </div>
  );
}
