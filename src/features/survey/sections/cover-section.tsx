import { useWatch } from "react-hook-form";
import type { CoverEntry } from "../../../../server/contracts/library.ts";
import { unitsFor } from "../../../lib/units.ts";
import { OptionalPart } from "../fields/optional-part.tsx";
import { SurveyChoice } from "../fields/survey-choice.tsx";
import { SurveyQuantity } from "../fields/survey-quantity.tsx";
import { SurveyReference } from "../fields/survey-reference.tsx";
import { useSurveyForm } from "../form-context.ts";
import { freshKneewall, freshScreen } from "../fresh-parts.ts";
import { UValueOverride } from "./u-value-override.tsx";

type Part = CoverEntry["parts"][number];

/** Covers offered for a part: those made for this kind of house first. */
function offered(covers: CoverEntry[], part: Part, kind: "greenhouse" | "barn"): CoverEntry[] {
  const fits = covers.filter((cover) => cover.parts.includes(part));
  const usual = fits.filter((cover) => cover.usedFor.includes(kind));
  return [...usual, ...fits.filter((cover) => !cover.usedFor.includes(kind))];
}

const parts = [
  { part: "roof", label: "Roof", of: "roof" },
  { part: "sides", label: "Long sides", of: "sides" },
  { part: "ends", label: "End walls", of: "ends" },
] as const;

/** What the house is covered with, part by part, and its screens. */
export function CoverSection() {
  const { control, library, system } = useSurveyForm();
  const units = unitsFor(system);
  const kind = useWatch({ control, name: "use.kind" });
  const shapeType = useWatch({ control, name: "shape.type" });
  const covers = useWatch({ control, name: "covers" });
  const screen = useWatch({ control, name: "screen" });
  const uOf = (id: string | undefined) => library.covers.find((cover) => cover.id === id)?.uValueWM2K ?? 4;
  const about = (id: string) => {
    const cover = library.covers.find((entry) => entry.id === id);
    return cover
      ? `${units.text(cover.uValueWM2K, "uValue")}, ${cover.uValuePublished ? "read from a table" : "from its layers"}`
      : "";
  };
  const aboutScreen = (id: string) => {
    const entry = library.screens.find((row) => row.id === id);
    return entry ? `keeps back about ${Math.round(entry.savingFrac * 100)} % when shut` : "";
  };
  return (
    <>
      {parts.map(({ part, label, of }) => (
        <div key={part}>
          <SurveyReference
            name={`covers.${part}.cover`}
            label={label}
            options={offered(library.covers, part, kind)}
            about={about}
          />
          <UValueOverride name={`covers.${part}.uValue`} of={of} startWM2K={uOf(covers[part].cover.value)} />
        </div>
      ))}
      {shapeType === "atticBarn" && covers.ceiling ? (
        <>
          <SurveyReference
            name="covers.ceiling.cover"
            label="Flat ceiling"
            options={offered(library.covers, "ceiling", kind)}
            about={about}
          />
          <UValueOverride
            name="covers.ceiling.uValue"
            of="ceiling"
            startWM2K={uOf(covers.ceiling.cover.value)}
          />
        </>
      ) : null}
      <OptionalPart
        name="covers.kneewall"
        add="Add a kneewall"
        remove="No kneewall"
        fresh={() => freshKneewall(library, system)}
      >
        <SurveyReference
          name="covers.kneewall.cover"
          label="Kneewall"
          options={offered(library.covers, "kneewall", kind)}
          about={about}
        />
        <SurveyQuantity name="covers.kneewall.height" label="Height of the kneewall" />
        <UValueOverride
          name="covers.kneewall.uValue"
          of="kneewall"
          startWM2K={uOf(covers.kneewall?.cover.value)}
        />
      </OptionalPart>
      <OptionalPart
        name="screen"
        add="Add a heat screen"
        remove="No heat screen"
        fresh={() => freshScreen(library, system)}
      >
        <SurveyReference
          name="screen.screen"
          label="Heat screen"
          options={library.screens}
          about={aboutScreen}
        />
        {screen ? (
          <>
            <SurveyQuantity name="screen.coverage" label="Share of the roof it covers" />
            <SurveyQuantity
              name="screen.edgeGap"
              label="Gap at its edge"
              hint="a gap lets much of the saving out"
            />
            <SurveyChoice
              name="screen.opensForSnow"
              label="Opened while it snows"
              options={[
                { value: "yes", label: "Yes" },
                { value: "no", label: "No" },
              ]}
            />
          </>
        ) : null}
      </OptionalPart>
    </>
  );
}
