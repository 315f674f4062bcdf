import { type FormEvent, useState } from "react";
import type { Position } from "../../server/contracts/common.ts";
import type { FarmView } from "../../server/contracts/farms.ts";
import { ApiError } from "../lib/api-client.ts";
import { useCreateFarm } from "../lib/create-farm.ts";
import { Button } from "./button.tsx";
import { PlaceSearch } from "./place-search.tsx";
import { PositionFields } from "./position-fields.tsx";
import { TextField } from "./text-field.tsx";

interface NewFarmFormProps {
  cooperativeId: string;
  onCreated(farm: FarmView): void;
  onCancel(): void;
}

/** A farm with its farmer, who is invited by letter. */
export function NewFarmForm({ cooperativeId, onCreated, onCancel }: NewFarmFormProps) {
  const create = useCreateFarm();
  const [name, setName] = useState("");
  const [place, setPlace] = useState("");
  const [position, setPosition] = useState<Position | null>(null);
  const [farmerName, setFarmerName] = useState("");
  const [farmerEmail, setFarmerEmail] = useState("");
  const [missing, setMissing] = useState<string>();
  const fields = create.error instanceof ApiError ? create.error.fields : {};
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (position === null)
      return setMissing("Say where the farm is: look for a town, type degrees, or use this device.");
    setMissing(undefined);
    const filled = (text: string) => (text.trim() === "" ? null : text.trim());
    create.mutate(
      {
        cooperativeId,
        name,
        place,
        position,
        farmerName: filled(farmerName),
        farmerEmail: filled(farmerEmail),
      },
      { onSuccess: onCreated },
    );
  };
  return (
    <form
      onSubmit={submit}
      className="grid max-w-180 gap-5 border-2 border-ink bg-sheet p-5"
      aria-label="New farm"
      noValidate
    >
      <h2 className="m-0 font-sign text-lg font-bold">New farm</h2>
      {create.error && Object.keys(fields).length === 0 ? (
        <p role="alert" className="m-0 border-l-[6px] border-redlead bg-redlead-tint p-3">
          {create.error.message}
        </p>
      ) : null}
      <div className="grid gap-4 md:grid-cols-2 md:items-end">
        <TextField
          label="Name of the farm"
          value={name}
          onValue={setName}
          problem={fields.name}
          autoComplete="off"
        />
        <TextField
          label="Place"
          hint="As people there call it."
          value={place}
          onValue={setPlace}
          problem={fields.place}
          autoComplete="off"
        />
      </div>
      <PlaceSearch
        label="Nearest town"
        hint="Sets the position; it can be moved afterwards."
        onPick={(town) => {
          setPosition({ latitudeDeg: town.latitudeDeg, longitudeDeg: town.longitudeDeg });
          setPlace((typed) => typed || town.name);
        }}
      />
      <PositionFields
        position={position}
        onPosition={setPosition}
        problem={
          missing ?? fields["position.latitudeDeg"] ?? fields["position.longitudeDeg"] ?? fields.position
        }
      />
      <div className="grid gap-4 md:grid-cols-2 md:items-end">
        <TextField
          label="Farmer's name"
          value={farmerName}
          onValue={setFarmerName}
          problem={fields.farmerName}
          autoComplete="off"
        />
        <TextField
          label="Farmer's e-mail"
          type="email"
          value={farmerEmail}
          onValue={setFarmerEmail}
          problem={fields.farmerEmail}
          autoComplete="off"
        />
      </div>
      <div className="flex flex-wrap gap-3">
        <Button type="submit" busy={create.isPending}>
          Add the farm
        </Button>
        <Button kind="plain" onClick={onCancel}>
          Leave it
        </Button>
      </div>
    </form>
  );
}
