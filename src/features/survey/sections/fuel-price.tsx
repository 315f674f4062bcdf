import { useController, useWatch } from "react-hook-form";
import type { Survey } from "../../../../server/contracts/survey.ts";
import { errorWords } from "../fields/error-words.ts";
import { OptionalPart } from "../fields/optional-part.tsx";
import { useSurveyForm } from "../form-context.ts";

type Price = NonNullable<Survey["fuelPrice"]>;

const currencies = ["EUR", "USD", "GBP", "CAD", "AUD", "NZD", "ZAR", "DKK", "SEK", "NOK", "PLN", "CHF"];

/** What one unit of fuel costs, from a bill or by word of mouth. */
export function FuelPrice() {
  const { control, library, disabled } = useSurveyForm();
  const fuel = useWatch({ control, name: "fuel.value" });
  const { field, fieldState } = useController({ name: "fuelPrice", control });
  const price = field.value as Price | null;
  const unit = library.fuels.find((entry) => entry.id === fuel)?.unit ?? "kWh";
  const box = "h-11 rounded-control border-[1.5px] border-rule-strong bg-sheet px-2";
  return (
    <OptionalPart
      name="fuelPrice"
      add="Add the fuel price"
      remove="No fuel price"
      fresh={() => ({ amount: 1, currency: "EUR", per: unit })}
    >
      {price ? (
        <div className="px-4 py-2 md:px-0">
          <div className="flex flex-wrap items-center gap-2">
            <span className="mr-auto">Fuel price</span>
            <input
              type="number"
              step="any"
              min="0"
              aria-label="Fuel price, amount"
              value={Number.isFinite(price.amount) ? price.amount : ""}
              disabled={disabled}
              onChange={(event) => field.onChange({ ...price, amount: event.target.valueAsNumber })}
              className={`${box} w-24 text-right font-bold`}
            />
            <select
              aria-label="Currency"
              value={price.currency}
              disabled={disabled}
              onChange={(event) => field.onChange({ ...price, currency: event.target.value })}
              className={box}
            >
              {[...new Set([price.currency, ...currencies])].map((currency) => (
                <option key={currency}>{currency}</option>
              ))}
            </select>
            <span className="text-sm text-ink-2">{`for one ${price.per}`}</span>
          </div>
          <p aria-live="polite" className="min-h-[18px] text-right text-xs font-medium text-redlead">
            {errorWords(fieldState.error) ?? ""}
          </p>
        </div>
      ) : null}
    </OptionalPart>
  );
}
