import { ApiError } from "../../../lib/api-client.ts";
import type { PinDraft } from "./pin-draft.ts";

/** Fields of the form that say their own problem. */
const shown = [
  "name",
  "farmId",
  "shapeType",
  "position",
  "position.latitudeDeg",
  "position.longitudeDeg",
  "footprint.length",
  "footprint.width",
  "footprint.ridgeBearing",
];

/** What is missing before anything is sent. */
export function missingParts(draft: PinDraft): Record<string, string> {
  const problems: Record<string, string> = {};
  if (draft.farmId === "") problems.farmId = "Choose whose building it is.";
  if (draft.position === null) {
    problems.position = "Say where it stands: click on the map, type degrees, or use this device.";
  }
  if (draft.name.trim() === "") problems.name = "Building name is missing.";
  return problems;
}

/** The server's sentences by field, and what is left over for the foot of the form. */
export function sortRefusal(error: Error | null): { fields: Record<string, string>; refusal: string | null } {
  if (error === null) return { fields: {}, refusal: null };
  if (!(error instanceof ApiError)) return { fields: {}, refusal: error.message };
  const rest = Object.entries(error.fields)
    .filter(([field]) => !shown.includes(field))
    .map(([, sentence]) => sentence);
  const hasShown = Object.keys(error.fields).some((field) => shown.includes(field));
  if (rest.length > 0) return { fields: error.fields, refusal: rest.join(" ") };
  return {
    fields: error.fields,
    refusal: hasShown ? "Nothing was kept yet. See the marked answers." : error.message,
  };
}

/** The server asks back when a pin is far from its farm; every other refusal of a place is final. */
export function asksWhetherFar(error: Error | null): boolean {
  return error instanceof ApiError && error.code === "invalid_input" && "position" in error.fields;
}
