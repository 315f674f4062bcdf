import { z } from "zod";
import { createBuildingRequest, updateBuildingRequest } from "../../contracts/buildings.ts";
import { saveSurveyRequest } from "../../contracts/survey.ts";
import { route } from "../../http/route.ts";
import * as buildings from "./buildings.controller.ts";

const one = buildings.buildingRequest;

export const buildingRoutes = [
  route({
    method: "get",
    path: "/api/buildings",
    summary: "Buildings I may open",
    schema: z.object({}),
    run: buildings.listBuildings,
  }),
  route({
    method: "post",
    path: "/api/farms/:id/buildings",
    summary: "Pin a building",
    status: 201,
    schema: createBuildingRequest,
    run: buildings.createBuilding,
  }),
  route({
    method: "get",
    path: "/api/buildings/:id",
    summary: "One building",
    schema: one,
    run: buildings.readBuilding,
  }),
  route({
    method: "patch",
    path: "/api/buildings/:id",
    summary: "Rename, move, choose the station",
    schema: updateBuildingRequest,
    run: buildings.updateBuilding,
  }),
  route({
    method: "delete",
    path: "/api/buildings/:id",
    summary: "Remove a building",
    status: 204,
    schema: one,
    run: buildings.deleteBuilding,
  }),
  route({
    method: "get",
    path: "/api/buildings/:id/survey",
    summary: "Survey of a building",
    schema: one,
    run: buildings.readSurvey,
  }),
  route({
    method: "put",
    path: "/api/buildings/:id/survey",
    summary: "Save a survey",
    schema: saveSurveyRequest,
    run: buildings.saveSurvey,
  }),
];
