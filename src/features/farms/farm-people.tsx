import { useQuery } from "@tanstack/react-query";
import { useId, useState } from "react";
import type { FarmView } from "../../../server/contracts/farms.ts";
import { Button } from "../../components/button.tsx";
import { peopleQuery } from "../../lib/people-query.ts";
import { useAssignAdvisor, useReleaseAdvisor } from "./api.ts";

const roleWords = { advisor: "Adviser", farmer: "Farmer" };

function AssignAdvisor({ farm }: { farm: FarmView }) {
  const id = useId();
  const people = useQuery(peopleQuery(farm.cooperativeId));
  const assign = useAssignAdvisor(farm.id);
  const [personId, setPersonId] = useState("");
  const assigned = new Set(farm.people.filter(({ role }) => role === "advisor").map((person) => person.id));
  const others = (people.data ?? []).filter(
    (person) => person.roles.includes("advisor") && !assigned.has(person.id),
  );
  if (others.length === 0) return null;
  return (
    <div className="mt-3 flex flex-wrap items-end gap-3">
      <div>
        <label htmlFor={id} className="block text-sm font-semibold">
          Another adviser
        </label>
        <select
          id={id}
          value={personId}
          onChange={(event) => setPersonId(event.target.value)}
          className="min-h-11 rounded-control border-[1.5px] border-rule-strong bg-sheet px-3"
        >
          <option value="">Choose</option>
          {others.map((person) => (
            <option key={person.id} value={person.id}>
              {person.name}
            </option>
          ))}
        </select>
      </div>
      <Button
        kind="plain"
        disabled={personId === ""}
        busy={assign.isPending}
        onClick={() => assign.mutate(personId, { onSuccess: () => setPersonId("") })}
      >
        Assign
      </Button>
      {assign.error ? (
        <p role="alert" className="m-0 text-sm font-semibold text-redlead">
          {assign.error.message}
        </p>
      ) : null}
    </div>
  );
}

/** Who works on the farm, and who else may. */
export function FarmPeople({ farm }: { farm: FarmView }) {
  const release = useReleaseAdvisor(farm.id);
  const advisors = farm.people.filter(({ role }) => role === "advisor").length;
  return (
    <section aria-labelledby="farm-people">
      <h2 id="farm-people" className="m-0 border-b-2 border-ink pb-1 font-sign text-lg font-bold">
        People
      </h2>
      <ul className="m-0 list-none p-0">
        {farm.people.map((person) => (
          <li
            key={`${person.id} ${person.role}`}
            className="flex min-h-12 flex-wrap items-center justify-between gap-x-4 border-b border-rule py-1"
          >
            <span>
              <b>{person.name}</b>
              <span className="block text-sm break-all text-ink-2">{person.email}</span>
            </span>
            <span className="flex items-center gap-3 text-sm">
              {roleWords[person.role]}
              {farm.can.assign && person.role === "advisor" && advisors > 1 ? (
                <Button kind="plain" className="text-sm" onClick={() => release.mutate(person.id)}>
                  {`Release ${person.name}`}
                </Button>
              ) : null}
            </span>
          </li>
        ))}
      </ul>
      {farm.can.assign ? <AssignAdvisor farm={farm} /> : null}
    </section>
  );
}
