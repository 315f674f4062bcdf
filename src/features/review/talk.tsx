import { Send } from "lucide-react";
import { useId, useState } from "react";
import type { PlanMessageView, PlanView } from "../../../server/contracts/plans.ts";
import { dayAndClock } from "../../lib/format.ts";
import { useWriteMessage } from "./api/write-message.ts";

const answered: Record<NonNullable<PlanMessageView["answer"]>, string> = {
  approve: "approved",
  ask: "asked",
  decline: "declined",
};

function Message({ message }: { message: PlanMessageView }) {
  const who = message.mine ? "You" : message.authorName;
  return (
    <li className={`border-b border-rule py-2 ${message.mine ? "pl-6 md:pl-16" : "pr-6 md:pr-16"}`}>
      <p className="m-0 text-sm font-semibold text-ink-2">
        {`${who}, ${dayAndClock(message.sentAt)}`}
        {message.answer ? `, ${answered[message.answer]}` : ""}
      </p>
      {message.text ? <p className="m-0 break-words whitespace-pre-line">{message.text}</p> : null}
    </li>
  );
}

/** The questions and answers about a plan, kept beside it. */
export function Talk({ plan, partner }: { plan: PlanView; partner: string }) {
  const writing = useWriteMessage(plan.id);
  const [words, setWords] = useState("");
  const id = useId();
  return (
    <section aria-labelledby={`${id}-head`}>
      <h2 id={`${id}-head`} className="m-0 font-sign text-lg font-bold">
        {plan.messages.length === 0 ? "No questions so far" : "Questions so far"}
      </h2>
      <ol className="m-0 list-none p-0">
        {plan.messages.map((message) => (
          <Message key={message.id} message={message} />
        ))}
      </ol>
      {plan.can.write ? (
        <form
          className="mt-3 flex items-end gap-2 print:hidden"
          onSubmit={(event) => {
            event.preventDefault();
            if (words.trim() === "") return;
            writing.mutate(words.trim(), { onSuccess: () => setWords("") });
          }}
        >
          <label className="flex-1" htmlFor={id}>
            <span className="sr-only">{`Write to ${partner}`}</span>
            <textarea
              id={id}
              rows={2}
              maxLength={2000}
              value={words}
              placeholder={`Write to ${partner}`}
              onChange={(event) => setWords(event.target.value)}
              className="block w-full rounded-control border-[1.5px] border-rule-strong bg-sheet p-2 placeholder:text-ink-2"
            />
          </label>
          <button
            type="submit"
            disabled={writing.isPending || words.trim() === ""}
            className="inline-flex min-h-12 items-center gap-2 rounded-control border-2 border-bottle bg-sheet px-4 font-bold text-bottle hover:bg-bottle-tint disabled:border-rule disabled:bg-trough disabled:text-ink-2"
          >
            <Send size={18} aria-hidden="true" />
            {writing.isPending ? "Working…" : "Send"}
          </button>
        </form>
      ) : null}
      {writing.error ? (
        <p role="alert" className="m-0 text-sm font-semibold text-redlead">
          {`${writing.error.message} Your words are still here.`}
        </p>
      ) : null}
    </section>
  );
}
