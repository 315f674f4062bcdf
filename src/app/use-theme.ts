import { useEffect, useSyncExternalStore } from "react";
import type { MeView } from "../../server/contracts/people.ts";

const darkQuery = "(prefers-color-scheme: dark)";

function useSystemIsDark(): boolean {
  return useSyncExternalStore(
    (changed) => {
      const query = window.matchMedia(darkQuery);
      query.addEventListener("change", changed);
      return () => query.removeEventListener("change", changed);
    },
    () => window.matchMedia(darkQuery).matches,
  );
}

/** Puts the chosen theme on the page; "system" follows the device. Returns whether it is evening. */
export function useTheme(theme: MeView["theme"]): boolean {
  const systemIsDark = useSystemIsDark();
  const evening = theme === "evening" || (theme === "system" && systemIsDark);
  useEffect(() => {
    document.documentElement.dataset.theme = evening ? "evening" : "day";
  }, [evening]);
  return evening;
}
