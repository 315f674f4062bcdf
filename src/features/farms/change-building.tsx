import { type FormEvent, useState } from "react";
import type { BuildingSummary } from "../../../server/contracts/buildings.ts";
import { Button } from "../../components/button.tsx";
import { ConfirmDialog } from "../../components/confirm-dialog.tsx";
import { Dialog } from "../../components/dialog.tsx";
import { PositionFields } from "../../components/position-fields.tsx";
import { TextField } from "../../components/text-field.tsx";
import { ApiError } from "../../lib/api-client.ts";
import { useChangeBuilding, useRemoveBuilding } from "./api.ts";

interface ChangeBuildingProps {
  building: BuildingSummary;
  onClose(): void;
}

/** Name and place of a building, and its removal. Its sizes belong to the survey. */
export function ChangeBuilding({ building, onClose }: ChangeBuildingProps) {
  const change = useChangeBuilding(building.id);
  const remove = useRemoveBuilding(building.id);
  const [removing, setRemoving] = useState(false);
  const [name, setName] = useState(building.name);
  const [position, setPosition] = useState({
    latitudeDeg: building.latitudeDeg,
    longitudeDeg: building.longitudeDeg,
  });
  const fields = change.error instanceof ApiError ? change.error.fields : {};
  const save = (farFromFarmConfirmed: boolean) =>
    change.mutate({ name, position, farFromFarmConfirmed }, { onSuccess: onClose });
  if (removing) {
    return (
      <ConfirmDialog
        title={`Remove ${building.name}?`}
        action="Remove it for good"
        busy={remove.isPending}
        error={remove.error}
        onConfirm={() => remove.mutate()}
        onClose={onClose}
      >
        <p>Its survey, its plans and what was written about them go with it. This cannot be taken back.</p>
      </ConfirmDialog>
    );
  }
  const submit = (event: FormEvent) => {
    event.preventDefault();
    save(false);
  };
  return (
    <Dialog title={`Change ${building.name}`} onClose={onClose}>
      <form onSubmit={submit} className="mt-4 grid gap-4" noValidate>
        <TextField label="Name" value={name} onValue={setName} problem={fields.name} autoComplete="off" />
        <PositionFields position={position} onPosition={setPosition} problem={fields.position} />
        {fields.position ? (
          <Button kind="quiet" busy={change.isPending} onClick={() => save(true)}>
            The place is right, keep it
          </Button>
        ) : null}
        {change.error && Object.keys(fields).length === 0 ? (
          <p role="alert" className="m-0 border-l-[6px] border-redlead bg-redlead-tint p-3">
            {change.error.message}
          </p>
        ) : null}
        <div className="flex flex-wrap gap-3">
          <Button type="submit" busy={change.isPending}>
            Keep
          </Button>
          <Button kind="plain" onClick={onClose}>
            Leave it
          </Button>
          <Button kind="decline" className="ml-auto" onClick={() => setRemoving(true)}>
            Remove
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
