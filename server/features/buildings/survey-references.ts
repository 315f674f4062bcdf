import type { BuildingKind } from "../../contracts/buildings.ts";
import type { Survey } from "../../contracts/survey.ts";
import type { FieldProblems } from "../../contracts/survey-rules.ts";
import { referenceData } from "../library/reference-data.ts";

type Part = keyof Survey["covers"];

function checkCovers(survey: Survey, problems: FieldProblems): void {
  for (const part of ["roof", "sides", "ends", "ceiling", "kneewall"] as const satisfies Part[]) {
    const choice = survey.covers[part];
    if (choice === null) continue;
    const row = referenceData.covers.get(choice.cover.value);
    if (row === undefined)
      problems[`covers.${part}.cover`] = `"${choice.cover.value}" is not in the list of covers.`;
    else if (!row.parts.includes(part))
      problems[`covers.${part}.cover`] = `${row.name} is not made for this part.`;
  }
}

function known(
  rows: Map<string, unknown>,
  id: string,
  path: string,
  list: string,
  problems: FieldProblems,
): void {
  if (!rows.has(id)) problems[path] = `"${id}" is not in the list of ${list}.`;
}

/** Names in a survey that are not rows of the reference tables, and a use that does not fit the building. */
export function referenceProblems(survey: Survey, kind: BuildingKind): FieldProblems {
  const problems: FieldProblems = {};
  checkCovers(survey, problems);
  if (survey.use.kind !== kind)
    problems["use.kind"] = `This building is a ${kind}. Its use cannot be that of a ${survey.use.kind}.`;
  if (survey.screen !== null)
    known(referenceData.screens, survey.screen.screen.value, "screen.screen", "screens", problems);
  known(referenceData.leakage, survey.leakage.class.value, "leakage.class", "tightness classes", problems);
  known(referenceData.floorEdges, survey.floor.edge.value, "floor.edge", "floor edges", problems);
  known(referenceData.fuels, survey.fuel.value, "fuel", "fuels", problems);
  if (survey.use.kind === "greenhouse")
    known(referenceData.crops, survey.use.crop.value, "use.crop", "crops", problems);
  else known(referenceData.animals, survey.use.animal.value, "use.animal", "animals", problems);
  survey.heaters.forEach((heater, index) => {
    known(referenceData.heaterTypes, heater.type.value, `heaters.${index}.type`, "heater types", problems);
    known(referenceData.fuels, heater.fuel.value, `heaters.${index}.fuel`, "fuels", problems);
  });
  return problems;
}
