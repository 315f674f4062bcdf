import L from "leaflet";
import { Pane, useMap } from "react-leaflet";
import type { BuildingSummary } from "../../../../server/contracts/buildings.ts";
import { type VerdictKind, verdictKind, verdictWords } from "../../../components/plan/verdict.ts";
import { type BoardGroup, foldBoards } from "../../../components/sheet-map/fold-boards.ts";
import { useShield } from "../../../components/sheet-map/use-shield.ts";
import { useSettledView } from "../../../components/sheet-map/use-view.ts";
import { counted } from "../../../lib/format.ts";
import { useUnits } from "../../../lib/units.ts";
import { urgency } from "../list/house-order.ts";
import { Board } from "./board.tsx";

/** From here on every board stands alone: houses of one yard are told apart. */
const UNFOLDED_ZOOM = 17;
const CLOSEST_ZOOM = 17;
/** From here on there is room to write farms and houses beside their boards. */
const NAMED_ZOOM = 11;
const HOUSE_NAMED_ZOOM = 14;

interface BoardsLayerProps {
  buildings: BuildingSummary[];
  chosenId: string | null;
  onChoose(buildingId: string): void;
}

/** The farm's name where a folded board stands for one farm. */
function farmOf(items: BuildingSummary[]): string | null {
  const names = new Set(items.map((item) => item.farmName));
  return names.size === 1 ? (items[0]?.farmName ?? null) : null;
}

function worstKind(items: BuildingSummary[]): VerdictKind {
  const [worst] = [...items].sort((a, b) => urgency(a) - urgency(b));
  return worst === undefined ? "holds" : verdictKind(worst.plan);
}

/** The boards of the buildings in view. Those that would cover each other fold into one with a count. */
export function BoardsLayer({ buildings, chosenId, onChoose }: BoardsLayerProps) {
  const map = useMap();
  const units = useUnits();
  const layer = useShield<HTMLDivElement>();
  useSettledView();
  const zoom = map.getZoom();
  const chosen = buildings.filter((building) => building.id === chosenId);
  const others = buildings.filter((building) => building.id !== chosenId);
  const place = (building: BuildingSummary) => {
    const point = map.latLngToLayerPoint([building.latitudeDeg, building.longitudeDeg]);
    return { item: building, xPx: point.x, yPx: point.y };
  };
  const groups = [
    ...foldBoards(others.map(place), zoom >= UNFOLDED_ZOOM ? 0 : undefined),
    ...chosen.map(place).map(({ item, xPx, yPx }) => ({ items: [item], xPx, yPx })),
  ].sort((a, b) => a.yPx - b.yPx || a.xPx - b.xPx);
  const closer = (group: BoardGroup<BuildingSummary>) => {
    const bounds = L.latLngBounds(group.items.map((item) => [item.latitudeDeg, item.longitudeDeg]));
    map.fitBounds(bounds, { padding: [90, 90], maxZoom: CLOSEST_ZOOM });
  };
  return (
    <Pane name="boards" style={{ zIndex: 620 }}>
      <div ref={layer}>
        {groups.map((group) => {
          const [first] = group.items;
          if (first === undefined) return null;
          const single = group.items.length === 1;
          const kind = worstKind(group.items);
          const short = group.items.filter((item) => verdictKind(item.plan) === "short").length;
          const isChosen = single && first.id === chosenId;
          const name = single ? first.name : farmOf(group.items);
          const named = isChosen || zoom >= (single ? HOUSE_NAMED_ZOOM : NAMED_ZOOM);
          return (
            <button
              key={group.items.map((item) => item.id).join(" ")}
              type="button"
              aria-pressed={single ? isChosen : undefined}
              aria-label={
                single
                  ? `${first.name}, ${first.farmName}: ${verdictWords(first.plan, units)}`
                  : `${counted(group.items.length, "building")}, ${short} short of heat. Show closer`
              }
              className="group absolute -translate-x-1/2 -translate-y-full bg-transparent p-0 hover:z-10 focus-visible:z-10"
              style={{ left: group.xPx, top: group.yPx, zIndex: isChosen ? 5 : undefined }}
              onClick={() => (single ? onChoose(first.id) : closer(group))}
            >
              <Board kind={kind} chosen={isChosen} face={single ? first : { count: group.items.length }} />
              {name === null ? null : (
                <span
                  className={`map-name absolute top-full left-1/2 -translate-x-1/2 text-xs font-bold whitespace-nowrap ${named ? "" : "invisible group-hover:visible group-focus-visible:visible"}`}
                >
                  {name}
                </span>
              )}
            </button>
          );
        })}
      </div>
    </Pane>
  );
}
