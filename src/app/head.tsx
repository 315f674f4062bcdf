import { Moon, Sun } from "lucide-react";
import { Link, NavLink } from "react-router-dom";
import type { MeView, Role } from "../../server/contracts/people.ts";
import { Segmented } from "../components/segmented.tsx";
import { Wordmark } from "../components/wordmark.tsx";
import { usePreferences } from "../lib/preferences.ts";
import { ConnectionCell } from "./connection-cell.tsx";
import { navigation } from "./navigation.ts";
import { PersonMenu } from "./person-menu.tsx";

interface HeadProps {
  me: MeView;
  role: Role;
  evening: boolean;
}

const unitOptions = [
  { value: "si" as const, label: "SI units" },
  { value: "us" as const, label: "US units" },
];

/** A row of ruled cells: sign, pages of the role, co-operative, units, theme, person. */
export function Head({ me, role, evening }: HeadProps) {
  const preferences = usePreferences();
  const cooperative = me.memberships.find((entry) => entry.cooperativeId === me.activeCooperativeId);
  return (
    <header className="flex min-h-14 items-stretch border-b-2 border-ink bg-limewash max-md:min-h-15 print:hidden">
      <Link to="/" className="flex items-center px-4 md:pr-6" aria-label="Glassbyre, to the start">
        <Wordmark />
      </Link>
      <nav aria-label="Main" className="flex max-md:hidden">
        {navigation[role].map((cell) => (
          <NavLink
            key={cell.to}
            to={cell.to}
            className={({ isActive }) =>
              `flex items-center gap-2 border-l border-rule px-5 text-ink no-underline hover:bg-trough ${isActive ? "border-b-[5px] border-b-bottle pt-[5px] font-bold" : ""}`
            }
          >
            {cell.label}
            {cell.counts && me.openReviews > 0 ? (
              <span className="rounded-control border-[1.5px] border-ink px-1.5 text-sm leading-5">
                {me.openReviews}
                <span className="sr-only"> waiting</span>
              </span>
            ) : null}
          </NavLink>
        ))}
      </nav>
      <p className="m-0 flex min-w-0 flex-1 items-center border-l border-rule px-5 text-sm text-ink-2 max-xl:invisible">
        <span className="truncate">{cooperative?.cooperativeName}</span>
      </p>
      <ConnectionCell />
      <div className="flex items-center border-l border-rule px-3 max-lg:hidden">
        <Segmented
          label="Units"
          options={unitOptions}
          value={me.units}
          onChange={(units) => preferences.mutate({ units })}
        />
      </div>
      <button
        type="button"
        className="flex items-center gap-2 border-l border-rule px-4 text-sm hover:bg-trough max-lg:hidden"
        onClick={() => preferences.mutate({ theme: evening ? "day" : "evening" })}
      >
        {evening ? <Sun size={20} aria-hidden="true" /> : <Moon size={20} aria-hidden="true" />}
        {evening ? "Day" : "Evening"}
      </button>
      <PersonMenu me={me} role={role} />
    </header>
  );
}
