import { useMap } from "react-leaflet";
import { useSettledView } from "../../../components/sheet-map/use-view.ts";
import { useUnits } from "../../../lib/units.ts";

const EARTH_ROUND_M = 40_075_016.686;
/** Nobody clicks better than this. */
const HAND_PX = 3;
/** From here on a click is better than a house is long. */
const GOOD_M = 12;

interface ClickHintProps {
  /** Set while three clicks draw the house: which one is next. */
  drawing: 0 | 1 | 2 | null;
  placed: boolean;
}

const drawingWords = [
  "Click one end of the ridge.",
  "Click the other end of the ridge.",
  "Click anywhere on a long side.",
];

/** What a click does now, and how exact it can be at this closeness. */
export function ClickHint({ drawing, placed }: ClickHintProps) {
  const map = useMap();
  const units = useUnits();
  useSettledView();
  const metresPerPx =
    (EARTH_ROUND_M * Math.cos((map.getCenter().lat * Math.PI) / 180)) / (256 * 2 ** map.getZoom());
  const exactM = metresPerPx * HAND_PX;
  const far = exactM > GOOD_M;
  const reach =
    exactM < 1000 ? units.text(exactM, "length", { decimals: 0 }) : units.text(exactM, "distance");
  return (
    <p
      role="status"
      className="pointer-events-none absolute top-11 left-11 z-[800] m-0 max-w-[46ch] border border-ink bg-sheet px-3 py-2 text-sm max-md:top-2 max-md:right-16 max-md:left-2"
    >
      {drawing === null
        ? placed
          ? "Drag the grips, or click where the house stands."
          : "Click where the house stands."
        : drawingWords[drawing]}
      {far ? ` At this distance a click is good to about ${reach}.` : ""}
    </p>
  );
}
