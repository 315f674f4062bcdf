import { Check, CloudOff, Loader, TriangleAlert } from "lucide-react";
import type { SyncState } from "./survey-sync.ts";
import { syncWords } from "./sync-words.ts";

/** Where the answers are, always in sight and spoken when it changes. */
export function SyncStatus({ state }: { state: SyncState }) {
  const Icon =
    state.kind === "saved"
      ? Check
      : state.kind === "saving"
        ? Loader
        : state.kind === "onDevice"
          ? CloudOff
          : TriangleAlert;
  const troubled = state.kind === "failed" || state.kind === "stale" || state.kind === "invalid";
  return (
    <p
      role="status"
      className={`m-0 inline-flex items-center gap-2 text-sm ${troubled ? "font-semibold text-redlead" : "text-ink-2"}`}
    >
      <Icon size={17} aria-hidden="true" className="flex-none" />
      {syncWords(state)}
    </p>
  );
}
