import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { type FormEvent, useState } from "react";
import type { PersonView, Role } from "../../../server/contracts/people.ts";
import { Button } from "../../components/button.tsx";
import { PageState } from "../../components/page-state.tsx";
import { Segmented } from "../../components/segmented.tsx";
import { TextField } from "../../components/text-field.tsx";
import { ApiError, api } from "../../lib/api-client.ts";
import { meQuery } from "../../lib/me-query.ts";
import { peopleQuery } from "../../lib/people-query.ts";

const roleWords: Record<Role, string> = { advisor: "Adviser", farmer: "Farmer", manager: "Manager" };
const roleOptions: { value: Role; label: string }[] = (["advisor", "farmer", "manager"] as const).map((value) => ({
  value,
  label: roleWords[value],
}));

function InviteForm({ cooperativeId }: { cooperativeId: string }) {
  const client = useQueryClient();
  const [name, setName] = useState("");
  const [email, setEmail] = useState("");
  const [role, setRole] = useState<Role>("advisor");
  const [invited, setInvited] = useState("");
  const invite = useMutation({
    mutationFn: () => api.post(`/api/cooperatives/${cooperativeId}/people`, { name, email, role }),
    onSuccess: () => {
      setInvited(name);
      setName("");
      setEmail("");
      return client.invalidateQueries({ queryKey: ["cooperatives", cooperativeId, "people"] });
    },
  });
  const fields = invite.error instanceof ApiError ? invite.error.fields : {};
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setInvited("");
    invite.mutate();
  };
  return (
    <form onSubmit={submit} className="grid content-start gap-4" aria-label="Invite a person" noValidate>
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
      <Segmented<Role> label="Role" quietLabel={false} options={roleOptions} value={role} onChange={setRole} />
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

function PersonRow({ person, onRemove }: { person: PersonView; onRemove(role: Role): void }) {
  return (
    <tr className="border-b border-rule max-md:block max-md:py-2">
      <th scope="row" className="py-2 pr-4 text-left font-normal max-md:block max-md:py-0">
        <b>{person.name}</b>
        <span className="block text-sm break-all text-ink-2">{person.email}</span>
      </th>
      <td className="py-2 pr-4 text-sm max-md:block max-md:py-0">{person.farmNames.join(", ")}</td>
      <td className="py-2 pr-4 text-sm max-md:block max-md:py-0">
        {person.hasSignedIn ? "has signed in" : "not yet signed in"}
      </td>
      <td className="py-2 max-md:block">
        <span className="flex flex-wrap gap-2">
          {person.roles.map((role) => (
            <Button key={role} kind="plain" className="text-sm" onClick={() => onRemove(role)}>
              {roleWords[role]}
              <span className="sr-only">{`: take this role from ${person.name}`}</span>
              <span aria-hidden="true">×</span>
            </Button>
          ))}
        </span>
      </td>
    </tr>
  );
}

/** Everybody of the co-operative, and how new people come in. */
export function PeopleScreen() {
  const { data: me } = useQuery(meQuery);
  const client = useQueryClient();
  const cooperativeId = me?.activeCooperativeId ?? "";
  const people = useQuery({ ...peopleQuery(cooperativeId), enabled: cooperativeId !== "" });
  const remove = useMutation({
    mutationFn: ({ person, role }: { person: PersonView; role: Role }) =>
      api.delete<void>(`/api/cooperatives/${cooperativeId}/people/${person.id}/${role}`),
    onSuccess: () => client.invalidateQueries({ queryKey: ["cooperatives", cooperativeId, "people"] }),
  });
  const ask = (person: PersonView, role: Role) => {
    const farms =
      person.farmNames.length > 0 && role !== "manager" ? ` and from ${person.farmNames.join(", ")}` : "";
    const words = `Take the role "${roleWords[role]}" from ${person.name}${farms}? What was signed stays as it is.`;
    if (window.confirm(words)) remove.mutate({ person, role });
  };
  if (people.isError && people.data === undefined) {
    return <PageState kind="error" error={people.error} onRetry={() => void people.refetch()} />;
  }
  if (people.data === undefined) return <PageState kind="loading" />;
  return (
    <div className="mx-auto grid w-full max-w-[1180px] gap-x-12 gap-y-8 px-4 py-6 md:grid-cols-[5fr_2fr] md:px-8">
      <h1 className="m-0 font-sign text-2xl font-extrabold md:col-span-2">People</h1>
      <div>
        {remove.error ? (
          <p role="alert" className="border-l-[6px] border-redlead bg-redlead-tint p-3">
            {remove.error instanceof ApiError
              ? (Object.values(remove.error.fields)[0] ?? remove.error.message)
              : remove.error.message}
          </p>
        ) : null}
        <table className="w-full border-collapse">
          <thead className="max-md:sr-only">
            <tr className="border-b-2 border-ink text-left text-sm">
              <th scope="col" className="py-2 font-semibold">
                Person
              </th>
              <th scope="col" className="py-2 font-semibold">
                Farms
              </th>
              <th scope="col" className="py-2 font-semibold">
                Sign-in
              </th>
              <th scope="col" className="py-2 font-semibold">
                Roles
              </th>
            </tr>
          </thead>
          <tbody>
            {people.data.map((person) => (
              <PersonRow key={person.id} person={person} onRemove={(role) => ask(person, role)} />
            ))}
          </tbody>
        </table>
      </div>
      <InviteForm cooperativeId={cooperativeId} />
    </div>
  );
}
