import { useState } from "react";
import { Link, useNavigate, useSearchParams } from "react-router-dom";
import { BuildingHead } from "../../../components/plan/building-head.tsx";
import { Cautions } from "../../../components/plan/cautions.tsx";
import { headline } from "../../../components/plan/plan-sentences.ts";
import { WarningList } from "../../../components/plan/warning-list.tsx";
import { day } from "../../../lib/format.ts";
import type { LoadedPlan } from "../latest-plan.tsx";
import { SizingFacts } from "./facts.tsx";
import { NeedChart } from "./need-chart.tsx";
import { OptionList } from "./option-list.tsx";
import { SendDialog } from "./send-dialog.tsx";

/** Need against what is fitted at the left, the choice of heaters at the right. */
export function SizingPage({ building, plan, units }: LoadedPlan) {
  const { result } = plan;
  const { options } = result.sizing;
  const navigate = useNavigate();
  const [params, setParams] = useSearchParams();
  const [sending, setSending] = useState(false);
  const wanted = params.get("option") ?? plan.proposedOptionId;
  const chosen =
    options.find((option) => option.id === wanted) ??
    options.find((option) => option.holdsOnceInYears) ??
    options[0] ??
    null;
  const blocking = result.warnings.filter((warning) => warning.severity === "block");
  const words = headline(building.name, result, units);
  const sent = plan.status !== "draft";
  const action = sent ? (
    <Link
      to={`/plans/${plan.id}`}
      className="inline-flex min-h-10 items-center rounded-control bg-bottle px-4 font-bold text-on-bottle no-underline hover:bg-bottle-deep pointer-coarse:min-h-12"
    >
      Open the review
    </Link>
  ) : plan.can.send && chosen ? (
    <button
      type="button"
      disabled={blocking.length > 0}
      aria-describedby={blocking.length > 0 ? "why-not-sent" : undefined}
      onClick={() => setSending(true)}
      className="min-h-10 rounded-control bg-bottle px-4 font-bold text-on-bottle hover:bg-bottle-deep disabled:bg-trough disabled:text-ink-2 pointer-coarse:min-h-12"
    >
      {`Send to ${building.farmName} for review`}
    </button>
  ) : null;
  return (
    <>
      <BuildingHead
        building={building}
        units={units}
        status={sent && plan.sentAt ? `Sent ${day(plan.sentAt)}` : `Plan ${plan.number}`}
        action={action}
      />
      {blocking.length > 0 && !sent ? (
        <p id="why-not-sent" className="m-0 border-b-2 border-redlead bg-redlead-tint px-4 py-2 text-sm">
          <b>This plan cannot be sent yet. </b>
          {blocking.map((warning) => warning.message).join(" ")}
        </p>
      ) : null}
      <div className="border-b border-rule-strong bg-sheet px-4 py-4">
        <p className="m-0 font-sign text-xl font-bold">{words.first}</p>
        <p className="m-0 max-w-[100ch]">{words.second}</p>
      </div>
      <div className="xl:grid xl:grid-cols-[minmax(0,2fr)_minmax(0,1fr)]">
        <div className="grid min-w-0 content-start gap-6 p-4">
          <NeedChart
            result={result}
            chosen={chosen}
            units={units}
            fileName={`${building.name.toLowerCase().replace(/[^a-z0-9]+/g, "-")}-need-by-month.csv`}
          />
          <div className="grid gap-6 border-t border-ink pt-4 lg:grid-cols-2">
            <SizingFacts plan={plan} units={units} />
            <Cautions survey={plan.survey} />
          </div>
        </div>
        <div className="min-w-0 border-ink bg-sheet max-xl:border-t-2 xl:border-l-2">
          <div className="flex flex-wrap items-baseline justify-between gap-x-4 border-b-2 border-ink px-4 py-3">
            <h2 className="m-0 font-sign text-lg font-bold">Choose the heaters</h2>
            <span className="text-sm text-ink-2">
              {`the line marks the ${units.heat(result.sizing.onceInYearsRequiredW)} needed`}
            </span>
          </div>
          {result.sizing.noHeaterReason ? (
            <p className="m-0 p-4">{result.sizing.noHeaterReason}</p>
          ) : options.length === 0 ? (
            <p className="m-0 p-4">No choice of heaters could be worked out; see the warnings.</p>
          ) : (
            <OptionList
              result={result}
              chosenId={chosen?.id ?? null}
              onChoose={(id) =>
                setParams(
                  (before) => {
                    const next = new URLSearchParams(before);
                    next.set("option", id);
                    return next;
                  },
                  { replace: true, preventScrollReset: true },
                )
              }
              units={units}
            />
          )}
          <p className="m-0 px-4 py-2 text-xs text-ink-2">
            Sizes are heat given to the house, in generic steps of the trade.
          </p>
          <div className="px-4">
            <WarningList warnings={result.warnings} />
          </div>
        </div>
      </div>
      {sending && chosen ? (
        <SendDialog
          plan={plan}
          option={chosen}
          onClose={() => setSending(false)}
          onSent={() => navigate(`/plans/${plan.id}`)}
        />
      ) : null}
    </>
  );
}
