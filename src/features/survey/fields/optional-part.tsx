import type { ReactNode } from "react";
import { useController } from "react-hook-form";
import { type SurveyPath, useSurveyForm } from "../form-context.ts";

interface OptionalPartProps {
  name: SurveyPath;
  /** Words of the button that adds the part, and of the one that takes it away. */
  add: string;
  remove: string;
  /** The part as it starts when it is added. */
  fresh: () => unknown;
  children: ReactNode;
}

/** A part of the survey that may be missing: nothing is asked until it is there. */
export function OptionalPart({ name, add, remove, fresh, children }: OptionalPartProps) {
  const { control, disabled } = useSurveyForm();
  const { field } = useController({ name, control });
  const present = field.value !== null && field.value !== undefined;
  return (
    <div className="border-b border-rule">
      {present ? children : null}
      <button
        type="button"
        disabled={disabled}
        onClick={() => field.onChange(present ? null : fresh())}
        className="min-h-11 px-4 text-sm font-semibold text-bottle underline underline-offset-4 hover:text-bottle-deep disabled:text-ink-2 disabled:no-underline md:px-0"
      >
        {present ? remove : add}
      </button>
    </div>
  );
}
