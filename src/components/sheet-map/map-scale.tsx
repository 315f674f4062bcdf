import { useMap } from "react-leaflet";
import { number } from "../../lib/format.ts";
import { useUnits } from "../../lib/units.ts";
import { scaleBar } from "./scale-bar.ts";
import { useSettledView } from "./use-view.ts";

const EARTH_ROUND_M = 40_075_016.686;
/** A map of whole continents has no one scale. */
const LEAST_ZOOM = 2;
/** A bar shorter than this has no room for its middle figure. */
const NARROW_PX = 80;

/** A bar of a round length at the middle of the view, in kilometres or miles by the reader's units. */
export function MapScale({ mostPx, className = "" }: { mostPx: number; className?: string }) {
  const map = useMap();
  const { system } = useUnits();
  useSettledView();
  if (map.getZoom() < LEAST_ZOOM) return null;
  const latitude = (map.getCenter().lat * Math.PI) / 180;
  const metresPerPx = (EARTH_ROUND_M * Math.cos(latitude)) / (256 * 2 ** map.getZoom());
  const { widthPx, ticks, unit } = scaleBar(metresPerPx, mostPx, system);
  const quarter = widthPx / 4;
  const decimals = Number.isInteger(ticks[1]) ? 0 : 1;
  return (
    <svg
      className={`pointer-events-none absolute z-[700] border border-ink bg-sheet print:hidden ${className}`}
      width={widthPx + 70}
      height={42}
      role="img"
      aria-label={`Scale: the bar is ${number(ticks[2])} ${unit} long`}
    >
      <g transform="translate(14 24)">
        <rect width={widthPx} height={8} fill="var(--color-sheet)" stroke="var(--color-ink)" />
        <rect width={quarter} height={8} fill="var(--color-ink)" />
        <rect x={2 * quarter} width={quarter} height={8} fill="var(--color-ink)" />
        <g fill="var(--color-ink)" fontSize={13} textAnchor="middle">
          <text y={-6}>0</text>
          {widthPx < NARROW_PX ? null : (
            <text x={widthPx / 2} y={-6}>
              {number(ticks[1], decimals)}
            </text>
          )}
          <text x={widthPx} y={-6} textAnchor="start" dx={-8}>{`${number(ticks[2])} ${unit}`}</text>
        </g>
      </g>
    </svg>
  );
}
