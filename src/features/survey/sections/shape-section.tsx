import { useController, useFormContext, useWatch } from "react-hook-form";
import type { ShapeType } from "../../../../server/contracts/buildings.ts";
import type { Survey, SurveyShape } from "../../../../server/contracts/survey.ts";
import { ChoiceButtons } from "../../../components/form/choice-buttons.tsx";
import { shapeNames } from "../../../components/plan/shape-names.ts";
import { changeShape } from "../change-shape.ts";
import { SurveyQuantity } from "../fields/survey-quantity.tsx";
import { type SurveyPath, useSurveyForm } from "../form-context.ts";
import { freshCeiling } from "../fresh-parts.ts";
import { ShapePicture } from "./shape-picture.tsx";

interface Ask {
  name: SurveyPath;
  label: string;
  hint?: string;
}

const length: Ask = { name: "shape.length", label: "Length" };
const width: Ask = { name: "shape.width", label: "Width, outside" };
const ridge: Ask = { name: "shape.ridgeHeight", label: "Ridge height" };
const eave: Ask = { name: "shape.eaveHeight", label: "Eave height" };
const spans: Ask[] = [
  { name: "shape.spanWidth", label: "Width of one span" },
  { name: "shape.spanCount", label: "Number of spans" },
  { name: "shape.gutterHeight", label: "Gutter height" },
];

const asked: Record<SurveyShape["type"], Ask[]> = {
  roundArch: [
    width,
    length,
    { name: "shape.rise", label: "Rise of the arch", hint: "from where the hoop starts to its top" },
    { name: "shape.wallHeight", label: "Upright wall", hint: "0 where the hoop starts at the ground" },
  ],
  gothicArch: [
    width,
    length,
    ridge,
    eave,
    { name: "shape.roofBow", label: "Roof bow", hint: "how far the hoop bulges past a straight line" },
  ],
  gable: [width, length, ridge, eave],
  atticBarn: [width, length, ridge, { ...eave, hint: "where the flat ceiling is" }],
  multiSpan: [...spans, ridge, length],
  venlo: [...spans, { name: "shape.roofSlope", label: "Roof slope" }, length],
  monoPitch: [
    width,
    length,
    { name: "shape.lowEave", label: "Low side" },
    { name: "shape.highEave", label: "High side" },
  ],
};

/** Shape, its measures, and which way the ridge runs. */
export function ShapeSection() {
  const { control, disabled, library } = useSurveyForm();
  const { getValues, setValue } = useFormContext<Survey>();
  const { field } = useController({ name: "shape", control });
  const shape = useWatch({ control, name: "shape" });
  const change = (type: SurveyShape["type"]) => {
    field.onChange(changeShape(shape, type));
    // Only a barn with an attic has a ceiling of its own, and it always has one.
    const ceiling = type === "atticBarn" ? (getValues("covers.ceiling") ?? freshCeiling(library)) : null;
    setValue("covers.ceiling", ceiling, { shouldDirty: true, shouldValidate: true });
  };
  return (
    <>
      <div className="px-4 pt-2 pb-3 md:px-0">
        <ChoiceButtons
          legend="Shape"
          name="shape-type"
          value={shape.type}
          disabled={disabled}
          onChange={change}
          options={(Object.keys(shapeNames) as ShapeType[]).map((type) => ({
            value: type,
            label: shapeNames[type],
            picture: <ShapePicture type={type} />,
          }))}
        />
      </div>
      {asked[shape.type].map((ask) => (
        <SurveyQuantity key={`${shape.type}-${ask.name}`} {...ask} />
      ))}
      <SurveyQuantity
        name="ridgeBearing"
        label="Bearing of the ridge"
        hint="0 runs north to south, 90 runs east to west"
      />
    </>
  );
}
