import { useMap } from "react-leaflet";
import { degreeLabel, graticuleLinesDeg, graticuleStepDeg } from "./graticule.ts";
import { useMovingView } from "./use-view.ts";

/** Room for the degree labels outside the neat line, and the line's own thickness. */
const GUTTER_PX = 22;
const BAR_PX = 6;
export const FRAME_PX = GUTTER_PX + BAR_PX;

const LEAST_STEP_PX = 120;
/** A label nearer to a corner than this would run off the sheet. */
const CORNER_PX = 46;

interface Tick {
  deg: number;
  px: number;
}

/** Alternating dark and light bars between the ticks, like the edge of a sheet of a survey. */
function bars(ticks: Tick[], stepDeg: number, fromPx: number, toPx: number) {
  const edges = [
    { key: "start", px: fromPx, dark: Math.round((ticks[0]?.deg ?? 0) / stepDeg) % 2 === 0 },
    ...ticks.map((tick) => ({
      key: String(tick.deg),
      px: tick.px,
      dark: Math.round(tick.deg / stepDeg) % 2 !== 0,
    })),
  ].filter((edge) => edge.px < toPx);
  return edges.map((edge, index) => ({
    ...edge,
    px: Math.max(edge.px, fromPx),
    endPx: Math.min(edges[index + 1]?.px ?? toPx, toPx),
  }));
}

/** Grid, neat line and degree labels, drawn anew while the map moves. */
export function MapFrame({ framed = true }: { framed?: boolean }) {
  const map = useMap();
  useMovingView();
  const { x: widthPx, y: heightPx } = map.getSize();
  if (widthPx < 2 * FRAME_PX || heightPx < 2 * FRAME_PX) return null;
  const bounds = map.getBounds();
  const pxPerDeg = (256 * 2 ** map.getZoom()) / 360;
  const stepDeg = graticuleStepDeg(pxPerDeg, LEAST_STEP_PX);
  const left = framed ? FRAME_PX : 0;
  const top = framed ? FRAME_PX : 0;
  const right = framed ? widthPx - BAR_PX - 2 : widthPx;
  const bottom = framed ? heightPx - BAR_PX - 2 : heightPx;
  const meridians = graticuleLinesDeg(
    Math.max(bounds.getWest(), -180),
    Math.min(bounds.getEast(), 180),
    stepDeg,
  )
    .map((deg) => ({ deg, px: map.latLngToContainerPoint([0, deg]).x }))
    .filter((tick) => tick.px > left && tick.px < right);
  const parallels = graticuleLinesDeg(
    Math.max(bounds.getSouth(), -84),
    Math.min(bounds.getNorth(), 84),
    stepDeg,
  )
    .map((deg) => ({ deg, px: map.latLngToContainerPoint([deg, 0]).y }))
    .filter((tick) => tick.px > top && tick.px < bottom)
    .reverse();
  return (
    <svg
      className="pointer-events-none absolute inset-0 z-[650]"
      width={widthPx}
      height={heightPx}
      aria-hidden="true"
    >
      <g stroke="var(--color-rule-strong)" strokeWidth={0.7} opacity={0.55}>
        {meridians.map((tick) => (
          <path key={tick.deg} d={`M${tick.px} ${top}V${bottom}`} />
        ))}
        {parallels.map((tick) => (
          <path key={tick.deg} d={`M${left} ${tick.px}H${right}`} />
        ))}
      </g>
      {framed ? (
        <>
          <path
            d={`M0 0H${widthPx}V${heightPx}H0ZM${left} ${top}V${bottom}H${right}V${top}Z`}
            fill="var(--color-limewash)"
            fillRule="evenodd"
          />
          <g fill="var(--color-ink)">
            {bars(meridians, stepDeg, left, right)
              .filter((bar) => bar.dark)
              .map((bar) => (
                <g key={bar.key}>
                  <rect x={bar.px} y={top - BAR_PX} width={bar.endPx - bar.px} height={BAR_PX} />
                  <rect x={bar.px} y={bottom} width={bar.endPx - bar.px} height={BAR_PX} />
                </g>
              ))}
            {bars(parallels, stepDeg, top, bottom)
              .filter((bar) => bar.dark)
              .map((bar) => (
                <g key={bar.key}>
                  <rect x={left - BAR_PX} y={bar.px} width={BAR_PX} height={bar.endPx - bar.px} />
                  <rect x={right} y={bar.px} width={BAR_PX} height={bar.endPx - bar.px} />
                </g>
              ))}
          </g>
          <g fill="none" stroke="var(--color-ink)" strokeWidth={1}>
            <rect
              x={left - BAR_PX}
              y={top - BAR_PX}
              width={right - left + 2 * BAR_PX}
              height={bottom - top + 2 * BAR_PX}
            />
            <rect x={left} y={top} width={right - left} height={bottom - top} />
          </g>
          <g fill="var(--color-ink)" fontSize={13} textAnchor="middle">
            {meridians
              .filter((tick) => tick.px > left + CORNER_PX && tick.px < right - CORNER_PX)
              .map((tick) => (
                <text key={tick.deg} x={tick.px} y={GUTTER_PX - 7}>
                  {degreeLabel(tick.deg, "longitude", stepDeg)}
                </text>
              ))}
            {parallels
              .filter((tick) => tick.px > top + CORNER_PX && tick.px < bottom - CORNER_PX)
              .map((tick) => (
                <text key={tick.deg} transform={`translate(${GUTTER_PX - 7} ${tick.px}) rotate(-90)`}>
                  {degreeLabel(tick.deg, "latitude", stepDeg)}
                </text>
              ))}
          </g>
        </>
      ) : (
        <g fill="var(--color-ink-2)" fontSize={13}>
          {meridians.slice(0, 3).map((tick) => (
            <text key={tick.deg} x={tick.px + 4} y={16}>
              {degreeLabel(tick.deg, "longitude", stepDeg)}
            </text>
          ))}
          {parallels.map((tick) => (
            <text key={tick.deg} x={4} y={tick.px - 4}>
              {degreeLabel(tick.deg, "latitude", stepDeg)}
            </text>
          ))}
        </g>
      )}
    </svg>
  );
}
