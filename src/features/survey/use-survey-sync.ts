import { useCallback, useEffect, useRef, useState } from "react";
import type { UseFormReturn } from "react-hook-form";
import type { Survey, SurveyView } from "../../../server/contracts/survey.ts";
import { countChanges } from "./answers.ts";
import { fetchSurvey, saveSurvey } from "./api/survey-api.ts";
import { dropDraft, keepDraft } from "./draft-store.ts";
import type { SyncState } from "./survey-sync.ts";

const QUIET_MS = 1500;
const RETRY_MS = 20_000;

interface SurveySync {
  state: SyncState;
  /** Sends what is pending at once; true when the server has everything. */
  flush: () => Promise<boolean>;
  keepMine: () => void;
  takeTheirs: () => void;
  refused: Record<string, string>;
  forget: (path: string) => void;
  version: number;
}

/**
 * Keeps a survey form and the server together. Every change is written to the device first,
 * sent after a short quiet time, and never overwrites somebody else's save without asking.
 */
export function useSurveySync(
  view: SurveyView,
  form: UseFormReturn<Survey>,
  startsInConflict: boolean,
  onSaved: (view: SurveyView) => void,
): SurveySync {
  const { buildingId } = view;
  const base = useRef({ version: view.version, survey: view.survey });
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const running = useRef<Promise<boolean> | null>(null);
  const alive = useRef(true);
  const conflict = useRef(startsInConflict);
  const [version, setVersion] = useState(view.version);
  const [refused, setRefused] = useState<Record<string, string>>({});
  const [state, setState] = useState<SyncState>(
    startsInConflict ? { kind: "stale", theirs: view } : { kind: "saved", at: view.savedAt },
  );
  const show = useCallback((next: SyncState) => {
    if (alive.current) setState(next);
  }, []);

  const keep = useCallback((): { changes: number; kept: boolean; keptAt: string } => {
    const survey = form.getValues();
    const changes = countChanges(base.current.survey, survey);
    const keptAt = new Date().toISOString();
    if (changes === 0) {
      dropDraft(buildingId);
      return { changes, kept: true, keptAt };
    }
    return {
      changes,
      keptAt,
      kept: keepDraft(buildingId, { version: base.current.version, survey, changes, keptAt }),
    };
  }, [buildingId, form]);

  const attempt = useCallback(async (): Promise<boolean> => {
    if (conflict.current) return false;
    const { changes, kept, keptAt } = keep();
    if (changes === 0) return true;
    const valid = await form.trigger();
    if (!valid) {
      show({ kind: "invalid", changes });
      return false;
    }
    show({ kind: "saving" });
    const survey = structuredClone(form.getValues());
    const outcome = await saveSurvey(buildingId, { version: base.current.version, survey });
    switch (outcome.kind) {
      case "saved": {
        base.current = { version: outcome.view.version, survey };
        setVersion(outcome.view.version);
        setRefused({});
        onSaved(outcome.view);
        const left = keep();
        if (left.changes === 0) show({ kind: "saved", at: outcome.view.savedAt });
        return left.changes === 0;
      }
      case "offline":
        show(kept ? { kind: "onDevice", changes, keptAt } : { kind: "failed", message: "", changes, kept });
        return false;
      case "stale": {
        conflict.current = true;
        show({ kind: "stale", theirs: await fetchSurvey(buildingId).catch(() => null) });
        return false;
      }
      case "refused":
        setRefused(outcome.fields);
        show({ kind: "failed", message: outcome.message, changes, kept });
        return false;
      case "failed":
        show({ kind: "failed", message: outcome.message, changes, kept });
        return false;
    }
  }, [buildingId, form, keep, onSaved, show]);

  const flush = useCallback(async (): Promise<boolean> => {
    clearTimeout(timer.current);
    if (running.current) await running.current;
    running.current = attempt().finally(() => {
      running.current = null;
    });
    return running.current;
  }, [attempt]);

  useEffect(() => {
    alive.current = true;
    const watching = form.watch(() => {
      keep();
      clearTimeout(timer.current);
      if (!conflict.current) timer.current = setTimeout(() => void flush(), QUIET_MS);
    });
    const again = () => void flush();
    const retry = setInterval(() => {
      if (countChanges(base.current.survey, form.getValues()) > 0 && !running.current) again();
    }, RETRY_MS);
    window.addEventListener("online", again);
    const leaving = () => {
      keep();
    };
    window.addEventListener("pagehide", leaving);
    return () => {
      alive.current = false;
      watching.unsubscribe();
      clearTimeout(timer.current);
      clearInterval(retry);
      window.removeEventListener("online", again);
      window.removeEventListener("pagehide", leaving);
      keep();
    };
  }, [flush, form, keep]);

  useEffect(() => {
    // A draft restored from the device is sent as soon as the form stands.
    if (!startsInConflict && countChanges(base.current.survey, form.getValues()) > 0) void flush();
  }, [flush, form, startsInConflict]);

  const keepMine = useCallback(() => {
    if (state.kind !== "stale" || !state.theirs) return;
    base.current = { version: state.theirs.version, survey: state.theirs.survey };
    conflict.current = false;
    void flush();
  }, [flush, state]);

  const takeTheirs = useCallback(() => {
    if (state.kind !== "stale" || !state.theirs) return;
    const { theirs } = state;
    base.current = { version: theirs.version, survey: theirs.survey };
    conflict.current = false;
    form.reset(theirs.survey);
    dropDraft(buildingId);
    setVersion(theirs.version);
    onSaved(theirs);
    show({ kind: "saved", at: theirs.savedAt });
  }, [buildingId, form, onSaved, show, state]);

  const forget = useCallback((path: string) => {
    setRefused((before) => {
      if (!(path in before)) return before;
      const { [path]: _gone, ...rest } = before;
      return rest;
    });
  }, []);

  return { state, flush, keepMine, takeTheirs, refused, forget, version };
}
