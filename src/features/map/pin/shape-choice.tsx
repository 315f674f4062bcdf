import { useId } from "react";
import type { BuildingKind, ShapeType } from "../../../../server/contracts/buildings.ts";
import { BuildingOutline } from "../../../components/building-outline.tsx";
import { shapeNames } from "../../../components/plan/shape-names.ts";
import { shapesOf, typicalOutlines } from "./typical-outlines.ts";

interface ShapeChoiceProps {
  kind: BuildingKind;
  value: ShapeType;
  onChange(shape: ShapeType): void;
  problem?: string;
}

/** The shapes the kind comes in, each by its outline. Native radio buttons: arrow keys move the choice. */
export function ShapeChoice({ kind, value, onChange, problem }: ShapeChoiceProps) {
  const name = useId();
  return (
    <fieldset className="m-0 border-0 p-0" aria-describedby={problem ? `${name}-problem` : undefined}>
      <legend className="mb-1 font-semibold">Shape</legend>
      <div className="grid grid-cols-3 border-t-[1.5px] border-l-[1.5px] border-rule-strong">
        {shapesOf[kind].map((shape) => (
          <label
            key={shape}
            className={`relative flex min-h-19 cursor-pointer flex-col items-center justify-end gap-1 border-r-[1.5px] border-b-[1.5px] border-rule-strong px-1 pt-2 pb-1.5 text-sm has-focus-visible:z-10 has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-focus ${shape === value ? "bg-ink font-bold text-sheet" : "bg-sheet hover:bg-trough"}`}
          >
            <input
              type="radio"
              name={name}
              value={shape}
              checked={shape === value}
              onChange={() => onChange(shape)}
              className="sr-only"
            />
            <BuildingOutline
              shapeType={shape}
              outline={typicalOutlines[shape]}
              size={{ width: 60, height: 34 }}
            />
            {shapeNames[shape]}
          </label>
        ))}
      </div>
      {problem ? (
        <p id={`${name}-problem`} className="m-0 mt-1 text-sm font-semibold text-redlead">
          {problem}
        </p>
      ) : null}
    </fieldset>
  );
}
