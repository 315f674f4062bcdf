import { z } from "zod";
import {
  answerPlanRequest,
  createPlanRequest,
  previewPlanRequest,
  sendPlanRequest,
  writeMessageRequest,
} from "../../contracts/plans.ts";
import { route } from "../../http/route.ts";
import * as plans from "./plans.controller.ts";
import { listReviews } from "./reviews.controller.ts";

const one = plans.planRequest;

export const planRoutes = [
  route({
    method: "post",
    path: "/api/buildings/:id/plans",
    summary: "Work out and keep a plan",
    status: 201,
    schema: createPlanRequest,
    run: plans.createPlan,
  }),
  route({
    method: "post",
    path: "/api/buildings/:id/preview",
    summary: "Work out a survey without keeping anything",
    schema: previewPlanRequest,
    run: plans.previewPlan,
  }),
  route({
    method: "get",
    path: "/api/buildings/:id/plans",
    summary: "Plans of a building, newest first",
    schema: one,
    run: plans.listPlans,
  }),
  route({
    method: "get",
    path: "/api/plans/:id",
    summary: "One plan, frozen",
    schema: one,
    run: plans.readPlan,
  }),
  route({
    method: "post",
    path: "/api/plans/:id/send",
    summary: "Send a plan to the farmer",
    schema: sendPlanRequest,
    run: plans.sendPlan,
  }),
  route({
    method: "post",
    path: "/api/plans/:id/answer",
    summary: "Approve, ask or decline",
    schema: answerPlanRequest,
    run: plans.answerPlan,
  }),
  route({
    method: "post",
    path: "/api/plans/:id/messages",
    summary: "Write about a plan",
    schema: writeMessageRequest,
    run: plans.writeMessage,
  }),
  route({
    method: "get",
    path: "/api/reviews",
    summary: "Plans sent on my farms",
    schema: z.object({}),
    run: listReviews,
  }),
];
