import { describe, expect, it } from "vitest";
import { countAnswers } from "../../../server/contracts/answered.ts";
import { buildingKinds, shapeTypes } from "../../../server/contracts/buildings.ts";
import { defaultQuantity } from "../../../server/contracts/quantity.ts";
import { type Survey, surveySchema } from "../../../server/contracts/survey.ts";
import { surveyProblems } from "../../../server/contracts/survey-rules.ts";
import { readStations } from "../../../server/database/seeds/read-stations.ts";
import { defaultSurvey } from "../../../server/features/buildings/default-survey.ts";
import { referenceProblems } from "../../../server/features/buildings/survey-references.ts";
import { houseInputOf } from "../../../server/features/plans/survey-to-house.ts";

const footprint = {
  length: defaultQuantity(96, "ft", "measured"),
  width: defaultQuantity(30, "ft", "measured"),
  ridgeBearing: defaultQuantity(85, "deg", "measured"),
};

function tunnel(): Survey {
  return defaultSurvey({ kind: "greenhouse", shapeType: "roundArch", footprint, elevationM: 1524 });
}

function inputOf(survey: Survey) {
  const climate = readStations()[0]?.record.climate;
  if (climate === undefined) throw new Error("no station");
  return houseInputOf({
    survey,
    latitudeDeg: 44,
    longitudeDeg: -73,
    climate,
    choices: { returnPeriodYears: 20, everydayPercent: 99.6 },
  });
}

describe("a survey of typical answers", () => {
  const combinations = buildingKinds.flatMap((kind) =>
    shapeTypes.map((shapeType) => [kind, shapeType] as const),
  );

  it.each(combinations.filter(([kind, shape]) => kind === "barn" || shape !== "atticBarn"))(
    "is valid for a %s of shape %s",
    (kind, shapeType) => {
      const survey = defaultSurvey({ kind, shapeType, footprint, elevationM: 100 });
      expect(surveySchema.safeParse(survey).error).toBeUndefined();
      expect(surveyProblems(survey)).toEqual({});
      expect(referenceProblems(survey, kind)).toEqual({});
      const { answered, questions } = countAnswers(survey);
      // Length, width and bearing came with the pin; a range splits the width into spans, which nobody has counted.
      expect(answered).toBe(shapeType === "multiSpan" || shapeType === "venlo" ? 2 : 3);
      expect(questions).toBeGreaterThan(15);
    },
  );

  it("keeps the person's own unit for what it assumes", () => {
    const { shape } = tunnel();
    expect(shape.type === "roundArch" && shape.rise.unit).toBe("ft");
  });
});

describe("a survey as the engine takes it", () => {
  it("turns typed feet, °F and Btu/h into SI", () => {
    const survey = tunnel();
    const house = inputOf({
      ...survey,
      months: survey.months.map((month) => ({
        ...month,
        nightSetpoint: { typed: "60", unit: "F", origin: "measured" },
      })),
      heaters: [
        {
          label: "East",
          type: { value: "unit-fan", origin: "plate" },
          rating: { typed: "150", unit: "kBtuH", origin: "plate" },
          basis: { value: "input", origin: "plate" },
          efficiency: { typed: "80", unit: "percent", origin: "plate" },
          count: { typed: "2", unit: "each", origin: "measured" },
          fuel: { value: "lpg", origin: "measured" },
        },
      ],
    });
    expect(house.shape).toMatchObject({ type: "roundArch", lengthM: 96 * 0.3048, widthM: 30 * 0.3048 });
    expect(house.months[0]!.nightSetpointC).toBeCloseTo(15.5556, 3);
    expect(house.heaters[0]).toMatchObject({ basis: "input", count: 2, burnsFuel: true, vented: true });
    expect(house.heaters[0]!.ratedW).toBeCloseTo(43_960.66, 1);
    expect(house.heaters[0]!.efficiencyFrac).toBeCloseTo(0.8, 9);
    expect(house.site.elevationM).toBeCloseTo(1524, 1);
  });

  it("takes a typed U-value in place of the library's layers", () => {
    const survey = tunnel();
    const typed = inputOf({
      ...survey,
      covers: {
        ...survey.covers,
        roof: { ...survey.covers.roof, uValue: { typed: "0.70", unit: "BtuHFt2F", origin: "guess" } },
      },
    });
    expect(typed.covers.roof).toMatchObject({ kind: "uValue" });
    expect(typed.covers.roof.kind === "uValue" && typed.covers.roof.uValueWM2K).toBeCloseTo(3.975, 3);
    expect(inputOf(survey).covers.roof.kind).toBe("stack");
  });

  it("carries the origin of every answer by its path", () => {
    const { origins } = inputOf(tunnel());
    expect(origins["shape.length"]).toBe("measured");
    expect(origins["covers.roof.cover"]).toBe("default");
    expect(origins["months.0.nightSetpoint"]).toBe("default");
  });
});
