import { useQuery } from "@tanstack/react-query";
import { X } from "lucide-react";
import { useState } from "react";
import type { PersonView, Role } from "../../../server/contracts/people.ts";
import { Button, buttonLook } from "../../components/button.tsx";
import { ConfirmDialog } from "../../components/confirm-dialog.tsx";
import { type DataColumn, DataTable } from "../../components/data-table.tsx";
import { PageState } from "../../components/page-state.tsx";
import { counted } from "../../lib/format.ts";
import { meQuery } from "../../lib/me-query.ts";
import { peopleQuery } from "../../lib/people-query.ts";
import { useRemoveRole } from "./api.ts";
import { InviteForm } from "./invite-form.tsx";
import { roleWords } from "./role-words.ts";

interface Asked {
  person: PersonView;
  role: Role;
}

function Roles({ person, onAsk }: { person: PersonView; onAsk(role: Role): void }) {
  return (
    <span className="flex flex-wrap gap-2 max-md:justify-end">
      {person.roles.map((role) => (
        <Button
          key={role}
          kind="plain"
          className="text-sm"
          aria-label={`${roleWords[role]}: take this role from ${person.name}`}
          onClick={() => onAsk(role)}
        >
          {roleWords[role]}
          <X size={16} aria-hidden="true" />
        </Button>
      ))}
    </span>
  );
}

function RemoveRole({
  asked,
  cooperativeId,
  onClose,
}: {
  asked: Asked;
  cooperativeId: string;
  onClose(): void;
}) {
  const remove = useRemoveRole(cooperativeId);
  const { person, role } = asked;
  const farms = role === "manager" ? [] : person.farmNames;
  return (
    <ConfirmDialog
      title={`Take a role from ${person.name}?`}
      action="Take the role away"
      busy={remove.isPending}
      error={remove.error}
      onConfirm={() => remove.mutate({ personId: person.id, role }, { onSuccess: onClose })}
      onClose={onClose}
    >
      <p>
        {`${person.name} is then no longer ${roleWords[role].toLowerCase()} of this co-operative`}
        {farms.length > 0 ? ` and no longer works on ${farms.join(", ")}` : ""}. What was written and answered
        stays as it is.
      </p>
    </ConfirmDialog>
  );
}

/** Everybody of the co-operative, and how new people come in. */
export function PeopleScreen() {
  const { data: me } = useQuery(meQuery);
  const cooperativeId = me?.activeCooperativeId ?? "";
  const people = useQuery({ ...peopleQuery(cooperativeId), enabled: cooperativeId !== "" });
  const [asked, setAsked] = useState<Asked | null>(null);
  if (people.isError && people.data === undefined) {
    return <PageState kind="error" error={people.error} onRetry={() => void people.refetch()} />;
  }
  if (people.data === undefined) return <PageState kind="loading" />;
  const columns: DataColumn<PersonView, "person" | "farms" | "seen" | "roles">[] = [
    {
      key: "person",
      header: "Person",
      names: true,
      cell: (person) => (
        <>
          <b className="block text-base">{person.name}</b>
          <span className="text-ink-2 [overflow-wrap:anywhere] md:whitespace-nowrap">{person.email}</span>
        </>
      ),
    },
    { key: "farms", header: "Farms", cell: (person) => person.farmNames.join(", ") || "–" },
    {
      key: "seen",
      header: "Signed in",
      cell: (person) => (person.hasSignedIn ? "yes" : "not yet"),
    },
    {
      key: "roles",
      header: "Roles",
      cell: (person) => <Roles person={person} onAsk={(role) => setAsked({ person, role })} />,
    },
  ];
  return (
    <div className="mx-auto grid w-full max-w-[1280px] content-start items-start gap-x-12 gap-y-8 px-4 py-6 md:px-8 lg:grid-cols-[minmax(0,5fr)_minmax(280px,2fr)]">
      <div className="flex flex-wrap items-center justify-between gap-3 lg:col-span-2">
        <h1 className="m-0 font-sign text-2xl font-extrabold">
          {counted(people.data.length, "person", "people")}
        </h1>
        <a href="#invite" className={`${buttonLook("quiet")} lg:hidden`}>
          Invite a person
        </a>
      </div>
      <DataTable
        caption="People of the co-operative"
        columns={columns}
        rows={people.data}
        rowId={(person) => person.id}
        empty="Nobody yet."
      />
      <InviteForm cooperativeId={cooperativeId} />
      {asked === null ? null : (
        <RemoveRole asked={asked} cooperativeId={cooperativeId} onClose={() => setAsked(null)} />
      )}
    </div>
  );
}
