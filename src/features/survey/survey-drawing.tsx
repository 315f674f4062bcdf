import type { CoverEntry } from "../../../server/contracts/library.ts";
import type { Survey } from "../../../server/contracts/survey.ts";
import { sectionShape } from "../../components/section-drawing/section-shape.ts";
import { SectionSizes } from "../../components/section-drawing/section-sizes.tsx";
import { shellOf } from "../../components/section-drawing/survey-shell.ts";
import { compass } from "../../lib/format.ts";
import { quantitySi } from "../../lib/quantity-value.ts";
import type { Units } from "../../lib/units.ts";
import { CoverLayers } from "./cover-layers.tsx";
import { DerivedSizes } from "./derived-sizes.tsx";

interface SurveyDrawingProps {
  survey: Survey;
  covers: CoverEntry[];
  active: string | null;
  units: Units;
  layout: "wide" | "phone";
}

/** The house as typed so far. While the sizes do not make a house, it says so in place of a wrong picture. */
export function SurveyDrawing({ survey, covers, active, units, layout }: SurveyDrawingProps) {
  const shape = sectionShape(survey.shape);
  const drawing = shape ? (
    <SectionSizes
      shape={shape}
      shell={shellOf(survey, covers)}
      system={units.system}
      active={active}
      layout={layout}
    />
  ) : (
    <p className="m-0 p-6 text-sm">
      The sizes typed so far do not make a house, so nothing is drawn. Heights must be above zero and the
      ridge above the eave.
    </p>
  );
  if (layout === "phone") return drawing;
  const bearing = quantitySi(survey.ridgeBearing);
  return (
    <>
      <h2 className="m-0 font-sign text-lg font-bold">
        {Number.isFinite(bearing) ? `Section, looking ${compass(bearing)} along the ridge` : "Section"}
      </h2>
      <p className="m-0 mb-2 text-sm text-ink-2">Redraws as you type. The measure you are on is filled.</p>
      <div className="border border-rule-strong bg-sheet">{drawing}</div>
      <div className="mt-4 grid gap-6 xl:grid-cols-2">
        <CoverLayers survey={survey} covers={covers} />
        <DerivedSizes survey={survey} units={units} />
      </div>
    </>
  );
}
