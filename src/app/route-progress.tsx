import { useEffect, useState } from "react";
import { useNavigation } from "react-router-dom";

/** Quick pages need no words. */
const QUIET_MS = 400;

/** Says that the next page is on its way, while the last one still stands. */
export function RouteProgress() {
  const busy = useNavigation().state === "loading";
  const [late, setLate] = useState(false);
  useEffect(() => {
    if (!busy) return;
    const timer = setTimeout(() => setLate(true), QUIET_MS);
    return () => {
      clearTimeout(timer);
      setLate(false);
    };
  }, [busy]);
  return (
    <p
      role="status"
      className={
        late
          ? "absolute top-full left-0 z-[1400] m-0 border-r-2 border-b-2 border-ink bg-sheet px-4 py-2 text-sm"
          : "sr-only"
      }
    >
      {late ? "Fetching the next page" : ""}
    </p>
  );
}
