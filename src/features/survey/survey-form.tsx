import { useQueryClient } from "@tanstack/react-query";
import { useCallback, useMemo, useState } from "react";
import { FormProvider, useForm, useWatch } from "react-hook-form";
import { useNavigate, useSearchParams } from "react-router-dom";
import type { BuildingView } from "../../../server/contracts/buildings.ts";
import type { LibraryView } from "../../../server/contracts/library.ts";
import type { Origin } from "../../../server/contracts/quantity.ts";
import type { Survey, SurveyView } from "../../../server/contracts/survey.ts";
import { Button } from "../../components/button.tsx";
import { BuildingHead } from "../../components/plan/building-head.tsx";
import { HatchSheet } from "../../components/section-drawing/hatches.tsx";
import { useUnits } from "../../lib/units.ts";
import { surveyQuery } from "./api/survey-api.ts";
import { useWorkOut } from "./api/work-out.ts";
import { readDraft } from "./draft-store.ts";
import { errorPaths } from "./error-paths.ts";
import { SurveyFormContext } from "./form-context.ts";
import { SectionRail, SectionSteps } from "./section-rail.tsx";
import { SectionBody } from "./sections/section-body.tsx";
import { type SectionId, sectionIds, sectionOfPath } from "./sections/section-list.ts";
import { SurveyDrawing } from "./survey-drawing.tsx";
import { Refusal, RestoredNote, StaleChoice } from "./survey-notes.tsx";
import { startFrom } from "./survey-sync.ts";
import { SyncStatus } from "./sync-status.tsx";
import { useSurveySync } from "./use-survey-sync.ts";

interface SurveyFormProps {
  building: BuildingView;
  view: SurveyView;
  library: LibraryView;
}

/** Loaded on first use, so that the validation library stays out of the first chunk. */
const lazyResolver: Parameters<typeof useForm<Survey>>[0] = {
  resolver: async (values, context, options) => {
    const { surveyResolver } = await import("./survey-resolver.ts");
    return surveyResolver(values, context, options);
  },
};

/** Questions at the left, the house at the right; saved by itself. */
export function SurveyForm({ building, view, library }: SurveyFormProps) {
  const units = useUnits();
  const client = useQueryClient();
  const navigate = useNavigate();
  const [start] = useState(() => startFrom(view, readDraft(view.buildingId)));
  const [dismissed, setDismissed] = useState(false);
  const form = useForm<Survey>({ ...lazyResolver, defaultValues: start.survey, mode: "onChange" });
  const onSaved = useCallback(
    (saved: SurveyView) => {
      client.setQueryData(surveyQuery(building.id).queryKey, saved);
      void client.invalidateQueries({ queryKey: ["buildings"], refetchType: "none" });
      void client.invalidateQueries({ queryKey: ["buildings", building.id], exact: true });
    },
    [client, building.id],
  );
  const sync = useSurveySync(view, form, start.conflict, onSaved);
  const workOut = useWorkOut(building.id);
  const [params, setParams] = useSearchParams();
  const current: SectionId = sectionIds.find((id) => id === params.get("part")) ?? "shape";
  const [active, setActive] = useState<string | null>(null);
  const [typedOrigin, setTypedOrigin] = useState<Origin>("measured");
  const survey = useWatch({ control: form.control }) as Survey;
  const disabled = !view.can.update;
  const problems = [...errorPaths(form.formState.errors), ...Object.keys(sync.refused)];
  const withProblems = new Set(problems.map(sectionOfPath));

  const go = (id: SectionId) => {
    setParams((before) => {
      const next = new URLSearchParams(before);
      next.set("part", id);
      return next;
    });
    setActive(null);
    window.scrollTo({ top: 0 });
    void sync.flush();
  };
  const compute = async () => {
    const kept = await sync.flush();
    if (!kept) return;
    workOut.mutate(undefined, { onSuccess: () => navigate(`/buildings/${building.id}/heat`) });
  };
  const context = useMemo(
    () => ({
      control: form.control,
      library,
      system: units.system,
      disabled,
      typedOrigin,
      setTypedOrigin,
      active,
      setActive,
      refused: sync.refused,
      forget: sync.forget,
    }),
    [form.control, library, units.system, disabled, typedOrigin, active, sync.refused, sync.forget],
  );
  const action = building.can.plan ? (
    <Button busy={workOut.isPending} onClick={() => void compute()} className="min-w-44">
      Work out the heat
    </Button>
  ) : null;

  return (
    <FormProvider {...form}>
      <SurveyFormContext value={context}>
        <HatchSheet />
        <BuildingHead
          building={building}
          units={units}
          status={<SyncStatus state={sync.state} />}
          action={action}
          actionAtFoot
        />
        {sync.state.kind === "stale" ? (
          <StaleChoice theirs={sync.state.theirs} onMine={sync.keepMine} onTheirs={sync.takeTheirs} />
        ) : null}
        {start.restored && !dismissed && sync.state.kind !== "stale" ? (
          <RestoredNote restored={start.restored} onClose={() => setDismissed(true)} />
        ) : null}
        {workOut.error ? <Refusal message={workOut.error.message} /> : null}
        {disabled ? (
          <p className="m-0 border-b border-rule bg-trough px-4 py-2 text-sm">
            You may read this survey but not change it.
          </p>
        ) : null}
        <div className="md:grid md:grid-cols-[204px_minmax(0,580px)_minmax(0,1fr)] max-lg:md:grid-cols-[180px_minmax(0,1fr)]">
          <SectionRail survey={survey} current={current} withProblems={withProblems} onGo={go} />
          <div className="flex min-w-0 flex-col bg-sheet max-md:pb-24">
            <SectionSteps current={current} />
            <div className="sticky top-0 z-2 border-b border-rule-strong bg-sheet lg:hidden">
              {current === "shape" || current === "cover" ? (
                <SurveyDrawing
                  survey={survey}
                  covers={library.covers}
                  active={active}
                  units={units}
                  layout="phone"
                />
              ) : null}
            </div>
            <SectionBody current={current} onGo={go} lastAction={action} />
          </div>
          <aside
            aria-label="The house as drawn from these answers"
            className="border-l-2 border-ink p-6 max-lg:col-span-full max-lg:border-t-2 max-lg:border-l-0 max-md:hidden"
          >
            <SurveyDrawing
              survey={survey}
              covers={library.covers}
              active={active}
              units={units}
              layout="wide"
            />
          </aside>
        </div>
      </SurveyFormContext>
    </FormProvider>
  );
}
