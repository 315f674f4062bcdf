import type { UnitSystem } from "../../../server/engine/units.ts";
import { temperature } from "../../lib/format.ts";
import { ArrowKey } from "./arrow-key.tsx";
import { placeArrows } from "./arrow-places.ts";
import { frameFor, roofAt } from "./frame.ts";
import { HeatArrow } from "./heat-arrow.tsx";
import { HeaterBox, InsidePlate, Lamp, Vent } from "./heat-fittings.tsx";
import { HeatLabel, Plate } from "./heat-label.tsx";
import { GroundLabels, SideLabels } from "./heat-labels.tsx";
import { heatLayouts } from "./heat-layout.ts";
import type { FlowsW } from "./heat-paths.ts";
import { ScaleBar } from "./scale-bar.tsx";
import type { SectionShape } from "./section-shape.ts";
import { SectionShell, type Shell } from "./shell.tsx";
import { type SectionTemperatures, spokenFlows } from "./spoken-flows.ts";

export interface SectionHeatProps {
  shape: SectionShape;
  shell: Shell;
  flows: FlowsW;
  temperatures: SectionTemperatures;
  /** The greatest flow of all states that can be shown, so that arrows compare between months. */
  greatestFlowW: number;
  system: UnitSystem;
  layout: "wide" | "phone";
  /** How a flow is written, with and without its unit; the table beside the drawing shows the same digits. */
  written: (heatW: number) => string;
  bare: (heatW: number) => string;
  /** Unit of the bare numbers, written once in the small drawing. */
  unit: string;
  /** Words for the sky's state, upper left. */
  weather: string;
}

/** The very house at one steady hour: temperatures where they are, arrows as wide as the heat they carry. */
export function SectionHeat(props: SectionHeatProps) {
  const { shape, shell, flows, temperatures, greatestFlowW, system, written } = props;
  const layout = heatLayouts[props.layout];
  const frame = frameFor(shape, layout);
  const widthPerW = layout.widestArrow / Math.max(1, greatestFlowW);
  const plan = placeArrows(shape, frame, flows, widthPerW, layout);
  const sky = plan.arrows.find((arrow) => arrow.path === "sky");
  const lamp = plan.arrows.find((arrow) => arrow.path === "lights");
  const phone = props.layout === "phone";
  const drawn = phone ? props.bare : written;
  const labels = { plan, frame, layout, flows, written: drawn };
  return (
    <svg
      viewBox={`0 0 ${layout.width} ${layout.height}`}
      role="img"
      aria-label={spokenFlows(flows, temperatures, written, system)}
      className="block h-auto w-full"
    >
      <SectionShell shape={shape} shell={shell} frame={frame} />
      <Vent vent={plan.vent} />
      {plan.arrows.map((arrow) => (
        <HeatArrow key={arrow.path} path={arrow.path} from={arrow.from} to={arrow.to} width={arrow.width} />
      ))}
      {lamp ? <Lamp arrow={lamp} /> : null}
      <HeaterBox plan={plan} frame={frame} off={!plan.arrows.some((arrow) => arrow.path === "heater")} />
      <GroundLabels {...labels} />
      <SideLabels {...labels} shape={shape} temperatures={temperatures} system={system} />
      {sky ? (
        <HeatLabel
          path="sky"
          heat={drawn(flows.sky)}
          x={sky.from.x - sky.width / 2 - 14}
          y={Math.max(phone ? 18 : 28, sky.to.y + 4)}
          fontSize={layout.fontSize}
          named={layout.named}
          anchor="end"
        />
      ) : null}
      <Plate
        name="Sky"
        value={temperature(temperatures.skyC, system)}
        x={frame.x(roofAt(shape.outline, 0.001).point.x) + (phone ? 20 : 30)}
        y={phone ? 18 : 28}
        fontSize={layout.fontSize}
      />
      <Plate
        name={phone ? "Outside" : "Outside air"}
        value={temperature(temperatures.outsideC, system)}
        x={phone ? 10 : 18}
        y={phone ? frame.groundY - 70 : frame.groundY - 150}
        fontSize={layout.fontSize}
      />
      <Plate
        name="Soil"
        value={temperature(temperatures.soilC, system)}
        x={layout.width - (phone ? 8 : 18)}
        y={frame.groundY + layout.slotDrop - (phone ? 4 : 0)}
        fontSize={layout.fontSize}
        anchor="end"
      />
      <InsidePlate
        plan={plan}
        frame={frame}
        shape={shape}
        words={temperature(temperatures.insideC, system)}
        phone={phone}
      />
      <text x={phone ? 10 : 18} y={phone ? 18 : 28} fontSize={phone ? 12.5 : 14} fill="var(--color-ink-2)">
        {phone ? `Heat in ${props.unit}` : props.weather}
      </text>
      <ScaleBar frame={frame} system={system} x={phone ? 10 : 18} y={layout.height - 14} />
      {shape.drawnSpans < shape.spans ? (
        <text
          x={phone ? 10 : 18}
          y={layout.height - 32}
          fontSize="12.5"
          fill="var(--color-ink-2)"
        >{`${shape.drawnSpans} of ${shape.spans} spans drawn`}</text>
      ) : null}
      <ArrowKey
        widthPerW={widthPerW}
        greatestFlowW={greatestFlowW}
        system={system}
        x={layout.width - (phone ? 150 : 190)}
        y={layout.height - 18}
      />
    </svg>
  );
}
