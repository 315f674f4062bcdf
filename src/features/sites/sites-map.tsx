import L from "leaflet";
import { useEffect, useMemo } from "react";
import { Pane, useMap } from "react-leaflet";
import type { SiteRow } from "../../../server/contracts/sites.ts";
import { type VerdictKind, verdictKind } from "../../components/plan/verdict.ts";
import { foldBoards } from "../../components/sheet-map/fold-boards.ts";
import { SheetMap } from "../../components/sheet-map/sheet-map.tsx";
import { useShield } from "../../components/sheet-map/use-shield.ts";
import { useSettledView } from "../../components/sheet-map/use-view.ts";

const FOLD_PX = 36;

const looks: Record<VerdictKind, string> = {
  short: "bg-redlead text-on-redlead border-ink",
  tight: "bg-straw text-on-straw border-ink",
  unfinished: "bg-sheet text-ink border-ink border-dashed",
  holds: "bg-sheet text-ink border-ink",
  notApplicable: "bg-sheet text-ink border-ink",
};
const order: VerdictKind[] = ["short", "tight", "unfinished", "holds", "notApplicable"];

interface SitesMapProps {
  /** In the order of the table: the first is number 1. */
  rows: SiteRow[];
  onChoose(buildingId: string): void;
}

function Numbers({ rows, onChoose }: SitesMapProps) {
  const map = useMap();
  const layer = useShield<HTMLDivElement>();
  useSettledView();
  const groups = foldBoards(
    rows.map((row, index) => {
      const { x, y } = map.latLngToLayerPoint([row.latitudeDeg, row.longitudeDeg]);
      return { item: { row, number: index + 1 }, xPx: x, yPx: y };
    }),
    FOLD_PX,
  );
  return (
    <Pane name="numbers" style={{ zIndex: 620 }}>
      <div ref={layer}>
        {groups.map((group) => {
          const kinds = group.items.map(({ row }) => verdictKind(row.plan));
          const worst = order.find((kind) => kinds.includes(kind)) ?? "holds";
          const numbers = group.items.map(({ number }) => number);
          const single = group.items.length === 1;
          const [first] = group.items;
          if (first === undefined) return null;
          const closer = () =>
            map.fitBounds(L.latLngBounds(group.items.map(({ row }) => [row.latitudeDeg, row.longitudeDeg])), {
              padding: [50, 50],
              maxZoom: 15,
            });
          return (
            <button
              key={numbers.join(" ")}
              type="button"
              className="absolute flex h-11 min-w-11 -translate-x-1/2 -translate-y-1/2 items-center justify-center bg-transparent p-0"
              style={{ left: group.xPx, top: group.yPx }}
              onClick={() => (single ? onChoose(first.row.buildingId) : closer())}
            >
              <span
                className={`flex h-8 min-w-8 items-center justify-center rounded-full border-2 px-1.5 text-sm font-bold whitespace-nowrap ${looks[worst]}`}
              >
                {single ? first.number : `${first.number}, +${group.items.length - 1}`}
              </span>
              <span className="sr-only">
                {single
                  ? ` ${first.row.buildingName}. Show in the table`
                  : ` Numbers ${numbers.join(", ")}. Show closer`}
              </span>
            </button>
          );
        })}
      </div>
    </Pane>
  );
}

function FitRows({ bounds }: { bounds: string }) {
  const map = useMap();
  useEffect(() => {
    const [south = 0, west = 0, north = 0, east = 0] = bounds.split(",").map(Number);
    map.fitBounds(
      [
        [south, west],
        [north, east],
      ],
      { padding: [40, 30], maxZoom: 12 },
    );
  }, [bounds, map]);
  return null;
}

/** Where the rows of the table lie. */
export function SitesMap({ rows, onChoose }: SitesMapProps) {
  const bounds = useMemo(
    () =>
      [
        Math.min(...rows.map((row) => row.latitudeDeg)),
        Math.min(...rows.map((row) => row.longitudeDeg)),
        Math.max(...rows.map((row) => row.latitudeDeg)),
        Math.max(...rows.map((row) => row.longitudeDeg)),
      ].join(","),
    [rows],
  );
  return (
    <SheetMap label="Where they are" center={[20, 0]} zoom={1} leastZoom={0} framed={false}>
      {rows.length > 0 ? <FitRows bounds={bounds} /> : null}
      <Numbers rows={rows} onChoose={onChoose} />
    </SheetMap>
  );
}
