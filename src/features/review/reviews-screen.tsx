import { useQuery } from "@tanstack/react-query";
import { Link } from "react-router-dom";
import type { ReviewLine } from "../../../server/contracts/plans.ts";
import { PageState } from "../../components/page-state.tsx";
import { counted, dayAndClock } from "../../lib/format.ts";
import { reviewsQuery } from "./api/reviews-query.ts";
import { statusWords } from "./plain-words.ts";

function Line({ line }: { line: ReviewLine }) {
  return (
    <li
      className={`border-b border-rule ${line.waitsForMe ? "border-l-[6px] border-l-bottle" : "border-l-[6px] border-l-transparent"}`}
    >
      <Link
        to={`/plans/${line.planId}`}
        className="grid min-h-16 items-center gap-x-6 gap-y-1 bg-sheet px-4 py-3 text-ink no-underline hover:bg-trough md:grid-cols-[minmax(0,1.2fr)_180px_minmax(0,2fr)_auto]"
      >
        <span>
          <b className="block font-sign text-lg">{line.buildingName}</b>
          <span className="block text-sm text-ink-2">{`${line.farmName}, plan ${line.number}`}</span>
        </span>
        <span className={line.waitsForMe ? "font-bold" : ""}>{statusWords[line.status]}</span>
        <span className="truncate text-sm text-ink-2">{line.lastMessage ?? "No questions so far"}</span>
        <span className="text-sm whitespace-nowrap text-ink-2">{dayAndClock(line.changedAt)}</span>
      </Link>
    </li>
  );
}

function Group({ title, lines }: { title: string; lines: ReviewLine[] }) {
  if (lines.length === 0) return null;
  return (
    <section aria-label={title} className="mt-6">
      <h2 className="m-0 border-b-2 border-ink pb-1 font-sign text-lg font-bold">{title}</h2>
      <ul className="m-0 list-none p-0">
        {lines.map((line) => (
          <Line key={line.planId} line={line} />
        ))}
      </ul>
    </section>
  );
}

/** The plans a person takes part in: those that wait for this person first. */
export function ReviewsScreen() {
  const reviews = useQuery(reviewsQuery);
  if (reviews.isError && !reviews.data) {
    return <PageState kind="error" error={reviews.error} onRetry={() => void reviews.refetch()} />;
  }
  if (!reviews.data) return <PageState kind="loading" />;
  const waiting = reviews.data.filter((line) => line.waitsForMe);
  const others = reviews.data.filter((line) => !line.waitsForMe);
  return (
    <div className="mx-auto max-w-[1180px] px-4 py-6 md:px-8">
      <h1 className="m-0 font-sign text-2xl font-extrabold">
        {reviews.data.length === 0
          ? "No plans to review yet"
          : waiting.length === 0
            ? "Nothing waits for you"
            : `${counted(waiting.length, "plan")} ${waiting.length === 1 ? "waits" : "wait"} for you`}
      </h1>
      {reviews.data.length === 0 ? (
        <p className="max-w-[60ch]">A plan shows here once an adviser sends it to the farmer.</p>
      ) : null}
      <Group title="Waits for you" lines={waiting} />
      <Group title={waiting.length > 0 ? "All others" : "All plans"} lines={others} />
    </div>
  );
}
