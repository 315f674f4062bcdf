import type { PlanStatus } from "../../../server/contracts/buildings.ts";
import type { LibraryView } from "../../../server/contracts/library.ts";
import type { PlanView } from "../../../server/contracts/plans.ts";
import type { Origin, Quantity } from "../../../server/contracts/quantity.ts";
import type { Survey } from "../../../server/contracts/survey.ts";
import { monthAbbreviation, percent, spanRange } from "../../lib/format.ts";
import { quantitySi } from "../../lib/quantity-value.ts";
import type { Units } from "../../lib/units.ts";

export const statusWords: Record<PlanStatus, string> = {
  draft: "Not sent yet",
  sent: "Waits for an answer",
  asked: "A question is open",
  approved: "Approved",
  declined: "Declined",
};

/** A sentence about how the farm is run that its owner can contradict. */
export interface ManagementSentence {
  id: string;
  text: string;
  /** What a message about it starts with. */
  subject: string;
  origin: Origin;
}

function weakest(quantities: Quantity[]): Origin {
  const order: Origin[] = ["default", "guess", "bill", "plate", "measured"];
  return order.find((origin) => quantities.some((quantity) => quantity.origin === origin)) ?? "default";
}

/** Months with the same figure put together: "14 °C in Jan to Apr, 10 °C in May". */
function byMonths(months: Survey["months"], written: (month: Survey["months"][number]) => string): string {
  const runs: { from: number; to: number; words: string }[] = [];
  months.forEach((month, i) => {
    if (!month.occupied) return;
    const words = written(month);
    const last = runs.at(-1);
    if (last && last.words === words && last.to === i - 1) last.to = i;
    else runs.push({ from: i, to: i, words });
  });
  const only = runs[0];
  if (runs.length === 1 && only && only.from === 0 && only.to === 11) return `${only.words} all year`;
  return runs
    .map((run) => {
      const from = monthAbbreviation(run.from + 1);
      return `${run.words} in ${run.from === run.to ? from : `${from} to ${monthAbbreviation(run.to + 1)}`}`;
    })
    .join(", ");
}

function nameOf(entries: { id: string; name: string }[] | undefined, id: string): string {
  return entries?.find((entry) => entry.id === id)?.name ?? id;
}

function temperatureSentences(survey: Survey, units: Units): ManagementSentence[] {
  const empty = survey.months.flatMap((month, i) => (month.occupied ? [] : [monthAbbreviation(i + 1)]));
  return [
    {
      id: "night",
      subject: "the night temperatures",
      text: `At night you keep ${byMonths(survey.months, (month) => units.roundTemperature(quantitySi(month.nightSetpoint)))}.`,
      origin: weakest(survey.months.map((month) => month.nightSetpoint)),
    },
    ...(empty.length > 0
      ? [
          {
            id: "empty",
            subject: "the empty months",
            text: `The house stands empty and unheated in ${empty.join(", ")}.`,
            origin: "guess" as const,
          },
        ]
      : []),
    {
      id: "critical",
      subject: "the critical temperature",
      text: `Below ${units.roundTemperature(quantitySi(survey.criticalTemp))} ${survey.use.kind === "barn" ? "the animals suffer" : "the crop is harmed"}.`,
      origin: survey.criticalTemp.origin,
    },
  ];
}

function purposeSentences(
  survey: Survey,
  library: LibraryView | undefined,
  units: Units,
): ManagementSentence[] {
  const { use } = survey;
  if (use.kind === "greenhouse") {
    const lampsWM2 = quantitySi(use.lamps);
    return [
      {
        id: "crop",
        subject: "the crop",
        text: `You grow ${nameOf(library?.crops, use.crop.value).toLowerCase()}.`,
        origin: use.crop.origin,
      },
      ...(lampsWM2 > 0
        ? [
            {
              id: "lamps",
              subject: "the lamps",
              text: `Lamps of ${units.text(lampsWM2, "heatFlux")} burn ${units.text(quantitySi(use.lampHours), "hours")} a day. They are not counted on in the coldest hour unless they are on then.`,
              origin: weakest([use.lamps, use.lampHours]),
            },
          ]
        : []),
    ];
  }
  const animal = nameOf(library?.animals, use.animal.value).toLowerCase();
  const stock = byMonths(
    survey.months,
    (month) =>
      `${units.text(quantitySi(month.headCount), "count")} of ${units.text(quantitySi(month.mass), "mass")}`,
  );
  return [
    {
      id: "stock",
      subject: "the number and mass of the animals",
      text: `You keep ${animal}: ${stock}. Their warmth is counted on.`,
      origin: weakest(survey.months.flatMap((month) => [month.headCount, month.mass])),
    },
    use.winterVentilation
      ? {
          id: "air",
          subject: "the winter ventilation",
          text: `In the cold the fans give ${units.text(quantitySi(use.winterVentilation), "airFlow")}.`,
          origin: use.winterVentilation.origin,
        }
      : {
          id: "air",
          subject: "the winter ventilation",
          text: `In the cold you ventilate only as much as the animals need to keep the air below ${percent(quantitySi(use.humidityLimit))} humidity.`,
          origin: use.humidityLimit.origin,
        },
  ];
}

