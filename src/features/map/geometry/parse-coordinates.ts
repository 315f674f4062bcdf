import type { GroundPoint } from "./footprint.ts";

export type ParsedCoordinates = { point: GroundPoint } | { problem: string };

const NUMBER = /[-−+]?\d+(?:\.\d+)?/g;
const HINT = "Write them like 52.3512, 4.1034 or 43.52 S, 172.61 E.";

interface Part {
  value: number;
  side: string;
}

/** Cuts the text into two numbers, each with the letter of its side where one stands. */
function parts(text: string): Part[] {
  const found = [...text.matchAll(/([NSEW])?\s*([-−+]?\d+(?:\.\d+)?)\s*°?\s*([NSEW])?/gi)];
  return found.map(([, before, digits = "", after]) => ({
    value: Number(digits.replace("−", "-")),
    side: (after ?? before ?? "").toUpperCase(),
  }));
}

const signed = ({ value, side }: Part) => (side === "S" || side === "W" ? -Math.abs(value) : value);

/**
 * Reads decimal degrees as people write them: "52.35, 4.10", "52.35 N 4.10 E", "W 4.10 N 52.35", "52.35° 4.10°".
 * Refuses degrees with minutes rather than misread them.
 */
export function parseCoordinates(text: string): ParsedCoordinates {
  const trimmed = text.trim();
  if (trimmed === "") return { problem: `Write the coordinates, or click on the map. ${HINT}` };
  if (/['′"″]/.test(trimmed)) {
    return {
      problem: "Minutes and seconds cannot be read here. Write decimal degrees, such as 52.3512, 4.1034.",
    };
  }
  if (/\d,\d+[^\d]+\d+,\d/.test(trimmed)) {
    return { problem: `Write a point before the decimals, not a comma. ${HINT}` };
  }
  if ((trimmed.match(NUMBER) ?? []).length !== 2) return { problem: `Two numbers are needed. ${HINT}` };
  const [first, second] = parts(trimmed);
  if (first === undefined || second === undefined) return { problem: `Two numbers are needed. ${HINT}` };
  const isLongitude = (part: Part) => part.side === "E" || part.side === "W";
  const isLatitude = (part: Part) => part.side === "N" || part.side === "S";
  if ((isLatitude(first) && isLatitude(second)) || (isLongitude(first) && isLongitude(second))) {
    return { problem: "One number must be north or south, the other east or west." };
  }
  const turned = isLongitude(first) || isLatitude(second);
  const latitudeDeg = signed(turned ? second : first);
  const longitudeDeg = signed(turned ? first : second);
  if (Math.abs(latitudeDeg) > 90) {
    return {
      problem: `Latitude must lie between −90° and 90°. You typed ${latitudeDeg}. Latitude and longitude may be swapped.`,
    };
  }
  if (Math.abs(longitudeDeg) > 180) {
    return { problem: `Longitude must lie between −180° and 180°. You typed ${longitudeDeg}.` };
  }
  return { point: { latitudeDeg, longitudeDeg } };
}

/** A point as the field writes it: five decimals are about a metre. */
export function writeCoordinates({ latitudeDeg, longitudeDeg }: GroundPoint): string {
  const side = (value: number, positive: string, negative: string) =>
    `${Math.abs(value).toFixed(5)} ${value < 0 ? negative : positive}`;
  return `${side(latitudeDeg, "N", "S")}, ${side(longitudeDeg, "E", "W")}`;
}
