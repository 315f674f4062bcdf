import { type FormEvent, useState } from "react";
import type { Role } from "../../../server/contracts/people.ts";
import { Button } from "../../components/button.tsx";
import { Segmented } from "../../components/segmented.tsx";
import { TextField } from "../../components/text-field.tsx";
import { ApiError } from "../../lib/api-client.ts";
import { useInvite } from "./api.ts";
import { roleOptions } from "./role-words.ts";

const mayDo: Record<Role, string> = {
  advisor: "Adds farms, surveys buildings, works out plans and sends them.",
  farmer: "Sees the own farm and answers its plans. An adviser adds the farm.",
  manager: "Sees which houses hold, and who belongs to the co-operative.",
};

/** Adds a person by the address they sign in with. */
export function InviteForm({ cooperativeId }: { cooperativeId: string }) {
  const [name, setName] = useState("");
  const [email, setEmail] = useState("");
  const [role, setRole] = useState<Role>("advisor");
  const [invited, setInvited] = useState("");
  const invite = useInvite(cooperativeId);
  const fields = invite.error instanceof ApiError ? invite.error.fields : {};
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setInvited("");
    invite.mutate(
      { name, email, role },
      {
        onSuccess: () => {
          setInvited(name);
          setName("");
          setEmail("");
        },
      },
    );
  };
  return (
    <form
      id="invite"
      onSubmit={submit}
      className="grid content-start gap-4"
      aria-label="Invite a person"
      noValidate
    >
      <h2 className="m-0 border-b-2 border-ink pb-1 font-sign text-lg font-bold">Invite a person</h2>
      <TextField label="Name" value={name} onValue={setName} problem={fields.name} autoComplete="off" />
      <TextField
        label="E-mail"
        type="email"
        hint="The address they sign in with."
        value={email}
        onValue={setEmail}
        problem={fields.email}
        autoComplete="off"
      />
      <div>
        <Segmented<Role>
          label="Role"
          quietLabel={false}
          options={roleOptions}
          value={role}
          onChange={setRole}
        />
        <p className="m-0 mt-2 text-sm text-ink-2">{mayDo[role]}</p>
      </div>
      <Button type="submit" busy={invite.isPending} className="justify-self-start">
        Invite
      </Button>
      {invite.error && Object.keys(fields).length === 0 ? (
        <p role="alert" className="m-0 font-semibold text-redlead">
          {invite.error.message}
        </p>
      ) : null}
      <p role="status" className="m-0">
        {invited === "" ? "" : `${invited} was added, and a letter is on its way.`}
      </p>
    </form>
  );
}
