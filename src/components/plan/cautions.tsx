import type { Survey } from "../../../server/contracts/survey.ts";

/**
 * General cautions for heating with people, animals and crops in the house.
 * Common practice, no source: they send the reader to local rules and licensed trades and replace neither.
 */
function cautionLines(survey: Survey): { title: string; text: string }[] {
  const barn = survey.use.kind === "barn";
  return [
    {
      title: "Fuel and flues",
      text: "Have heaters, fuel lines and flues fitted, tested and serviced by somebody licensed for that fuel where the house stands. Local codes and the maker's instructions come before this plan.",
    },
    {
      title: "Fumes",
      text: `A heater that burns fuel can give off carbon monoxide. Give it the air it asks for, fit an alarm where people work${barn ? " and where animals are kept" : ""}, and treat headache or drowsiness as a warning to get out.`,
    },
    {
      title: "Power cuts",
      text: barn
        ? "Fans, controls and most heaters stop with the mains. Keep a way to move air and heat without it, an alarm that works when the mains has failed, and test both every week."
        : "Fans, controls and most heaters stop with the mains. Keep a way to heat without it or know how long you have, and an alarm that works when the mains has failed.",
    },
    ...(barn
      ? [
          {
            title: "Animals first",
            text: "Young animals chill in minutes and closed houses run out of air. The stock's condition decides, not the figure on a controller; ask your vet about temperatures for the breed and age.",
          },
        ]
      : []),
  ];
}

export function Cautions({ survey }: { survey: Survey }) {
  return (
    <section aria-labelledby="cautions-heading">
      <h2 id="cautions-heading" className="m-0 font-sign text-lg font-bold">
        Before anything is fitted
      </h2>
      <dl className="m-0 mt-1 text-sm">
        {cautionLines(survey).map((line) => (
          <div key={line.title} className="border-b border-rule py-2">
            <dt className="font-bold">{line.title}</dt>
            <dd className="m-0 max-w-[70ch]">{line.text}</dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