/** What the plan takes for granted about how the farm is run. */
export function managementSentences(
  survey: Survey,
  library: LibraryView | undefined,
  units: Units,
): ManagementSentence[] {
  const { screen } = survey;
  return [
    ...purposeSentences(survey, library, units),
    ...temperatureSentences(survey, units),
    ...(screen
      ? [
          {
            id: "screen",
            subject: "the screens",
            text: `You shut the screens every cold night${screen.opensForSnow.value === "yes" ? " and open them while it snows" : ", also while it snows"}.`,
            origin: screen.opensForSnow.origin,
          },
        ]
      : []),
    {
      id: "tight",
      subject: "how tight the house is",
      text: survey.leakage.airChanges
        ? `With doors and vents shut, the air changes ${units.text(quantitySi(survey.leakage.airChanges), "airChange", { decimals: 1 })}.`
        : `The house is this tight: ${nameOf(library?.leakage, survey.leakage.class.value).toLowerCase()}.`,
      origin: survey.leakage.airChanges?.origin ?? survey.leakage.class.origin,
    },
    ...survey.heaters.map((heater, i) => ({
      id: `heater-${i}`,
      subject: `the heater "${heater.label}"`,
      text: `${units.text(quantitySi(heater.count), "count")} × ${heater.label}: the plate says ${units.heat(quantitySi(heater.rating))} ${heater.basis.value}, ${nameOf(library?.fuels, heater.fuel.value).toLowerCase()}. It works and is in order.`,
      origin: weakest([heater.rating]),
    })),
  ];
}

/** What the proposed heaters mean for the farmer, one sentence each. */
export function changesForYou(plan: PlanView, units: Units): string[] {
  const option = plan.result.sizing.options.find((entry) => entry.id === plan.proposedOptionId);
  if (!option) return [];
  const { sizing, annual, returnPeriodYears } = plan.result;
  const { hoursToCriticalLow: low, hoursToCriticalHigh: high } = sizing;
  const stock = plan.survey.use.kind === "barn" ? "animals stay" : "crop stays";
  return [
    option.holdsOnceInYears
      ? `Holds on the coldest night once in ${returnPeriodYears} years, with ${units.heat(Math.max(0, option.spareW))} to spare.`
      : `Is still ${units.heat(Math.abs(option.spareW))} short on the coldest night once in ${returnPeriodYears} years.`,
    option.largestUnitOutAboveCritical
      ? `If the largest heater stops on that night, the house settles at about ${units.roundTemperature(option.largestUnitOutSettlesAtC)}: the ${stock} above the critical temperature.`
      : `If the largest heater stops on that night, the house settles at about ${units.roundTemperature(option.largestUnitOutSettlesAtC)}, below the critical temperature.`,
    ...(low !== null && high !== null
      ? [`If all heating stops, you have ${spanRange(low, high)} until the critical temperature.`]
      : []),
    `A normal year takes about ${units.energy(annual.heaterKwh)} of heat from the heaters.`,
  ];
}

/** What this plan leaves out. Said in general words, so that nobody takes it for more than it is. */
export const notIncluded = [
  "Prices. Nothing is ordered with your answer.",
  "Fitting, gas line, chimney, wiring and permits. A licensed fitter and the local rules decide these.",
  "A generator or another way to heat in a power cut.",
  "What happens with doors left open or a torn cover.",
];
