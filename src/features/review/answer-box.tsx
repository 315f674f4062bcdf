import { Check, MessageCircleQuestion, X } from "lucide-react";
import { useEffect, useId, useRef, useState } from "react";
import type { PlanAnswer, PlanView } from "../../../server/contracts/plans.ts";
import { day } from "../../lib/format.ts";
import { useAnswerPlan } from "./api/answer-plan.ts";
import { statusWords } from "./plain-words.ts";

interface AnswerBoxProps {
  plan: PlanView;
  /** A question begun elsewhere on the page, such as "About the screens: ". */
  question: string | null;
  onQuestionTaken: () => void;
}

const declineReasons = ["It costs more than I can spend.", "A figure is wrong.", "Not this winter."];

function firstName(name: string): string {
  return name.split(" ")[0] ?? name;
}

const answerWords: Record<PlanAnswer, { title: string; confirm: string; label: string; hint: string }> = {
  approve: {
    title: "Approve",
    confirm: "Yes, approve",
    label: "Anything to add? You may leave this empty.",
    hint: "You have 7 days to change your mind.",
  },
  ask: {
    title: "Ask",
    confirm: "Send the question",
    label: "Your question",
    hint: "The answer comes back here.",
  },
  decline: {
    title: "Decline",
    confirm: "Yes, decline",
    label: "Tell us why if you like.",
    hint: "Nothing is ordered.",
  },
};

function Choice({
  answer,
  advisor,
  onChoose,
}: {
  answer: PlanAnswer;
  advisor: string;
  onChoose: (answer: PlanAnswer) => void;
}) {
  const Icon = answer === "approve" ? Check : answer === "ask" ? MessageCircleQuestion : X;
  const look = {
    approve: "border-bottle bg-bottle text-on-bottle hover:bg-bottle-deep max-md:col-span-2",
    ask: "border-rule-strong bg-sheet text-ink hover:bg-trough",
    decline: "border-redlead bg-sheet text-redlead hover:bg-redlead-tint",
  }[answer];
  const words = answerWords[answer];
  return (
    <button
      type="button"
      onClick={() => onChoose(answer)}
      className={`flex min-h-[84px] items-center gap-4 rounded-control border-2 px-4 text-left max-md:min-h-[58px] max-md:justify-center ${look}`}
    >
      <Icon size={28} aria-hidden="true" className="flex-none" />
      <span>
        <b className="block font-sign text-[21px] max-md:text-lg">
          {answer === "ask" ? `Ask ${advisor}` : words.title}
        </b>
        <span className={`block text-sm max-md:sr-only ${answer === "approve" ? "" : "text-ink"}`}>
          {words.hint}
        </span>
      </span>
    </button>
  );
}

/** What has been answered so far, and until when it can be changed. */
function Given({ plan, onChange }: { plan: PlanView; onChange: () => void }) {
  const changeable = plan.can.answer && plan.changeableUntil !== null;
  return (
    <div className="border-t-2 border-ink pt-3">
      <p className="m-0 font-sign text-lg font-bold">{statusWords[plan.status]}</p>
      <p className="m-0 text-sm">
        {plan.answeredBy ? `By ${plan.answeredBy}` : ""}
        {plan.answeredAt ? ` on ${day(plan.answeredAt)}. ` : ""}
        {changeable && plan.changeableUntil ? `It can be changed until ${day(plan.changeableUntil)}.` : ""}
      </p>
      {changeable ? (
        <button
          type="button"
          onClick={onChange}
          className="mt-2 min-h-11 rounded-control border-2 border-rule-strong bg-sheet px-4 font-bold hover:bg-trough"
        >
          Change the answer
        </button>
      ) : null}
    </div>
  );
}

/** Approve, ask or decline: one press opens the words, a second one sends them. */
export function AnswerBox({ plan, question, onQuestionTaken }: AnswerBoxProps) {
  const answering = useAnswerPlan(plan.id);
  const answered = plan.status === "approved" || plan.status === "declined";
  const [changing, setChanging] = useState(false);
  const [chosen, setChosen] = useState<PlanAnswer | null>(null);
  const [message, setMessage] = useState("");
  const box = useRef<HTMLTextAreaElement>(null);
  const id = useId();
  const advisor = firstName(plan.advisor.name);

  useEffect(() => {
    if (question === null) return;
    setChosen("ask");
    setMessage(question);
    onQuestionTaken();
  }, [question, onQuestionTaken]);
  useEffect(() => {
    if (chosen) box.current?.focus();
  }, [chosen]);

  if (answered && !changing) return <Given plan={plan} onChange={() => setChanging(true)} />;
  if (!plan.can.answer) return null;
  if (!chosen) {
    return (
      <div className="grid gap-3 max-md:grid-cols-2 max-md:gap-2.5">
        {(["approve", "ask", "decline"] as const).map((answer) => (
          <Choice key={answer} answer={answer} advisor={advisor} onChoose={setChosen} />
        ))}
      </div>
    );
  }
  const words = answerWords[chosen];
  const send = () =>
    answering.mutate(
      { answer: chosen, message: message.trim() },
      {
        onSuccess: () => {
          setChosen(null);
          setMessage("");
          setChanging(false);
        },
      },
    );
  return (
    <form
      onSubmit={(event) => {
        event.preventDefault();
        send();
      }}
      className="grid gap-2"
    >
      <p className="m-0 font-sign text-lg font-bold">{chosen === "ask" ? `Ask ${advisor}` : words.title}</p>
      <p className="m-0 text-sm">{words.hint}</p>
      {chosen === "decline" ? (
        <div className="flex flex-wrap gap-2">
          {declineReasons.map((reason) => (
            <button
              key={reason}
              type="button"
              onClick={() => setMessage(message ? `${message} ${reason}` : reason)}
              className="min-h-11 rounded-control border-[1.5px] border-rule-strong bg-sheet px-3 text-sm hover:bg-trough"
            >
              {reason}
            </button>
          ))}
        </div>
      ) : null}
      <label htmlFor={id} className="text-sm">
        {words.label}
      </label>
      <textarea
        id={id}
        ref={box}
        rows={3}
        maxLength={2000}
        required={chosen === "ask"}
        value={message}
        onChange={(event) => setMessage(event.target.value)}
        className="rounded-control border-[1.5px] border-rule-strong bg-sheet p-2"
      />
      {answering.error ? (
        <p role="alert" className="m-0 text-sm font-semibold text-redlead">
          {answering.error.message}
        </p>
      ) : null}
      <div className="flex flex-wrap gap-3">
        <button
          type="submit"
          disabled={answering.isPending || (chosen === "ask" && message.trim() === "")}
          className={`min-h-12 rounded-control px-5 font-bold disabled:bg-trough disabled:text-ink-2 ${chosen === "decline" ? "bg-redlead text-on-redlead" : "bg-bottle text-on-bottle hover:bg-bottle-deep"}`}
        >
          {answering.isPending ? "Working…" : words.confirm}
        </button>
        <button
          type="button"
          onClick={() => setChosen(null)}
          className="min-h-12 rounded-control border-2 border-rule-strong bg-sheet px-5 font-bold hover:bg-trough"
        >
          Back
        </button>
      </div>
    </form>
  );
}
