import { useEffect, useId, useRef, useState } from "react";
import type { PlanView } from "../../../../server/contracts/plans.ts";
import type { HeaterOption } from "../../../../server/engine/plan/sizing-types.ts";
import { useSendPlan } from "../api/send-plan.ts";

interface SendDialogProps {
  plan: PlanView;
  option: HeaterOption;
  onClose: () => void;
  onSent: () => void;
}

/** One last look before the farmer gets the plan, and room for a few words. */
export function SendDialog({ plan, option, onClose, onSent }: SendDialogProps) {
  const sending = useSendPlan(plan.id);
  const [message, setMessage] = useState("");
  const dialog = useRef<HTMLDialogElement>(null);
  const id = useId();
  useEffect(() => {
    dialog.current?.showModal();
  }, []);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={`${id}-head`}
      onClose={onClose}
      className="m-auto w-[min(560px,calc(100vw-32px))] border-2 border-ink bg-sheet p-6 text-ink backdrop:bg-ink/50"
    >
      <form
        className="grid gap-3"
        onSubmit={(event) => {
          event.preventDefault();
          sending.mutate({ optionId: option.id, message: message.trim() }, { onSuccess: onSent });
        }}
      >
        <h2 id={`${id}-head`} className="m-0 font-sign text-xl font-extrabold">
          {`Send to ${plan.building.farmName} for review`}
        </h2>
        <p className="m-0">
          {"You put forward: "}
          <b>{option.title}</b>
          {". The farmer sees the plan in plain words and can approve, ask or decline."}
        </p>
        <label htmlFor={id} className="font-semibold">
          A few words to go with it
        </label>
        <textarea
          id={id}
          rows={4}
          maxLength={2000}
          value={message}
          onChange={(event) => setMessage(event.target.value)}
          className="rounded-control border-[1.5px] border-rule-strong bg-sheet p-2"
        />
        {sending.error ? (
          <p role="alert" className="m-0 border-l-4 border-redlead bg-redlead-tint p-2 font-semibold">
            {sending.error.message}
          </p>
        ) : null}
        <div className="flex flex-wrap gap-3">
          <button
            type="submit"
            disabled={sending.isPending}
            className="min-h-12 rounded-control bg-bottle px-5 font-bold text-on-bottle hover:bg-bottle-deep disabled:bg-trough disabled:text-ink-2"
          >
            {sending.isPending ? "Working…" : "Send"}
          </button>
          <button
            type="button"
            onClick={() => dialog.current?.close()}
            className="min-h-12 rounded-control border-2 border-rule-strong bg-sheet px-5 font-bold hover:bg-trough"
          >
            Not yet
          </button>
        </div>
      </form>
    </dialog>
  );
}
