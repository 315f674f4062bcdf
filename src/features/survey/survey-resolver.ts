import { zodResolver } from "@hookform/resolvers/zod";
import { surveySchema } from "../../../server/contracts/survey.ts";

/** Checks a survey by the contract the server uses. In a file of its own: it brings the validation library along. */
export const surveyResolver = zodResolver(surveySchema);
