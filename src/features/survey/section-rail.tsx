import type { Survey } from "../../../server/contracts/survey.ts";
import { answeredIn } from "./answers.ts";
import { type SectionId, surveySections } from "./sections/section-list.ts";

interface SectionRailProps {
  survey: Survey;
  current: SectionId;
  withProblems: Set<SectionId>;
  onGo: (id: SectionId) => void;
}

/** The seven groups of questions, each with how many answers somebody gave. */
export function SectionRail({ survey, current, withProblems, onGo }: SectionRailProps) {
  const counts = surveySections.map((section) => answeredIn(section.parts(survey)));
  const missing = counts.reduce((sum, count) => sum + count.questions - count.answered, 0);
  return (
    <nav aria-label="Groups of questions" className="border-r border-rule max-md:hidden">
      <ol className="m-0 list-none p-0 py-3">
        {surveySections.map((section, i) => {
          const count = counts[i] ?? { answered: 0, questions: 0 };
          const here = section.id === current;
          const share = count.questions === 0 ? 1 : count.answered / count.questions;
          return (
            <li key={section.id}>
              <button
                type="button"
                aria-current={here ? "step" : undefined}
                onClick={() => onGo(section.id)}
                className={`flex min-h-14 w-full items-center gap-3 px-4 py-2 text-left ${here ? "bg-ink text-sheet" : "hover:bg-trough"}`}
              >
                <svg width="9" height="36" aria-hidden="true" className="flex-none">
                  <rect
                    x=".75"
                    y=".75"
                    width="7.5"
                    height="34.5"
                    fill="none"
                    stroke="currentColor"
                    strokeWidth="1.5"
                  />
                  <rect y={36 * (1 - share)} width="9" height={36 * share} fill="currentColor" />
                </svg>
                <span>
                  <span className={`block ${here ? "font-bold" : ""}`}>{section.title}</span>
                  <span className="block text-xs">
                    {`${count.answered} of ${count.questions}`}
                    {withProblems.has(section.id) ? <b>, look again</b> : null}
                  </span>
                </span>
              </button>
            </li>
          );
        })}
      </ol>
      <p className="m-0 px-4 py-2 text-xs text-ink-2">
        {missing === 0
          ? "Nothing rests on a typical value."
          : `${missing} ${missing === 1 ? "answer is" : "answers are"} typical values. The plan uses them and says so.`}
      </p>
    </nav>
  );
}

/** On the phone: which group this is, and seven bars. */
export function SectionSteps({ current }: { current: SectionId }) {
  const index = surveySections.findIndex((section) => section.id === current);
  return (
    <div className="border-b border-rule-strong px-4 py-2 md:hidden">
      <p className="m-0 flex justify-between font-bold">
        <span>{surveySections[index]?.title}</span>
        <span>{`${index + 1} of ${surveySections.length}`}</span>
      </p>
      <div aria-hidden="true" className="mt-1 flex gap-1.5">
        {surveySections.map((section, i) => (
          <span
            key={section.id}
            className={`h-2 flex-1 border border-ink ${i <= index ? "bg-ink" : "bg-transparent"}`}
          />
        ))}
      </div>
    </div>
  );
}
