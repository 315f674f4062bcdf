import { placeSearchRequest, placesRequest } from "../../contracts/climate.ts";
import { type Call, route } from "../../http/route.ts";
import { placesIn, searchPlaces } from "./place-index.ts";

export const placeRoutes = [
  route({
    method: "get",
    path: "/api/places",
    summary: "Towns within a part of the map",
    schema: placesRequest,
    run: async ({ input }: Call<typeof placesRequest>) => ({ items: await placesIn(input.query) }),
  }),
  route({
    method: "get",
    path: "/api/places/search",
    summary: "Towns by name",
    schema: placeSearchRequest,
    run: async ({ input }: Call<typeof placeSearchRequest>) => ({
      items: await searchPlaces(input.query.text),
    }),
  }),
];
