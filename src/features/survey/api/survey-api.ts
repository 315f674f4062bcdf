import { queryOptions } from "@tanstack/react-query";
import type { Survey, SurveyView } from "../../../../server/contracts/survey.ts";
import { ApiError, api } from "../../../lib/api-client.ts";
import type { SaveOutcome } from "../survey-sync.ts";

const path = (buildingId: string) => `/api/buildings/${buildingId}/survey`;

/** The survey of a building. It is never refetched behind an open form. */
export function surveyQuery(buildingId: string) {
  return queryOptions({
    queryKey: ["buildings", buildingId, "survey"],
    queryFn: ({ signal }) => api.get<SurveyView>(path(buildingId), { signal }),
    staleTime: 0,
    refetchOnWindowFocus: false,
    refetchOnReconnect: false,
  });
}

export function fetchSurvey(buildingId: string): Promise<SurveyView> {
  return api.get<SurveyView>(path(buildingId));
}

/** Sends a survey and tells how it ended; it never throws. */
export async function saveSurvey(
  buildingId: string,
  body: { version: number; survey: Survey },
): Promise<SaveOutcome> {
  if (!navigator.onLine) return { kind: "offline" };
  try {
    return { kind: "saved", view: await api.put<SurveyView>(path(buildingId), body) };
  } catch (error) {
    if (!(error instanceof ApiError)) return { kind: "offline" };
    if (error.code === "stale") return { kind: "stale" };
    if (error.code === "invalid_input") {
      return { kind: "refused", message: error.message, fields: surveyFields(error.fields) };
    }
    return { kind: "failed", message: error.message };
  }
}

/** The server names fields from the request's root; the form names them from the survey's. */
function surveyFields(fields: Record<string, string>): Record<string, string> {
  return Object.fromEntries(
    Object.entries(fields).map(([field, words]) => [field.replace(/^(body\.)?(survey\.)?/, ""), words]),
  );
}
