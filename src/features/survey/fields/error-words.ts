/** The first sentence inside an error of the form library, however deep the schema put it. */
export function errorWords(error: unknown): string | undefined {
  if (typeof error !== "object" || error === null) return undefined;
  if ("message" in error && typeof error.message === "string" && error.message !== "") return error.message;
  for (const [key, value] of Object.entries(error)) {
    if (key === "ref") continue;
    const words = errorWords(value);
    if (words !== undefined) return words;
  }
  return undefined;
}
