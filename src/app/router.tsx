import { createBrowserRouter, type RouteObject } from "react-router-dom";
import { PageState } from "../components/page-state.tsx";
import { RouteError } from "./route-error.tsx";
import { Shell } from "./shell.tsx";
import { Start } from "./start.tsx";

/** Each screen is a file of its own that is fetched when it is first opened. */
const screens: RouteObject[] = [
  { index: true, element: <Start /> },
  { path: "map", lazy: () => import("./routes/map.tsx") },
  { path: "map/new", lazy: () => import("./routes/pin.tsx") },
  { path: "farms", lazy: () => import("./routes/farms.tsx") },
  { path: "farms/:farmId", lazy: () => import("./routes/farm.tsx") },
  { path: "buildings/:buildingId", lazy: () => import("./routes/building.tsx") },
  { path: "buildings/:buildingId/survey", lazy: () => import("./routes/survey.tsx") },
  { path: "buildings/:buildingId/heat", lazy: () => import("./routes/heat.tsx") },
  { path: "buildings/:buildingId/sizing", lazy: () => import("./routes/sizing.tsx") },
  { path: "reviews", lazy: () => import("./routes/reviews.tsx") },
  { path: "plans/:planId", lazy: () => import("./routes/plan.tsx") },
  { path: "sites", lazy: () => import("./routes/sites.tsx") },
  { path: "people", lazy: () => import("./routes/people.tsx") },
  { path: "*", lazy: () => import("./routes/not-found.tsx") },
];

export function createRouter() {
  // Until the first screen's file is here; the shell says the same while it waits for the person.
  const hydrateFallbackElement = <PageState kind="loading" />;
  return createBrowserRouter([
    {
      path: "/sign-in",
      errorElement: <RouteError />,
      hydrateFallbackElement,
      lazy: () => import("./routes/sign-in.tsx"),
    },
    {
      path: "/no-access",
      errorElement: <RouteError />,
      hydrateFallbackElement,
      lazy: () => import("./routes/no-access.tsx"),
    },
    {
      path: "/",
      element: <Shell />,
      errorElement: <RouteError />,
      hydrateFallbackElement,
      // A screen that fails keeps the head of the sheet around it.
      children: screens.map((screen) => ({
        ...screen,
        errorElement: <RouteError />,
        hydrateFallbackElement,
      })),
    },
  ]);
}
