import { useQueryClient } from "@tanstack/react-query";
import { ChevronDown } from "lucide-react";
import { useEffect, useRef } from "react";
import { useNavigate } from "react-router-dom";
import type { MembershipView, MeView, Role } from "../../server/contracts/people.ts";
import { buttonLook } from "../components/button.tsx";
import { Segmented } from "../components/segmented.tsx";
import { api } from "../lib/api-client.ts";
import { usePreferences } from "../lib/preferences.ts";
import { roleWords } from "./navigation.ts";

const unitOptions = [
  { value: "si" as const, label: "SI units" },
  { value: "us" as const, label: "US units" },
];
const themeOptions = [
  { value: "day" as const, label: "Day" },
  { value: "evening" as const, label: "Evening" },
  { value: "system" as const, label: "As the device" },
];

/** Closes an open menu when the person turns to something else. */
function useCloseOutside() {
  const menu = useRef<HTMLDetailsElement>(null);
  useEffect(() => {
    const close = (event: Event) => {
      const inside = event.target instanceof Node && menu.current?.contains(event.target);
      if (menu.current && !inside) menu.current.open = false;
    };
    const closeOnEscape = (event: KeyboardEvent) => {
      if (event.key !== "Escape" || !menu.current?.open) return;
      menu.current.open = false;
      menu.current.querySelector("summary")?.focus();
    };
    document.addEventListener("pointerdown", close);
    document.addEventListener("keydown", closeOnEscape);
    return () => {
      document.removeEventListener("pointerdown", close);
      document.removeEventListener("keydown", closeOnEscape);
    };
  }, []);
  return menu;
}

interface PersonMenuProps {
  me: MeView;
  role: Role;
}

export function PersonMenu({ me, role }: PersonMenuProps) {
  const menu = useCloseOutside();
  const preferences = usePreferences();
  const client = useQueryClient();
  const navigate = useNavigate();
  const others = me.memberships.filter(
    (entry) => entry.role !== role || entry.cooperativeId !== me.activeCooperativeId,
  );
  const signOut = async () => {
    await api.post("/auth/sign-out", {});
    client.clear();
    navigate("/sign-in");
  };
  const workAs = (entry: MembershipView) => {
    preferences.mutate(
      { activeRole: entry.role, activeCooperativeId: entry.cooperativeId },
      { onSuccess: () => navigate("/") },
    );
  };
  return (
    <details ref={menu} className="relative border-l border-rule">
      <summary className="flex h-full min-w-33 list-none items-center gap-2 px-4 hover:bg-trough max-md:min-w-0">
        <span className="min-w-0 flex-1 leading-5">
          <b className="block truncate text-sm max-md:max-w-28">{me.name}</b>
          <span className="block text-xs text-ink-2">{roleWords[role]}</span>
        </span>
        <ChevronDown size={18} aria-hidden="true" />
      </summary>
      <div className="absolute right-0 z-[1500] grid w-74 gap-4 border-2 border-ink bg-sheet p-4">
        <p className="m-0 text-sm break-words text-ink-2">{me.email}</p>
        <Segmented
          label="Units"
          quietLabel={false}
          options={unitOptions}
          value={me.units}
          onChange={(units) => preferences.mutate({ units })}
        />
        <Segmented
          label="Theme"
          quietLabel={false}
          options={themeOptions}
          value={me.theme}
          onChange={(theme) => preferences.mutate({ theme })}
        />
        {others.map((entry) => (
          <button
            key={`${entry.cooperativeId} ${entry.role}`}
            type="button"
            className={buttonLook("plain")}
            onClick={() => workAs(entry)}
          >
            {`Work as ${roleWords[entry.role].toLowerCase()}, ${entry.cooperativeName}`}
          </button>
        ))}
        <button type="button" className={buttonLook("plain")} onClick={() => void signOut()}>
          Sign out
        </button>
      </div>
    </details>
  );
}
