import type { Survey } from "../../../../server/contracts/survey.ts";

export const sectionIds = ["shape", "cover", "air", "floor", "use", "temperatures", "heaters"] as const;
export type SectionId = (typeof sectionIds)[number];

export interface SurveySection {
  id: SectionId;
  title: string;
  /** The parts of the survey this section asks for. */
  parts: (survey: Survey) => unknown[];
  /** Beginnings of the paths that belong here, for errors. */
  paths: string[];
}

/** A column of the calendar is one question: one month that a person has looked at answers it. */
function column(survey: Survey, key: "nightSetpoint" | "daySetpoint" | "headCount" | "mass"): unknown {
  return survey.months.find((month) => month[key].origin !== "default")?.[key] ?? survey.months[0]?.[key];
}

export const surveySections: SurveySection[] = [
  {
    id: "shape",
    title: "Shape and size",
    parts: (survey) => [survey.shape, survey.ridgeBearing],
    paths: ["shape", "ridgeBearing"],
  },
  {
    id: "cover",
    title: "Cover",
    parts: (survey) => [survey.covers, survey.screen],
    paths: ["covers", "screen"],
  },
  {
    id: "air",
    title: "Doors and air",
    parts: (survey) => [
      survey.leakage,
      survey.shelter,
      ...(survey.use.kind === "barn"
        ? [survey.use.winterVentilation, survey.use.humidityLimit, survey.use.heatRecovery]
        : []),
    ],
    paths: ["leakage", "shelter", "use.winterVentilation", "use.humidityLimit", "use.heatRecovery"],
  },
  {
    id: "floor",
    title: "Floor and ground",
    parts: (survey) => [survey.floor, survey.elevation, survey.frostHollow],
    paths: ["floor", "elevation", "frostHollow"],
  },
  {
    id: "use",
    title: "Crop or stock",
    parts: (survey) =>
      survey.use.kind === "greenhouse"
        ? [survey.use]
        : [survey.use.animal, column(survey, "headCount"), column(survey, "mass")],
    paths: ["use.crop", "use.lamps", "use.lampHours", "use.animal"],
  },
  {
    id: "temperatures",
    title: "Temperatures wanted",
    parts: (survey) => [survey.criticalTemp, column(survey, "nightSetpoint"), column(survey, "daySetpoint")],
    paths: ["criticalTemp", "months"],
  },
  {
    id: "heaters",
    title: "Heaters in place",
    parts: (survey) => [survey.heaters, survey.fuel],
    paths: ["heaters", "fuel", "fuelPrice"],
  },
];

/** The section in which an answer is asked. */
export function sectionOfPath(path: string): SectionId {
  const exact = surveySections.find((section) =>
    section.paths.some((start) => path === start || path.startsWith(`${start}.`)),
  );
  return exact?.id ?? "shape";
}
