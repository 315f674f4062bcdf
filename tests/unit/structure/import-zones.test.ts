import { existsSync, readdirSync, readFileSync } from "node:fs";
import { dirname, join, relative, resolve } from "node:path";
import { describe, expect, it } from "vitest";

const root = resolve(import.meta.dirname, "../../..");

function sourceFiles(folder: string): string[] {
  const full = join(root, folder);
  if (!existsSync(full)) return [];
  return readdirSync(full, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile() && /\.tsx?$/.test(entry.name))
    .map((entry) => join(entry.parentPath, entry.name));
}

interface ImportLine {
  from: string;
  target: string;
}

/** Every import of a project file, as paths below the project folder; packages keep their names. */
function imports(folder: string): ImportLine[] {
  return sourceFiles(folder).flatMap((file) =>
    [...readFileSync(file, "utf8").matchAll(/(?:from\s+|import\s*\(\s*|import\s+)["']([^"']+)["']/g)].map(
      (match) => {
        const spec = match[1] ?? "";
        const target = spec.startsWith(".") ? relative(root, resolve(dirname(file), spec)) : spec;
        return { from: relative(root, file), target };
      },
    ),
  );
}

function offenders(folder: string, allowed: (line: ImportLine) => boolean): string[] {
  return imports(folder)
    .filter((line) => !allowed(line))
    .map((line) => `${line.from} imports ${line.target}`);
}

describe("import zones", () => {
  it("reads import lines at all", () => {
    expect(imports("server").length).toBeGreaterThan(10);
    expect(imports("src").length).toBeGreaterThan(10);
  });

  it("keeps the engine pure: its own files and suncalc only", () => {
    expect(
      offenders("server/engine", ({ target }) => target.startsWith("server/engine/") || target === "suncalc"),
    ).toEqual([]);
  });

  it("lets contracts read zod, the engine and themselves only", () => {
    const allowed = ["server/contracts/", "server/engine/"];
    expect(
      offenders(
        "server/contracts",
        ({ target }) => target === "zod" || allowed.some((zone) => target.startsWith(zone)),
      ),
    ).toEqual([]);
  });

  it("lets the browser read contracts and engine, and nothing else of the server", () => {
    expect(
      offenders(
        "src",
        ({ target }) => !target.startsWith("server/") || /^server\/(contracts|engine)\//.test(target),
      ),
    ).toEqual([]);
  });

  it("lets no browser feature read another one", () => {
    const featureOf = (path: string) => /^src\/features\/([^/]+)\//.exec(path)?.[1];
    expect(
      offenders("src/features", ({ from, target }) => {
        const other = featureOf(target);
        return other === undefined || other === featureOf(from);
      }),
    ).toEqual([]);
  });

  it("lets primitives and lib read neither features nor app", () => {
    const allowed = ({ target }: ImportLine) => !/^src\/(features|app)\//.test(target);
    expect(offenders("src/components", allowed)).toEqual([]);
    expect(offenders("src/lib", allowed)).toEqual([]);
  });

  it("never lets the server read the browser", () => {
    expect(offenders("server", ({ target }) => !target.startsWith("src/"))).toEqual([]);
  });
});
