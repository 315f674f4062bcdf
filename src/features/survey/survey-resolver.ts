import { zodResolver } from "@hookform/resolvers/zod";
import { surveySchema } from "../../../server/contracts/survey.ts";
import { surveyProblems } from "../../../server/contracts/survey-rules.ts";

/** The contract, and what two answers say against each other, in one pass. */
const wholeSurvey = surveySchema.superRefine((survey, context) => {
  for (const [path, message] of Object.entries(surveyProblems(survey))) {
    context.addIssue({ code: "custom", path: path.split("."), message });
  }
});

/** Checks a survey as the server does. In a file of its own: it brings the validation library along. */
export const surveyResolver = zodResolver(wholeSurvey);
