/** O is left out: it is east in German and west in French and Spanish, and a guess would move the house by a continent. */
const compass: Record<string, number> = { N: 1, S: -1, E: 1, W: -1 };

/** A typed degree as a number: decimal degrees, a leading minus or a letter for the half of the world. Null when it is no number. */
export function parseDegrees(text: string): number | null {
  const match = /^\s*([NSEW])?\s*([-−+]?\d{1,3}(?:[.,]\d+)?)\s*°?\s*([NSEW])?\s*$/i.exec(text);
  if (match === null) return null;
  const value = Number((match[2] ?? "").replace(",", ".").replace("−", "-"));
  const letter = (match[1] ?? match[3] ?? "").toUpperCase();
  return Number.isFinite(value) ? value * (compass[letter] ?? 1) : null;
}

/** Degrees with their half of the world, as on the map's edge. */
export function degreesText(value: number, axis: "latitude" | "longitude", decimals = 4): string {
  const letters = axis === "latitude" ? ["N", "S"] : ["E", "W"];
  return `${Math.abs(value).toFixed(decimals)}° ${value < 0 ? letters[1] : letters[0]}`;
}
