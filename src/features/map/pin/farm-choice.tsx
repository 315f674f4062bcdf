import { useId, useState } from "react";
import type { FarmView } from "../../../../server/contracts/farms.ts";
import { Button } from "../../../components/button.tsx";
import { NewFarmForm } from "../../../components/new-farm-form.tsx";

interface FarmChoiceProps {
  farms: FarmView[];
  value: string;
  onChange(farm: FarmView): void;
  /** Set when the person may add farms. */
  cooperativeId: string | null;
  problem?: string;
}

/** Whose building it is; a farm that is not on the list yet is added on the way. */
export function FarmChoice({ farms, value, onChange, cooperativeId, problem }: FarmChoiceProps) {
  const id = useId();
  const [adding, setAdding] = useState(farms.length === 0 && cooperativeId !== null);
  if (adding && cooperativeId !== null) {
    return (
      <NewFarmForm
        cooperativeId={cooperativeId}
        onCreated={(farm) => {
          setAdding(false);
          onChange(farm);
        }}
        onCancel={() => setAdding(false)}
      />
    );
  }
  return (
    <div>
      <label htmlFor={id} className="block font-semibold">
        Farm
      </label>
      <div className="mt-1 flex flex-wrap gap-3">
        <select
          id={id}
          value={value}
          aria-invalid={problem !== undefined}
          aria-describedby={problem ? `${id}-problem` : undefined}
          onChange={(event) => {
            const farm = farms.find((entry) => entry.id === event.target.value);
            if (farm !== undefined) onChange(farm);
          }}
          className={`min-h-11.5 min-w-0 flex-1 rounded-control border-[1.5px] bg-sheet px-3 ${problem ? "border-redlead" : "border-rule-strong"}`}
        >
          <option value="">Choose a farm</option>
          {farms.map((farm) => (
            <option key={farm.id} value={farm.id}>
              {`${farm.name}, ${farm.place}`}
            </option>
          ))}
        </select>
        {cooperativeId === null ? null : (
          <Button kind="plain" onClick={() => setAdding(true)}>
            New farm
          </Button>
        )}
      </div>
      {problem ? (
        <p id={`${id}-problem`} className="m-0 mt-1 text-sm font-semibold text-redlead">
          {problem}
        </p>
      ) : null}
    </div>
  );
}
