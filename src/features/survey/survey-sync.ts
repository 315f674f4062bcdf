import type { Survey, SurveyView } from "../../../server/contracts/survey.ts";

/** What the person is told about where the answers are. */
export type SyncState =
  | { kind: "saved"; at: string }
  | { kind: "saving" }
  | { kind: "onDevice"; changes: number; keptAt: string }
  | { kind: "invalid"; changes: number }
  | { kind: "failed"; message: string; changes: number; kept: boolean }
  | { kind: "stale"; theirs: SurveyView | null };

/** How a save ended, told apart so that the hook can act without knowing the transport. */
export type SaveOutcome =
  | { kind: "saved"; view: SurveyView }
  | { kind: "offline" }
  | { kind: "stale" }
  | { kind: "refused"; message: string; fields: Record<string, string> }
  | { kind: "failed"; message: string };

export interface DraftStart {
  survey: Survey;
  /** Words about a restored draft, for the person. */
  restored: { changes: number; keptAt: string } | null;
  /** True when the server has a newer version than the draft was made from. */
  conflict: boolean;
}

/** Which survey a form starts with: the server's, or what was kept on this device. */
export function startFrom(
  view: SurveyView,
  draft: { version: number; survey: Survey; changes: number; keptAt: string } | null,
): DraftStart {
  if (!draft || draft.changes === 0) return { survey: view.survey, restored: null, conflict: false };
  return {
    survey: draft.survey,
    restored: { changes: draft.changes, keptAt: draft.keptAt },
    conflict: draft.version !== view.version,
  };
}
