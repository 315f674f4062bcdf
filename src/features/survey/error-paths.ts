/** Dotted paths of the answers that carry an error, in the order the form library lists them. */
export function errorPaths(errors: unknown, path = ""): string[] {
  if (typeof errors !== "object" || errors === null) return [];
  if ("message" in errors && typeof errors.message === "string") return [path];
  return Object.entries(errors).flatMap(([key, value]) =>
    key === "ref" ? [] : errorPaths(value, path === "" ? key : `${path}.${key}`),
  );
}
