import { createContext, useContext } from "react";
import type { Control, FieldPath } from "react-hook-form";
import type { LibraryView } from "../../../server/contracts/library.ts";
import type { Origin } from "../../../server/contracts/quantity.ts";
import type { Survey } from "../../../server/contracts/survey.ts";
import type { UnitSystem } from "../../../server/engine/units.ts";

export type SurveyPath = FieldPath<Survey>;

export interface SurveyFormState {
  control: Control<Survey>;
  library: LibraryView;
  system: UnitSystem;
  disabled: boolean;
  /** Origin given to a figure typed over a typical value: the one the person used last. */
  typedOrigin: Origin;
  setTypedOrigin: (origin: Origin) => void;
  /** Path of the answer being edited, for the drawing. */
  active: string | null;
  setActive: (path: string | null) => void;
  /** Sentences of the server for answers it refused, by path. */
  refused: Record<string, string>;
  forget: (path: string) => void;
}

export const SurveyFormContext = createContext<SurveyFormState | null>(null);

/** The survey form around a field. */
export function useSurveyForm(): SurveyFormState {
  const state = useContext(SurveyFormContext);
  if (!state) throw new Error("A survey field stands outside its form.");
  return state;
}
