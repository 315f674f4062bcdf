import { z } from "zod";
import type { LibraryView } from "../../contracts/library.ts";
import { referenceUValueWM2K } from "../../engine/envelope/reference-u-value.ts";
import { route } from "../../http/route.ts";
import { stackOf, stackTransmittance } from "./cover-stack.ts";
import { referenceData } from "./reference-data.ts";

function buildLibrary(): LibraryView {
  const covers = [...referenceData.covers.values()].map((row) => ({
    id: row.id,
    name: row.name,
    group: row.group,
    source: row.source,
    usedFor: row.usedFor,
    parts: row.parts,
    uValueWM2K: row.publishedUValueWM2K ?? referenceUValueWM2K(stackOf(row)),
    uValuePublished: row.publishedUValueWM2K !== null,
    solarTransmittance: stackTransmittance(row),
    layers: row.layers.map(({ name, thicknessMm }) => ({ name, thicknessMm })),
  }));
  const animals = [...referenceData.animals.values()].map((row) => ({
    ...row,
    ventilationM3HHead: row.perHeadM3H,
  }));
  return {
    covers,
    animals,
    screens: [...referenceData.screens.values()],
    crops: [...referenceData.crops.values()],
    leakage: [...referenceData.leakage.values()],
    floorEdges: [...referenceData.floorEdges.values()],
    heaterTypes: [...referenceData.heaterTypes.values()],
    fuels: [...referenceData.fuels.values()],
  };
}

/** The tables never change while the server runs. */
let library: LibraryView | null = null;

export const libraryRoutes = [
  route({
    method: "get",
    path: "/api/library",
    summary: "Reference lists the survey chooses from",
    schema: z.object({}),
    run: async () => {
      library ??= buildLibrary();
      return library;
    },
  }),
];
