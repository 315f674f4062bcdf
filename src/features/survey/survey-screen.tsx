import { useQuery } from "@tanstack/react-query";
import { useParams } from "react-router-dom";
import { PageState } from "../../components/page-state.tsx";
import { buildingQuery } from "../../lib/building-query.ts";
import { libraryQuery } from "../../lib/library-query.ts";
import { surveyQuery } from "./api/survey-api.ts";
import { SurveyForm } from "./survey-form.tsx";

/** The survey of one building: its questions, the house drawn as they are answered, and where the answers are. */
export function SurveyScreen() {
  const { buildingId = "" } = useParams();
  const building = useQuery(buildingQuery(buildingId));
  const survey = useQuery(surveyQuery(buildingId));
  const library = useQuery(libraryQuery);
  const failed = [building, survey, library].find((query) => query.isError && query.data === undefined);
  if (failed) {
    return (
      <PageState
        kind="error"
        error={failed.error}
        onRetry={() => {
          void building.refetch();
          void survey.refetch();
          void library.refetch();
        }}
      />
    );
  }
  if (!building.data || !survey.data || !library.data) return <PageState kind="loading" />;
  return <SurveyForm key={buildingId} building={building.data} view={survey.data} library={library.data} />;
}
