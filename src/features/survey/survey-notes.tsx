import type { SurveyView } from "../../../server/contracts/survey.ts";
import { counted, dayAndClock } from "../../lib/format.ts";

const quiet =
  "min-h-11 rounded-control border-2 border-rule-strong bg-sheet px-4 font-bold text-ink hover:bg-trough";

/** Two people changed the same survey: neither is overwritten without a choice. */
export function StaleChoice({
  theirs,
  onMine,
  onTheirs,
}: {
  theirs: SurveyView | null;
  onMine: () => void;
  onTheirs: () => void;
}) {
  return (
    <section
      role="alert"
      aria-label="Somebody else saved this survey"
      className="border-b-2 border-redlead bg-redlead-tint px-4 py-3"
    >
      <p className="m-0 font-bold">
        {theirs
          ? `${theirs.savedBy ?? "Somebody else"} saved this survey on ${dayAndClock(theirs.savedAt)}, after you opened it.`
          : "Somebody else saved this survey after you opened it."}
      </p>
      <p className="m-0 text-sm">
        Your answers are kept on this device. Choose which survey goes on; the other one is then replaced.
      </p>
      <p className="m-0 mt-2 flex flex-wrap gap-3">
        <button type="button" disabled={!theirs} className={quiet} onClick={onMine}>
          Keep mine
        </button>
        <button type="button" disabled={!theirs} className={quiet} onClick={onTheirs}>
          Take theirs
        </button>
        {theirs ? null : (
          <span className="self-center text-sm">Their survey cannot be read without a connection.</span>
        )}
      </p>
    </section>
  );
}

/** Says that answers kept on this device were put back. */
export function RestoredNote({
  restored,
  onClose,
}: {
  restored: { changes: number; keptAt: string };
  onClose: () => void;
}) {
  return (
    <div
      role="status"
      className="flex flex-wrap items-center gap-3 border-b border-rule bg-straw-tint px-4 py-2"
    >
      <p className="m-0 flex-1 text-sm">
        <b>{`${counted(restored.changes, "change")} kept on this device ${restored.changes === 1 ? "is" : "are"} back.`}</b>{" "}
        {restored.keptAt ? `Typed on ${dayAndClock(restored.keptAt)}. ` : ""}
        It goes to the office when there is a connection.
      </p>
      <button type="button" className={quiet} onClick={onClose}>
        Understood
      </button>
    </div>
  );
}

/** The server's own sentence when something was refused. */
export function Refusal({ message }: { message: string }) {
  return (
    <p role="alert" className="m-0 border-b-2 border-redlead bg-redlead-tint px-4 py-3 font-semibold">
      {message}
    </p>
  );
}
