import { useQuery } from "@tanstack/react-query";
import { Navigate, Outlet, ScrollRestoration, useLocation } from "react-router-dom";
import { PageState } from "../components/page-state.tsx";
import { ApiError } from "../lib/api-client.ts";
import { meQuery } from "../lib/me-query.ts";
import { Head } from "./head.tsx";
import { PhoneBar } from "./phone-bar.tsx";
import { RouteProgress } from "./route-progress.tsx";
import { useTheme } from "./use-theme.ts";

/** Head, sheet and, on a phone, the bar at the foot. Everything inside needs a signed-in person. */
export function Shell() {
  const { pathname, search } = useLocation();
  const me = useQuery(meQuery);
  const evening = useTheme(me.data?.theme ?? "system");
  if (me.error instanceof ApiError && me.error.status === 401) {
    return <Navigate to={`/sign-in?to=${encodeURIComponent(pathname + search)}`} replace />;
  }
  if (me.isError && me.data === undefined) {
    return <PageState kind="error" error={me.error} onRetry={() => void me.refetch()} />;
  }
  if (me.data === undefined) return <PageState kind="loading" />;
  if (me.data.activeRole === null) return <Navigate to="/no-access" replace />;
  return (
    <div className="flex min-h-dvh flex-col">
      <a
        href="#sheet"
        className="absolute left-2 z-[2000] -translate-y-20 bg-ink px-4 py-3 font-bold text-sheet focus:translate-y-2"
      >
        To the content
      </a>
      <div className="relative">
        <Head me={me.data} role={me.data.activeRole} evening={evening} />
        <RouteProgress />
      </div>
      <main
        id="sheet"
        tabIndex={-1}
        className="flex min-h-0 flex-1 flex-col outline-none max-md:pb-17 print:pb-0"
      >
        <Outlet />
      </main>
      <PhoneBar me={me.data} role={me.data.activeRole} />
      <ScrollRestoration />
    </div>
  );
}
