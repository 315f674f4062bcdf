import type { ArrowPlan, PlacedArrow } from "./arrow-places.ts";
import { type Frame, px } from "./frame.ts";
import type { SectionShape } from "./section-shape.ts";

/** The opening in the right wall through which the air leaves. */
export function Vent({ vent }: { vent: ArrowPlan["vent"] }) {
  return (
    <rect
      x={px(vent.x - 5)}
      y={px(vent.y - vent.height / 2)}
      width="10"
      height={vent.height}
      fill="var(--color-sheet)"
      stroke="var(--color-ink)"
      strokeWidth="1.3"
    />
  );
}

/** The heater as a box on the ground, under its arrow. */
export function HeaterBox({ plan, frame, off }: { plan: ArrowPlan; frame: Frame; off: boolean }) {
  const { x, width, height } = plan.heater;
  return (
    <g>
      <rect
        x={px(x - width / 2)}
        y={px(frame.groundY - height)}
        width={px(width)}
        height={px(height)}
        fill="var(--color-sheet)"
        stroke="var(--color-ink)"
        strokeWidth="1.8"
      />
      {height >= 18 ? (
        <text
          x={px(x)}
          y={px(frame.groundY - height / 2 + 4)}
          fontSize="12.5"
          textAnchor="middle"
          fill="var(--color-ink-2)"
        >
          {off ? "Off" : "Heater"}
        </text>
      ) : null}
    </g>
  );
}

/** A lamp over the arrow of light. */
export function Lamp({ arrow }: { arrow: PlacedArrow }) {
  const { x, y } = arrow.from;
  return (
    <path
      d={`M${px(x - 13)} ${px(y)}h26l-6 -9h-14z`}
      fill="var(--color-sheet)"
      stroke="var(--color-ink)"
      strokeWidth="1.4"
    />
  );
}

/** The ruled plate with the air the house is kept at: the largest figure of the drawing. */
export function InsidePlate({
  plan,
  frame,
  shape,
  words,
  phone,
}: {
  plan: ArrowPlan;
  frame: Frame;
  shape: SectionShape;
  words: string;
  phone: boolean;
}) {
  const half = phone ? 36 : 47;
  const top = shape.type === "atticBarn" ? shape.sideM : shape.topM;
  const x = Math.max(frame.x(-shape.drawnWidthM * 0.06), plan.heater.x + plan.heater.width / 2 + half + 6);
  const y = Math.min(frame.groundY - 30, frame.y(top * 0.55));
  return (
    <g>
      <rect
        x={px(x - half)}
        y={px(y - 20)}
        width={half * 2}
        height="46"
        fill="var(--color-sheet)"
        stroke="var(--color-ink)"
        strokeWidth="1.6"
      />
      <text x={px(x)} y={px(y - 3)} fontSize="13" textAnchor="middle" fill="var(--color-ink-2)">
        {phone ? "Inside" : "Inside air"}
      </text>
      <text
        x={px(x)}
        y={px(y + 19)}
        fontSize={phone ? 16 : 18}
        fontWeight="700"
        textAnchor="middle"
        fill="var(--color-ink)"
      >
        {words}
      </text>
    </g>
  );
}
