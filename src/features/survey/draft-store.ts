import type { Survey } from "../../../server/contracts/survey.ts";

/** What is kept on the device until the server has it. */
export interface SurveyDraft {
  /** The saved version the person started from. */
  version: number;
  survey: Survey;
  changes: number;
  keptAt: string;
}

const key = (buildingId: string) => `glassbyre.survey.${buildingId}`;

/** The draft kept for a building; null when there is none or it cannot be read. */
export function readDraft(buildingId: string): SurveyDraft | null {
  try {
    const stored = localStorage.getItem(key(buildingId));
    if (stored === null) return null;
    const draft = JSON.parse(stored) as Partial<SurveyDraft>;
    return typeof draft.version === "number" &&
      draft.survey !== undefined &&
      Array.isArray(draft.survey.months)
      ? {
          version: draft.version,
          survey: draft.survey,
          changes: draft.changes ?? 1,
          keptAt: draft.keptAt ?? "",
        }
      : null;
  } catch {
    return null;
  }
}

/** Keeps a draft; false when the device refuses, so that the person can be told. */
export function keepDraft(buildingId: string, draft: SurveyDraft): boolean {
  try {
    localStorage.setItem(key(buildingId), JSON.stringify(draft));
    return true;
  } catch {
    return false;
  }
}

export function dropDraft(buildingId: string): void {
  try {
    localStorage.removeItem(key(buildingId));
  } catch {
    // A device that refuses storage has nothing to drop.
  }
}
