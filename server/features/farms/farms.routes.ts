import { z } from "zod";
import { assignAdvisorRequest, createFarmRequest, updateFarmRequest } from "../../contracts/farms.ts";
import { route } from "../../http/route.ts";
import * as farms from "./farms.controller.ts";

export const farmRoutes = [
  route({
    method: "get",
    path: "/api/farms",
    summary: "Farms I may see",
    schema: z.object({}),
    run: farms.listFarms,
  }),
  route({
    method: "post",
    path: "/api/farms",
    summary: "Add a farm",
    status: 201,
    schema: createFarmRequest,
    run: farms.createFarm,
  }),
  route({
    method: "get",
    path: "/api/farms/:id",
    summary: "One farm",
    schema: farms.farmRequest,
    run: farms.readFarm,
  }),
  route({
    method: "patch",
    path: "/api/farms/:id",
    summary: "Change a farm",
    schema: updateFarmRequest,
    run: farms.updateFarm,
  }),
  route({
    method: "delete",
    path: "/api/farms/:id",
    summary: "Remove a farm with all its buildings",
    status: 204,
    schema: farms.farmRequest,
    run: farms.deleteFarm,
  }),
  route({
    method: "post",
    path: "/api/farms/:id/advisors",
    summary: "Assign an adviser",
    schema: assignAdvisorRequest,
    run: farms.assignAdvisor,
  }),
  route({
    method: "delete",
    path: "/api/farms/:id/advisors/:personId",
    summary: "Release an adviser",
    status: 204,
    schema: farms.unassignRequest,
    run: farms.unassignAdvisor,
  }),
];
