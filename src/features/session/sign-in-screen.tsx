import { useQuery } from "@tanstack/react-query";
import { useSearchParams } from "react-router-dom";
import { buttonLook } from "../../components/button.tsx";
import { Wordmark } from "../../components/wordmark.tsx";
import { api } from "../../lib/api-client.ts";
import { ColdNight } from "./cold-night.tsx";

interface SignInOptions {
  fakePeople: { name: string; email: string; role: string; farm: string }[] | null;
}

const optionsQuery = {
  queryKey: ["sign-in-options"],
  queryFn: ({ signal }: { signal: AbortSignal }) =>
    api.get<SignInOptions>("/api/sign-in-options", { signal }),
};

function address(to: string, as?: string): string {
  const query = new URLSearchParams({ to, ...(as === undefined ? {} : { as }) });
  return `/auth/google?${query}`;
}

function DemoPeople({ people, to }: { people: NonNullable<SignInOptions["fakePeople"]>; to: string }) {
  return (
    <details className="border-t border-rule pt-2" open>
      <summary className="flex min-h-11 items-center font-bold">People of the demonstration</summary>
      <p className="m-0 text-sm text-ink-2">
        They are invented. This list shows while the sign-in stand-in is in use.
      </p>
      <ul className="m-0 mt-2 max-h-80 list-none overflow-y-auto border-y border-rule p-0" tabIndex={-1}>
        {people.map((person) => (
          <li key={person.email} className="border-b border-rule last:border-b-0">
            <a
              href={address(to, person.email)}
              className="flex min-h-12 flex-wrap items-center justify-between gap-x-4 px-2 text-ink no-underline hover:bg-trough"
            >
              <b>{person.name}</b>
              <span className="text-sm text-ink-2">{`${person.role}, ${person.farm}`}</span>
            </a>
          </li>
        ))}
      </ul>
    </details>
  );
}

export function SignInScreen() {
  const [search] = useSearchParams();
  const options = useQuery(optionsQuery);
  const to = search.get("to") ?? "/";
  return (
    <main className="grid min-h-dvh md:grid-cols-[3fr_2fr]">
      <section className="relative isolate overflow-hidden bg-[#0f1718] px-6 py-8 text-[#eaf1ee] max-md:order-2 max-md:min-h-110 md:p-14">
        <div className="absolute inset-0 -z-10">
          <ColdNight />
        </div>
        <p className="m-0 max-w-[17ch] font-sign text-3xl font-extrabold max-md:text-2xl">
          Which house holds on the coldest night?
        </p>
        <p className="m-0 mt-4 max-w-[44ch] text-[#b3c1bc]">
          Where the heat goes, month by month. What it takes to keep it. What happens when a heater stops.
        </p>
      </section>
      <section className="flex flex-col justify-center gap-5 bg-sheet px-6 py-10 md:px-12">
        <Wordmark heightPx={48} />
        <h1 className="m-0 font-sign text-xl font-bold">Heating plans for greenhouses and barns</h1>
        {search.has("failed") ? (
          <p role="alert" className="m-0 border-l-[6px] border-redlead bg-redlead-tint p-3">
            The sign-in did not go through. Please try again.
          </p>
        ) : null}
        <a href={address(to)} className={buttonLook()}>
          Sign in with Google
        </a>
        <p className="m-0 text-sm text-ink-2">Use the e-mail address your co-operative has on its list.</p>
        {options.data?.fakePeople ? <DemoPeople people={options.data.fakePeople} to={to} /> : null}
      </section>
    </main>
  );
}
