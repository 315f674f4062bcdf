import { NavLink } from "react-router-dom";
import type { MeView, Role } from "../../server/contracts/people.ts";
import { navigation } from "./navigation.ts";

/** The pages of the role within reach of the thumb. */
export function PhoneBar({ me, role }: { me: MeView; role: Role }) {
  return (
    <nav
      aria-label="Main"
      className="fixed inset-x-0 bottom-0 z-[1200] flex border-t-2 border-ink bg-limewash pb-[env(safe-area-inset-bottom)] md:hidden print:hidden"
    >
      {navigation[role].map((cell) => (
        <NavLink
          key={cell.to}
          to={cell.to}
          className={({ isActive }) =>
            `flex min-h-15 flex-1 items-center justify-center gap-2 border-l border-rule text-ink no-underline first:border-l-0 ${isActive ? "bg-ink font-bold text-sheet" : ""}`
          }
        >
          {({ isActive }) => (
            <>
              {cell.label}
              {cell.counts && me.openReviews > 0 ? (
                <span
                  className={`rounded-control border-[1.5px] px-1.5 text-sm ${isActive ? "border-sheet" : "border-ink"}`}
                >
                  {me.openReviews}
                </span>
              ) : null}
            </>
          )}
        </NavLink>
      ))}
    </nav>
  );
}
