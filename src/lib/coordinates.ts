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

/** A latitude typed where −90° to 90° is possible, and a longitude −180° to 180°. */
export function degreesProblem(text: string, axis: "latitude" | "longitude"): string | null {
  if (text.trim() === "") return null;
  const value = parseDegrees(text);
  const example = axis === "latitude" ? "53.3598 or 41.2 S" : "-7.4802 or 172.6 E";
  if (value === null) {
    return `${axis === "latitude" ? "Latitude" : "Longitude"} must be decimal degrees, such as ${example}.`;
  }
  const wrongSide = axis === "latitude" ? /[EW]/i : /[NS]/i;
  if (wrongSide.test(text)) return "Latitude and longitude may be swapped.";
  if (axis === "latitude" && Math.abs(value) > 90) {
    return "Latitude must lie between −90° and 90°. Latitude and longitude may be swapped.";
  }
  return axis === "longitude" && Math.abs(value) > 180 ? "Longitude must lie between −180° and 180°." : null;
}

/** The letter of the half of the world stands before or behind its number, never on both sides. */
const oneDegree = String.raw`([NSEW]\s*\d{1,3}(?:\.\d+)?\s*°?|[-−+]?\d{1,3}(?:\.\d+)?\s*°?\s*[NSEW]?)`;
const pair = new RegExp(String.raw`^\s*${oneDegree}(?:\s*[,;]\s*|\s+)${oneDegree}\s*$`, "i");

/** Both numbers pasted at once, "53.36, -7.48" or "41.2 S 172.6 E"; null when it is not such a pair. */
export function parsePair(text: string): { latitudeDeg: number; longitudeDeg: number } | null {
  const match = pair.exec(text);
  const [first = "", second = ""] = match?.slice(1) ?? [];
  const turned = /[EW]/i.test(first) || /[NS]/i.test(second);
  const [latitude, longitude] = turned ? [second, first] : [first, second];
  const latitudeDeg = parseDegrees(latitude);
  const longitudeDeg = parseDegrees(longitude);
  if (latitudeDeg === null || longitudeDeg === null) return null;
  const fits =
    degreesProblem(latitude, "latitude") === null && degreesProblem(longitude, "longitude") === null;
  return fits ? { latitudeDeg, longitudeDeg } : null;
}
