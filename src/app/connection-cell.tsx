import { useSyncExternalStore } from "react";

function subscribe(changed: () => void): () => void {
  window.addEventListener("online", changed);
  window.addEventListener("offline", changed);
  return () => {
    window.removeEventListener("online", changed);
    window.removeEventListener("offline", changed);
  };
}

/** Says that there is no signal; nothing is lost meanwhile. */
export function ConnectionCell() {
  const online = useSyncExternalStore(subscribe, () => navigator.onLine);
  return (
    <div
      role="status"
      className={online ? "sr-only" : "flex items-center border-l border-rule bg-straw-tint px-4 text-sm"}
    >
      {online ? "" : "No signal, kept on this device"}
    </div>
  );
}
