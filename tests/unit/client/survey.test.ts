import { describe, expect, test } from "vitest";
import { countAnswers } from "../../../server/contracts/answered.ts";
import { shapeTypes } from "../../../server/contracts/buildings.ts";
import { surveySchema } from "../../../server/contracts/survey.ts";
import { answeredIn, countChanges } from "../../../src/features/survey/answers.ts";
import { changeShape } from "../../../src/features/survey/change-shape.ts";
import { derivedSizes } from "../../../src/features/survey/derive-sizes.ts";
import { copyMonth } from "../../../src/features/survey/fresh-parts.ts";
import { sectionOfPath, surveySections } from "../../../src/features/survey/sections/section-list.ts";
import { startFrom } from "../../../src/features/survey/survey-sync.ts";
import { syncWords } from "../../../src/features/survey/sync-words.ts";
import { measured, surveyFixture } from "../../components/support/plan-fixture.ts";

const survey = surveyFixture();
const view = {
  buildingId: "b1",
  version: 4,
  survey,
  answered: 1,
  questions: 2,
  savedAt: "2026-11-24T16:08:00.000Z",
  savedBy: "Marit Oldroyd",
  can: { update: true },
};

describe("answers", () => {
  test("a typical value is a question nobody has answered", () => {
    const shape = surveySections.find((section) => section.id === "shape");
    expect(answeredIn(shape?.parts(survey) ?? [])).toEqual({ answered: 5, questions: 6 });
  });

  test("the groups count what the server counts", () => {
    const all = answeredIn(surveySections.flatMap((section) => section.parts(survey)));
    const { answered, questions } = countAnswers(survey);
    expect(all).toEqual({ answered, questions });
  });

  test("every answer of a survey belongs to a group that asks for it", () => {
    const asked = surveySections.flatMap((section) => section.paths);
    for (const key of Object.keys(survey)) {
      expect(
        asked.some((path) => path === key || path.startsWith(`${key}.`)),
        key,
      ).toBe(true);
    }
    expect(sectionOfPath("use.winterVentilation")).toBe("air");
    expect(sectionOfPath("use.lamps")).toBe("use");
    expect(sectionOfPath("months.3.nightSetpoint")).toBe("temperatures");
  });

  test("a changed figure, unit or origin is one change", () => {
    const changed = structuredClone(survey);
    changed.elevation = { typed: "40", unit: "ft", origin: "measured" };
    expect(countChanges(survey, changed)).toBe(1);
    expect(countChanges(survey, structuredClone(survey))).toBe(0);
  });
});

describe("changing the shape", () => {
  test.each(shapeTypes.flatMap((from) => shapeTypes.map((to) => [from, to] as const)))(
    "%s to %s still passes the contract",
    (from, to) => {
      const start = changeShape(survey.shape, from);
      const shape = changeShape(start, to);
      const checked = surveySchema.safeParse({ ...survey, shape });
      expect(checked.error?.issues ?? []).toEqual([]);
      expect(derivedSizes({ ...survey, shape }, "si").problem).toBeNull();
    },
  );

  test("keeps what was measured and marks the rest as typical", () => {
    const shape = changeShape(survey.shape, "gable");
    expect(shape).toMatchObject({ length: survey.shape.length, ridgeHeight: { origin: "measured" } });
    const round = changeShape(survey.shape, "roundArch");
    expect(round.type === "roundArch" && round.rise.origin).toBe("default");
  });
});

describe("what follows from the sizes", () => {
  test("a ridge below the eave is said with both figures", () => {
    const shape = { ...survey.shape, ridgeHeight: measured("1.2", "m") } as typeof survey.shape;
    expect(derivedSizes({ ...survey, shape }, "si").problem).toBe(
      "Ridge must be higher than the eave (1.7 m). You typed 1.2 m.",
    );
  });

  test("an empty figure is named", () => {
    const shape = { ...survey.shape, length: measured("", "m") } as typeof survey.shape;
    expect(derivedSizes({ ...survey, shape }, "si").problem).toBe("Length is not a number yet.");
  });

  test("floor and volume come from the engine", () => {
    const { sizes } = derivedSizes(survey, "si");
    expect(sizes?.floorAreaM2).toBeCloseTo(345.6, 6);
    expect(sizes?.coverAreaM2).toBeGreaterThan(345.6);
  });
});

describe("copying a month", () => {
  test("fills only the columns named, and all twelve months", () => {
    const months = copyMonth(survey.months, 4, ["nightSetpoint"]);
    expect(months.every((month) => month.nightSetpoint.typed === "12")).toBe(true);
    expect(months[6]?.occupied).toBe(false);
  });
});

describe("drafts kept on the device", () => {
  const draft = { version: 4, survey, changes: 3, keptAt: "2026-11-24T15:00:00.000Z" };

  test("a draft of the same version is put back with words", () => {
    expect(startFrom(view, draft)).toMatchObject({ restored: { changes: 3 }, conflict: false });
  });

  test("a draft of an older version asks before it replaces anything", () => {
    expect(startFrom(view, { ...draft, version: 3 }).conflict).toBe(true);
  });

  test("without a draft the server's survey is taken silently", () => {
    expect(startFrom(view, null)).toEqual({ survey, restored: null, conflict: false });
  });

  test("the words say where the answers are", () => {
    expect(syncWords({ kind: "onDevice", changes: 4, keptAt: "" })).toBe("On this device only, 4 changes");
    expect(syncWords({ kind: "saving" })).toBe("Saving");
    expect(syncWords({ kind: "failed", message: "", changes: 1, kept: false })).toContain(
      "Do not close the page",
    );
  });
});
