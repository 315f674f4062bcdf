import { describe, expect, test } from "vitest";
import { toCsv } from "../../../src/components/chart/csv.ts";
import { axisStep, axisTicks, niceTop } from "../../../src/components/chart/nice-top.ts";
import { optionScaleW } from "../../../src/components/plan/option-bar.tsx";
import { failureSentence, headline } from "../../../src/components/plan/plan-sentences.ts";
import { flowsOf, totalIn, totalOut } from "../../../src/components/section-drawing/heat-paths.ts";
import { allBalances, readSelection, selectedBalance } from "../../../src/features/plan/heat/selection.ts";
import { changesForYou, managementSentences } from "../../../src/features/review/plain-words.ts";
import { unitsFor } from "../../../src/lib/units.ts";
import {
  measured,
  planFixture,
  resultFixture,
  surveyFixture,
} from "../../components/support/plan-fixture.ts";

const si = unitsFor("si");
const space = "\u00a0";

describe("the answer first", () => {
  test("a house that is short says how much and where it would settle", () => {
    const words = headline("Tunnel 2", resultFixture(), si);
    expect(words.first).toBe(`Tunnel 2 is 19${space}kW short on the coldest night once in 20 years.`);
    expect(words.second).toContain(`settle at about 8${space}°C and not at 14${space}°C`);
  });

  test("a house that holds says what is to spare", () => {
    const result = resultFixture();
    result.sizing.installedW = 90_000;
    result.sizing.verdictOnceInYears = "holds";
    expect(headline("Tunnel 2", result, si).second).toContain(`26${space}kW to spare`);
  });

  test("a house without a heater is not called short by its whole need", () => {
    const result = resultFixture();
    result.sizing.installedW = 0;
    expect(headline("Tunnel 2", result, si).first).toContain("has no heater");
  });

  test("what cannot be said is said so", () => {
    const result = resultFixture();
    result.sizing.verdictOnceInYears = "cannotSay";
    expect(headline("Tunnel 2", result, si).first).toContain("cannot be said");
  });

  test("time to the critical temperature is a range", () => {
    expect(failureSentence(resultFixture(), 6, si)).toContain(`55${space}min to 1${space}h 35${space}min`);
  });
});

describe("flows", () => {
  test("what goes out equals what comes in, with the surplus in the air", () => {
    for (const balance of allBalances(resultFixture())) {
      const flows = flowsOf({ ...balance, surplusW: 4000, gainsW: { ...balance.gainsW, stock: 4000 } });
      expect(totalOut(flows)).toBeCloseTo(totalIn(flows), 6);
    }
  });
});

describe("the hour that is shown", () => {
  const result = resultFixture();

  test("is the worst month on the rarer night unless the address says otherwise", () => {
    expect(readSelection(new URLSearchParams(), result)).toEqual({
      month: 1,
      night: "onceInYears",
      state: "screensShut",
    });
    expect(readSelection(new URLSearchParams("month=4&night=everyday&state=largestUnitOut"), result)).toEqual(
      {
        month: 4,
        night: "everyday",
        state: "largestUnitOut",
      },
    );
  });

  test("falls back where a state was not worked out", () => {
    const selection = readSelection(new URLSearchParams("month=99&night=everyday&state=snowOnRoof"), result);
    expect(selection).toEqual({ month: 1, night: "everyday", state: "screensShut" });
    expect(selectedBalance(result, selection)).not.toBeNull();
  });
});

describe("plain words for the farmer", () => {
  test("the nights he wants are grouped by months, empty months are said", () => {
    const sentences = managementSentences(surveyFixture(), undefined, si).map((sentence) => sentence.text);
    expect(sentences).toContain(
      `At night you keep 14${space}°C in Jan to Apr, 12${space}°C in May to Jun, 12${space}°C in Aug to Sep, 14${space}°C in Oct to Dec.`,
    );
    expect(sentences).toContain("The house stands empty and unheated in Jul.");
  });

  test("a sentence is as weak as the weakest answer in it", () => {
    const survey = surveyFixture();
    survey.months[3] = { ...survey.months[3]!, nightSetpoint: { typed: "14", unit: "C", origin: "default" } };
    const night = managementSentences(survey, undefined, si).find((sentence) => sentence.id === "night");
    expect(night?.origin).toBe("default");
  });

  test("stock is said with number and mass, because its warmth is counted on", () => {
    const survey = surveyFixture();
    survey.use = {
      kind: "barn",
      animal: { value: "broiler", origin: "measured" },
      winterVentilation: null,
      humidityLimit: { typed: "70", unit: "percent", origin: "default" },
      heatRecovery: { typed: "0", unit: "percent", origin: "measured" },
    };
    survey.months = survey.months.map((month) => ({
      ...month,
      occupied: true,
      headCount: measured("38000", "each"),
      mass: measured("0.04", "kg"),
    }));
    const texts = managementSentences(survey, undefined, si).map((sentence) => sentence.text);
    expect(texts[0]).toContain("38,000");
    expect(texts[0]).toContain("all year");
    expect(texts.join(" ")).toContain(`70${space}% humidity`);
  });

  test("a choice that leaves the house cold with one heater out says so", () => {
    const plan = planFixture({ proposedOptionId: "new-70" });
    expect(changesForYou(plan, si).join(" ")).toContain("below the critical temperature");
  });
});

describe("charts", () => {
  test("an axis ends on a round value above the greatest one", () => {
    for (const greatest of [0.3, 4, 63.8, 218, 1999, 45_000]) {
      expect(niceTop(greatest)).toBeGreaterThan(greatest);
      expect(niceTop(greatest)).toBeLessThan(greatest * 1.8);
    }
    expect(niceTop(0)).toBe(1);
  });

  test("ticks are round and reach both ends", () => {
    const step = axisStep(34_000);
    const ticks = axisTicks(-20_000, 20_000, step);
    expect(step).toBe(5000);
    expect(ticks[0]).toBe(-20_000);
    expect(ticks.at(-1)).toBe(20_000);
  });

  test("all options share one scale, with room for the missing part's words", () => {
    expect(optionScaleW([{ totalW: 45_000 }, { totalW: 85_000 }], 63_800)).toBeGreaterThan(85_000);
    expect(63_800 / optionScaleW([{ totalW: 45_000 }], 63_800)).toBeLessThanOrEqual(0.66);
  });

  test("a file quotes what needs quotes", () => {
    expect(
      toCsv(
        ["Month", "Heat (kWh)"],
        [
          ["Jan, first", 1],
          ['the "cold" one', 2],
        ],
      ),
    ).toBe('Month,Heat (kWh)\r\n"Jan, first",1\r\n"the ""cold"" one",2');
  });
});
