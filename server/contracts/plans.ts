import { z } from "zod";
import type { PlanResult } from "../engine/plan/plan-types.ts";
import type { BuildingSummary, PlanStatus } from "./buildings.ts";
import { idSchema } from "./common.ts";
import { type Survey, surveySchema } from "./survey.ts";

export const planChoices = z.strictObject({
  returnPeriodYears: z.union([z.literal(10), z.literal(20), z.literal(50)]).default(20),
  everydayPercent: z.union([z.literal(99.6), z.literal(99)]).default(99.6),
});
export type PlanChoices = z.infer<typeof planChoices>;

export const createPlanRequest = z.object({
  params: z.object({ id: idSchema }),
  body: planChoices,
});

/** Works a survey out without keeping anything, so that a form can show what a change does. */
export const previewPlanRequest = z.object({
  params: z.object({ id: idSchema }),
  body: z.strictObject({ survey: surveySchema, choices: planChoices }),
});

export const sendPlanRequest = z.object({
  params: z.object({ id: idSchema }),
  body: z.strictObject({
    /** Which of the sizing's options the adviser puts forward. */
    optionId: z.string().max(60),
    message: z.string().trim().max(2000).default(""),
  }),
});

export const planAnswers = ["approve", "ask", "decline"] as const;
export type PlanAnswer = (typeof planAnswers)[number];

export const answerPlanRequest = z.object({
  params: z.object({ id: idSchema }),
  body: z
    .strictObject({ answer: z.enum(planAnswers), message: z.string().trim().max(2000).default("") })
    .refine((body) => body.answer !== "ask" || body.message.length > 0, {
      path: ["message"],
      message: "Write the question first.",
    }),
});

export const writeMessageRequest = z.object({
  params: z.object({ id: idSchema }),
  body: z.strictObject({
    message: z.string().trim().min(1, "Write something first.").max(2000, "At most 2000 letters."),
  }),
});

export interface PlanMessageView {
  id: string;
  authorName: string;
  authorRole: "advisor" | "farmer" | "manager";
  mine: boolean;
  text: string;
  /** Set when the message came with an answer. */
  answer: PlanAnswer | null;
  sentAt: string;
}

export interface PlanView {
  id: string;
  number: number;
  buildingId: string;
  building: BuildingSummary;
  status: PlanStatus;
  createdAt: string;
  createdBy: string;
  sentAt: string | null;
  answeredAt: string | null;
  answeredBy: string | null;
  /** The last day on which an answer may still be changed. */
  changeableUntil: string | null;
  outdated: boolean;
  choices: PlanChoices;
  proposedOptionId: string | null;
  /** Frozen at the moment the plan was worked out. */
  survey: Survey;
  result: PlanResult;
  messages: PlanMessageView[];
  advisor: { name: string; email: string };
  can: { send: boolean; answer: boolean; write: boolean };
}

/** A line of a person's list of reviews. */
export interface ReviewLine {
  planId: string;
  number: number;
  status: PlanStatus;
  buildingId: string;
  buildingName: string;
  farmName: string;
  waitsForMe: boolean;
  lastMessage: string | null;
  changedAt: string;
}
