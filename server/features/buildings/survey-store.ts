import type { Transaction } from "sequelize";
import type { Survey, SurveyMonth } from "../../contracts/survey.ts";
import { Assembly, type CoverPart } from "../../models/assembly.ts";
import type { Building } from "../../models/building.ts";
import { CalendarMonth } from "../../models/calendar-month.ts";
import { Heater } from "../../models/heater.ts";

const parts: CoverPart[] = ["roof", "sides", "ends", "ceiling", "kneewall"];

/** Surveys of many buildings in three queries, put together from their tables. */
export async function loadSurveys(
  buildings: Building[],
  transaction?: Transaction,
): Promise<Map<string, Survey>> {
  const where = { buildingId: buildings.map((building) => building.id) };
  const [assemblies, months, heaters] = await Promise.all([
    Assembly.findAll({ where, transaction }),
    CalendarMonth.findAll({ where, order: [["month", "ASC"]], transaction }),
    Heater.findAll({ where, order: [["position", "ASC"]], transaction }),
  ]);
  return new Map(
    buildings.map((building) => {
      const own = <T extends { buildingId: string }>(rows: T[]) =>
        rows.filter((row) => row.buildingId === building.id);
      const covers = Object.fromEntries(parts.map((part) => [part, null])) as Record<CoverPart, unknown>;
      for (const assembly of own(assemblies)) covers[assembly.part] = assembly.cover;
      const survey = {
        ...building.surveyCore,
        covers,
        months: own(months).map(({ occupied, answers }): SurveyMonth => ({ occupied, ...answers })),
        heaters: own(heaters).map(({ label, answers }) => ({ label, ...answers })),
      } as Survey;
      return [building.id, survey] as const;
    }),
  );
}

export async function loadSurvey(building: Building, transaction?: Transaction): Promise<Survey> {
  const survey = (await loadSurveys([building], transaction)).get(building.id);
  if (survey === undefined) throw new Error("a survey was asked for and is not there");
  return survey;
}

/** Splits a survey into what stays with the building and what has tables of its own. */
export function surveyCoreOf(survey: Survey) {
  const { covers: _covers, months: _months, heaters: _heaters, ...core } = survey;
  return core;
}

/** Writes covers, months and heaters anew; the caller keeps the rest with the building. */
export async function writeSurveyRows(
  buildingId: string,
  survey: Survey,
  transaction: Transaction,
): Promise<void> {
  const where = { buildingId };
  await Promise.all([
    Assembly.destroy({ where, transaction }),
    CalendarMonth.destroy({ where, transaction }),
    Heater.destroy({ where, transaction }),
  ]);
  const assemblies = parts.flatMap((part) => {
    const cover = survey.covers[part];
    return cover === null ? [] : [{ buildingId, part, cover }];
  });
  await Assembly.bulkCreate(assemblies, { transaction });
  await CalendarMonth.bulkCreate(
    survey.months.map(({ occupied, ...answers }, index) => ({
      buildingId,
      month: index + 1,
      occupied,
      answers,
    })),
    { transaction },
  );
  await Heater.bulkCreate(
    survey.heaters.map(({ label, ...answers }, position) => ({ buildingId, position, label, answers })),
    { transaction },
  );
}
