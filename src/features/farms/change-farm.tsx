import { type FormEvent, useState } from "react";
import { useNavigate } from "react-router-dom";
import type { FarmView } from "../../../server/contracts/farms.ts";
import { Button } from "../../components/button.tsx";
import { ConfirmDialog } from "../../components/confirm-dialog.tsx";
import { Dialog } from "../../components/dialog.tsx";
import { PositionFields } from "../../components/position-fields.tsx";
import { TextField } from "../../components/text-field.tsx";
import { ApiError } from "../../lib/api-client.ts";
import { counted } from "../../lib/format.ts";
import { useChangeFarm, useRemoveFarm } from "./api.ts";

/** Name and place of a farm, and its removal where the reader may do that. */
export function ChangeFarm({ farm, onClose }: { farm: FarmView; onClose(): void }) {
  const navigate = useNavigate();
  const change = useChangeFarm(farm.id);
  const remove = useRemoveFarm(farm.id);
  const [removing, setRemoving] = useState(false);
  const [name, setName] = useState(farm.name);
  const [place, setPlace] = useState(farm.place);
  const [position, setPosition] = useState({
    latitudeDeg: farm.latitudeDeg,
    longitudeDeg: farm.longitudeDeg,
  });
  const fields = change.error instanceof ApiError ? change.error.fields : {};
  if (removing) {
    return (
      <ConfirmDialog
        title={`Remove ${farm.name}?`}
        action="Remove it for good"
        busy={remove.isPending}
        error={remove.error}
        onConfirm={() => remove.mutate(undefined, { onSuccess: () => navigate("/farms", { replace: true }) })}
        onClose={onClose}
      >
        <p>{`The farm goes with ${counted(farm.buildingCount, "building")}, their surveys and plans. This cannot be taken back.`}</p>
      </ConfirmDialog>
    );
  }
  const submit = (event: FormEvent) => {
    event.preventDefault();
    change.mutate({ name, place, position }, { onSuccess: onClose });
  };
  return (
    <Dialog title={`Change ${farm.name}`} onClose={onClose}>
      <form onSubmit={submit} className="mt-4 grid gap-4" noValidate>
        <TextField label="Name of the farm" value={name} onValue={setName} problem={fields.name} />
        <TextField label="Place" value={place} onValue={setPlace} problem={fields.place} />
        <PositionFields
          position={position}
          onPosition={setPosition}
          problem={fields["position.latitudeDeg"] ?? fields["position.longitudeDeg"]}
        />
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
          {farm.can.delete ? (
            <Button kind="decline" className="ml-auto" onClick={() => setRemoving(true)}>
              Remove
            </Button>
          ) : null}
        </div>
      </form>
    </Dialog>
  );
}
