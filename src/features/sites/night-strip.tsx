import type { PlanSummary } from "../../../server/contracts/buildings.ts";
import type { Units } from "../../lib/units.ts";

const WIDTH_PX = 176;
const HEIGHT_PX = 30;
const LINE_Y = 19;

export interface StripScale {
  lowC: number;
  highC: number;
}

const hasNight = (plan: PlanSummary | null): plan is PlanSummary =>
  plan !== null && plan.verdict !== "cannotSay" && plan.verdict !== "notApplicable";

/** One scale for all rows, so that houses can be compared by eye. */
export function stripScale(plans: (PlanSummary | null)[]): StripScale {
  const shown = plans.filter(hasNight);
  const lows = shown.map((plan) => Math.min(plan.onceInYearsDesignC, plan.settlesAtC));
  const highs = shown.map((plan) => plan.setpointC);
  return {
    lowC: Math.floor(Math.min(0, ...lows) / 10) * 10,
    highC: Math.ceil(Math.max(20, ...highs) / 10) * 10,
  };
}

const xOf = ({ lowC, highC }: StripScale, tempC: number) =>
  6 + ((tempC - lowC) / (highC - lowC)) * (WIDTH_PX - 12);

/** Ends of the scale, above the strips. */
export function StripAxis({ scale, units }: { scale: StripScale; units: Units }) {
  const ticks = [scale.lowC, 0, scale.highC].filter((tick, index, all) => all.indexOf(tick) === index);
  return (
    <svg width={WIDTH_PX} height={18} aria-hidden="true" className="block overflow-visible">
      {ticks.map((tick) => (
        <text
          key={tick}
          x={xOf(scale, tick)}
          y={13}
          fontSize={13}
          fontWeight={400}
          fill="var(--color-ink-2)"
          textAnchor="middle"
        >
          {units.figure(tick, "temperature", { decimals: 0 }).value}
        </text>
      ))}
    </svg>
  );
}

/**
 * The coldest night as a length: from the air outside to where the house settles,
 * and hatched what is missing up to the temperature that is wanted.
 */
export function NightStrip({
  plan,
  scale,
  units,
}: {
  plan: PlanSummary | null;
  scale: StripScale;
  units: Units;
}) {
  const unheated = plan?.verdict === "notApplicable";
  if (!hasNight(plan)) {
    const words = unheated ? "no heating wanted" : "not worked out";
    return <span className="block w-44 text-center text-ink-2">{words}</span>;
  }
  const outside = xOf(scale, plan.onceInYearsDesignC);
  const inside = xOf(scale, plan.settlesAtC);
  const wanted = xOf(scale, plan.setpointC);
  const words = `Outside ${units.temperature(plan.onceInYearsDesignC)}, inside settles at ${units.temperature(plan.settlesAtC)}, wanted ${units.temperature(plan.setpointC)}`;
  return (
    <svg width={WIDTH_PX} height={HEIGHT_PX} role="img" aria-label={words} className="block overflow-visible">
      <path d={`M6 ${LINE_Y}H${WIDTH_PX - 6}`} stroke="var(--color-rule-strong)" />
      <path
        d={`M${xOf(scale, 0)} ${LINE_Y - 11}V${LINE_Y + 9}`}
        stroke="var(--color-rule-strong)"
        strokeDasharray="1.5 2.5"
      />
      <rect
        x={Math.min(outside, inside)}
        y={LINE_Y - 5}
        width={Math.max(0, Math.abs(inside - outside))}
        height={10}
        fill="var(--color-trough)"
        stroke="var(--color-ink)"
        strokeWidth={1.1}
      />
      {wanted > inside + 0.5 ? (
        <rect
          x={inside}
          y={LINE_Y - 5}
          width={wanted - inside}
          height={10}
          fill="url(#missing-heat)"
          stroke="var(--color-redlead)"
          strokeWidth={1.4}
        />
      ) : null}
      <path d={`M${wanted - 5} ${LINE_Y - 14}h10l-5 7Z`} fill="var(--color-ink)" />
      <circle
        cx={inside}
        cy={LINE_Y}
        r={5}
        fill="var(--color-sheet)"
        stroke="var(--color-ink)"
        strokeWidth={2.2}
      />
    </svg>
  );
}

/** The hatch of missing heat; once on the page. */
export function MissingHatch() {
  return (
    <svg width="0" height="0" className="absolute" aria-hidden="true">
      <defs>
        <pattern
          id="missing-heat"
          width="6"
          height="6"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <rect width="6" height="6" fill="var(--color-redlead-tint)" />
          <rect width="2.6" height="6" fill="var(--color-redlead)" />
        </pattern>
      </defs>
    </svg>
  );
}
