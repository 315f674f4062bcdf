import { useQuery } from "@tanstack/react-query";
import { ArrowLeft, Mail, Printer } from "lucide-react";
import { Fragment, lazy, Suspense, useCallback, useState } from "react";
import { Link } from "react-router-dom";
import type { PlanView } from "../../../server/contracts/plans.ts";
import { FootBar } from "../../components/foot-bar.tsx";
import { Cautions } from "../../components/plan/cautions.tsx";
import { HatchSheet } from "../../components/section-drawing/hatches.tsx";
import { SectionNight } from "../../components/section-drawing/section-night.tsx";
import { sectionShape } from "../../components/section-drawing/section-shape.ts";
import { shellOf } from "../../components/section-drawing/survey-shell.ts";
import { day } from "../../lib/format.ts";
import { libraryQuery } from "../../lib/library-query.ts";
import { useUnits } from "../../lib/units.ts";
import { AnswerBox } from "./answer-box.tsx";
import { Granted } from "./granted.tsx";
import { HaveAndSuggest } from "./have-and-suggest.tsx";
import { NightSentence } from "./night-sentence.tsx";
import { changesForYou, managementSentences, notIncluded, statusWords } from "./plain-words.ts";
import { Talk } from "./talk.tsx";

/** Paper brings the charts along; they come after the page so that a phone need not wait for them. */
const loadPrintSheet = () => import("./print-sheet.tsx");
const PrintSheet = lazy(() => loadPrintSheet().then((module) => ({ default: module.PrintSheet })));

function Outdated({ plan }: { plan: PlanView }) {
  if (!plan.outdated) return null;
  return (
    <p role="status" className="m-0 border-b-2 border-straw bg-straw-tint px-4 py-3 md:px-10">
      <b>The survey was changed after this plan was worked out.</b> The figures below are those of{" "}
      {day(plan.createdAt)}; a new plan may say something else.
    </p>
  );
}

/** The page both sides look at; only the farmer of the farm is offered the answers. */
export function ReviewPage({ plan }: { plan: PlanView }) {
  const units = useUnits();
  const library = useQuery(libraryQuery);
  const [question, setQuestion] = useState<string | null>(null);
  const questionTaken = useCallback(() => setQuestion(null), []);
  const advisor = plan.advisor.name.split(" ")[0] ?? plan.advisor.name;
  const proposed = plan.result.sizing.options.find((option) => option.id === plan.proposedOptionId);
  const shape = sectionShape(plan.survey.shape);
  const coldest = plan.result.months.find((month) => month.month === plan.result.sizing.onceInYearsMonth);
  const holds = plan.result.sizing.verdictOnceInYears === "holds";
  const changes = changesForYou(plan, units);
  // Once answered, the answer is something to read and no longer the thing to do.
  const AnswerPlace = plan.status === "sent" || plan.status === "asked" ? FootBar : Fragment;
  return (
    <>
      <HatchSheet />
      <div className="print:hidden">
        <Outdated plan={plan} />
        <div className="text-[17px] leading-[1.6] lg:grid lg:grid-cols-[minmax(0,1fr)_490px] max-lg:pb-40">
          <article className="grid content-start gap-6 px-4 py-6 md:px-[60px]">
            <div>
              <p className="m-0 flex items-center gap-2 text-sm text-ink-2">
                <Link
                  to="/reviews"
                  aria-label="Back to all reviews"
                  className="-ml-2 flex size-11 items-center justify-center text-ink"
                >
                  <ArrowLeft aria-hidden="true" size={20} />
                </Link>
                {`Plan ${plan.number} from ${plan.advisor.name}, ${day(plan.sentAt ?? plan.createdAt)}. ${statusWords[plan.status]}.`}
              </p>
              <h1 className="m-0 font-sign text-[34px] leading-tight font-extrabold text-balance max-md:text-[29px]">
                {proposed
                  ? `${plan.building.name}: ${proposed.title}`
                  : `${plan.building.name}, ${plan.building.farmName}`}
              </h1>
              <NightSentence plan={plan} units={units} />
            </div>
            <HaveAndSuggest plan={plan} advisor={advisor} units={units} />
            {changes.length > 0 ? (
              <section aria-labelledby="changes-heading" className="border-t-2 border-ink pt-3">
                <h2 id="changes-heading" className="m-0 font-sign text-lg font-bold">
                  What it means for you
                </h2>
                <ul className="m-0 mt-1 list-disc pl-6">
                  {changes.map((change) => (
                    <li key={change}>{change}</li>
                  ))}
                </ul>
              </section>
            ) : null}
            <Granted
              sentences={managementSentences(plan.survey, library.data, units)}
              onContradict={
                plan.can.answer ? (subject) => setQuestion(`About ${subject}: that is not so. `) : undefined
              }
            />
            <section aria-labelledby="missing-heading">
              <h2 id="missing-heading" className="m-0 font-sign text-lg font-bold">
                What is not in this plan
              </h2>
              <ul className="m-0 mt-1 list-disc pl-6">
                {notIncluded.map((line) => (
                  <li key={line}>{line}</li>
                ))}
              </ul>
            </section>
            <Cautions survey={plan.survey} />
            <Talk plan={plan} partner={plan.can.answer ? advisor : "the farmer"} />
          </article>
          <aside aria-label="Answer" className="border-ink bg-sheet px-7 py-6 max-lg:px-4 lg:border-l-2">
            {plan.can.answer || plan.answeredAt ? (
              <AnswerPlace>
                <h2 className="m-0 mb-2 font-sign text-lg font-bold max-md:sr-only">
                  {plan.can.answer ? "Your answer" : "The farmer's answer"}
                </h2>
                <AnswerBox plan={plan} question={question} onQuestionTaken={questionTaken} />
              </AnswerPlace>
            ) : (
              <p className="m-0">{`${statusWords[plan.status]}. Only the farmer can answer.`}</p>
            )}
            {shape && coldest ? (
              <section aria-label="The house on that night" className="mt-6 border-t border-ink pt-3">
                <h2 className="m-0 font-sign text-base font-bold">Your house on that night</h2>
                <SectionNight
                  shape={shape}
                  shell={shellOf(plan.survey, library.data?.covers)}
                  system={units.system}
                  outsideC={coldest.climate.onceInYearsDesignC}
                  insideC={holds ? coldest.setpointNightC : plan.result.sizing.settlesAtOnceInYearsC}
                  cold={!holds}
                />
              </section>
            ) : null}
            <p className="m-0 mt-4 grid gap-1">
              <button
                type="button"
                onClick={() => void loadPrintSheet().then(() => window.print())}
                className="inline-flex min-h-11 items-center gap-2 justify-self-start font-semibold text-bottle underline underline-offset-4 hover:text-bottle-deep"
              >
                <Printer size={20} aria-hidden="true" />
                Print this plan
              </button>
              <a
                href={`mailto:${plan.advisor.email}`}
                className="inline-flex min-h-11 items-center gap-2 justify-self-start font-semibold text-bottle underline underline-offset-4 hover:text-bottle-deep"
              >
                <Mail size={20} aria-hidden="true" />
                {`Write to ${plan.advisor.name}`}
              </a>
            </p>
          </aside>
        </div>
      </div>
      <Suspense fallback={null}>
        <PrintSheet plan={plan} library={library.data} units={units} />
      </Suspense>
    </>
  );
}
