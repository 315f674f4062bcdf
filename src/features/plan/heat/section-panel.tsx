import { useMemo } from "react";
import type { CoverEntry } from "../../../../server/contracts/library.ts";
import type { PlanView } from "../../../../server/contracts/plans.ts";
import type { HouseBalance } from "../../../../server/engine/plan/plan-types.ts";
import { flowsOf } from "../../../components/section-drawing/heat-paths.ts";
import { SectionHeat } from "../../../components/section-drawing/section-heat.tsx";
import { sectionShape } from "../../../components/section-drawing/section-shape.ts";
import { shellOf } from "../../../components/section-drawing/survey-shell.ts";
import type { Units } from "../../../lib/units.ts";
import { flowWriter } from "./flow-writer.ts";
import { allBalances } from "./selection.ts";

interface SectionPanelProps {
  plan: PlanView;
  balance: HouseBalance;
  occupied: boolean;
  covers: CoverEntry[] | undefined;
  units: Units;
}

/** Faces of the roof, or of the ceiling under a cold attic. */
function roofFaces(balance: HouseBalance): { name: string; tempC: number }[] {
  const roof =
    balance.surfaces.find((surface) => surface.role === "ceiling") ??
    balance.surfaces.find((surface) => surface.role === "roof") ??
    balance.surfaces[0];
  const inner = roof?.faceTempsC[0];
  const outer = roof?.faceTempsC.at(-1);
  return inner === undefined || outer === undefined
    ? []
    : [
        { name: "Inner face", tempC: inner },
        { name: "Outer face", tempC: outer },
      ];
}

/** The house drawn with the heat of one steady hour; a smaller drawing on narrow screens. */
export function SectionPanel({ plan, balance, occupied, covers, units }: SectionPanelProps) {
  const shape = useMemo(() => sectionShape(plan.survey.shape), [plan.survey.shape]);
  const greatestFlowW = useMemo(
    () => Math.max(...allBalances(plan.result).flatMap((entry) => Object.values(flowsOf(entry)))),
    [plan.result],
  );
  if (!shape) return null;
  const shell = shellOf(plan.survey, covers);
  const flows = flowsOf(balance);
  const drawn = {
    shape,
    shell: {
      ...shell,
      contents: occupied ? shell.contents : ("empty" as const),
      screen: shell.screen
        ? balance.state === "screensOpen" || balance.state === "snowOnRoof"
          ? "open"
          : "shut"
        : null,
      snow: balance.state === "snowOnRoof",
    } as const,
    flows,
    temperatures: {
      insideC: balance.insideTempC,
      outsideC: balance.outdoorTempC,
      skyC: balance.skyTempC,
      soilC: balance.soilTempC,
      faces: roofFaces(balance),
    },
    greatestFlowW,
    system: units.system,
    written: flowWriter(flows, units).full,
    bare: flowWriter(flows, units).plain,
    unit: units.symbol("power"),
    weather: `Night, no sun. Wind ${units.text(balance.windMS, "speed")}`,
  };
  return (
    <div className="bg-sheet">
      <div className="max-md:hidden print:block">
        <SectionHeat {...drawn} layout="wide" />
      </div>
      <div className="md:hidden print:hidden">
        <SectionHeat {...drawn} layout="phone" />
      </div>
    </div>
  );
}
