import { clock, counted } from "../../lib/format.ts";
import type { SyncState } from "./survey-sync.ts";

/** Where the answers are, in a few words. */
export function syncWords(state: SyncState): string {
  switch (state.kind) {
    case "saved":
      return `Saved ${clock(state.at)}`;
    case "saving":
      return "Saving";
    case "onDevice":
      return `On this device only, ${counted(state.changes, "change")}`;
    case "invalid":
      return `An answer needs another look. ${counted(state.changes, "change")} on this device only`;
    case "failed":
      return state.kept
        ? `Could not save. ${counted(state.changes, "change")} on this device only`
        : `Could not save, and this device refuses to keep ${counted(state.changes, "change")}. Do not close the page`;
    case "stale":
      return "Somebody else saved meanwhile";
  }
}
