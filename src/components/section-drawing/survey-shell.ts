import type { CoverEntry } from "../../../server/contracts/library.ts";
import type { Survey } from "../../../server/contracts/survey.ts";
import type { Contents } from "./contents.tsx";
import type { Shell } from "./shell.tsx";

const OPAQUE = 0.05;
const LEAST_GAP_MM = 3;
const BOARD_WMK = 0.04;
const INSULATED_WM2K = 1.5;

const animalsByWord: [RegExp, Contents][] = [
  [/chick|hen|broiler|layer|turkey|poult|pullet|bird|duck|goose/, "birds"],
  [/pig|sow|swine|farrow|wean|boar|hog/, "pigs"],
  [/./, "cattle"],
];

/** What stands in the house, by the library entry it names. */
export function contentsOf(use: Survey["use"]): Contents {
  if (use.kind === "greenhouse") return "crop";
  return animalsByWord.find(([words]) => words.test(use.animal.value))?.[1] ?? "empty";
}

/** How the envelope of a surveyed house is drawn: true thickness from the layers of its roof cover. */
export function shellOf(survey: Survey, covers: CoverEntry[] | undefined): Shell {
  const part =
    survey.shape.type === "atticBarn" ? (survey.covers.ceiling ?? survey.covers.roof) : survey.covers.roof;
  const cover = covers?.find((entry) => entry.id === part.cover.value);
  const listedMm = cover?.layers.reduce((sum, layer) => sum + (layer.thicknessMm ?? 0), 0) ?? 0;
  const opaque = cover ? cover.solarTransmittance < OPAQUE : survey.use.kind === "barn";
  // Opaque parts are listed by their resistance: drawn as thick as wool or board of that U-value would be.
  const solidMm = cover && opaque ? Math.max(listedMm, (BOARD_WMK / cover.uValueWM2K) * 1000) : listedMm;
  // The library lists solid layers only; two of them stand apart by a gap of which the drawing shows the least it can.
  const thicknessMm = cover && cover.layers.length > 1 ? Math.max(solidMm, LEAST_GAP_MM) : solidMm;
  return {
    thicknessM: thicknessMm / 1000,
    insulated: opaque && (!cover || cover.uValueWM2K < INSULATED_WM2K),
    contents: contentsOf(survey.use),
    screen: survey.screen ? "shut" : null,
  };
}
