import type { Position } from "../../contracts/common.ts";
import { greatCircleKm } from "../../engine/climate/nearest-station.ts";
import { invalid } from "../../errors.ts";

/** A building farther than this from its farm is asked about before it is kept. */
const FAR_KM = 50;

function distanceKm(a: Position, b: Position): number {
  return greatCircleKm(a.latitudeDeg, a.longitudeDeg, b.latitudeDeg, b.longitudeDeg);
}

/** Slips of the hand that put a pin on another continent, with the words that name them. */
function slips({ latitudeDeg, longitudeDeg }: Position): { words: string; position: Position }[] {
  return [
    {
      words: "latitude and longitude look swapped",
      position: { latitudeDeg: longitudeDeg, longitudeDeg: latitudeDeg },
    },
    {
      words: "the sign of the longitude looks wrong",
      position: { latitudeDeg, longitudeDeg: -longitudeDeg },
    },
    { words: "the sign of the latitude looks wrong", position: { latitudeDeg: -latitudeDeg, longitudeDeg } },
  ].filter(({ position }) => Math.abs(position.latitudeDeg) <= 90);
}

/** Refuses a pin that is far from its farm until the person has confirmed it, and names the likely slip. */
export function checkPosition(pin: Position, farm: Position & { name: string }, confirmed: boolean): void {
  const away = distanceKm(pin, farm);
  if (confirmed || away <= FAR_KM) return;
  const slip = slips(pin).find(({ position }) => distanceKm(position, farm) <= FAR_KM);
  const hint = slip === undefined ? "If it is right, confirm it." : `Perhaps ${slip.words}.`;
  throw invalid(
    { position: `This is ${Math.round(away)} km from ${farm.name}. ${hint}` },
    "The pin is far from the farm.",
  );
}
