import { buildingRoutes } from "./features/buildings/buildings.routes.ts";
import { climateRoutes } from "./features/climate/climate.routes.ts";
import { farmRoutes } from "./features/farms/farms.routes.ts";
import { libraryRoutes } from "./features/library/library.routes.ts";
import { peopleRoutes } from "./features/people/people.routes.ts";
import { placeRoutes } from "./features/places/places.routes.ts";
import { planRoutes } from "./features/plans/plans.routes.ts";
import { sessionRoutes } from "./features/session/session.routes.ts";
import { siteRoutes } from "./features/sites/sites.routes.ts";
import type { Route } from "./http/route.ts";

/** Every route for signed-in people. Router, API description and the authorisation test are made from this list. */
export const routes: Route[] = [
  ...sessionRoutes,
  ...libraryRoutes,
  ...farmRoutes,
  ...buildingRoutes,
  ...climateRoutes,
  ...placeRoutes,
  ...planRoutes,
  ...siteRoutes,
  ...peopleRoutes,
];
