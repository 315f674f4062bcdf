import { readdirSync, readFileSync } from "node:fs";
import { join, relative, resolve } from "node:path";
import { describe, expect, it } from "vitest";
import { engineSources } from "../../server/engine/sources.ts";

const root = resolve(import.meta.dirname, "../../server/engine");

interface EngineFile {
  name: string;
  text: string;
}

const files: EngineFile[] = readdirSync(root, { withFileTypes: true, recursive: true })
  .filter((entry) => entry.isFile() && entry.name.endsWith(".ts"))
  .map((entry) => join(entry.parentPath, entry.name))
  .map((path) => ({ name: relative(root, path), text: readFileSync(path, "utf8") }));
const sourceFiles = files.filter(({ name }) => /(^|-|\/)sources\.ts$/.test(name));

/** The program without comments and texts, so that words in them do not count. */
function program(text: string): string {
  return text
    .replace(/\/\*[\s\S]*?\*\//g, "")
    .replace(/\/\/.*$/gm, "")
    .replace(/"[^"\n]*"|`[^`]*`/g, '""');
}

describe("the engine is pure", () => {
  it("reads its own files and suncalc only", () => {
    const outside = files.flatMap(({ name, text }) =>
      [...text.matchAll(/(?:from|import\()\s*["']([^"']+)["']/g)]
        .map((match) => match[1] ?? "")
        .filter((target) => target !== "suncalc" && !isOwn(name, target))
        .map((target) => `${name} reads ${target}`),
    );
    expect(outside).toEqual([]);
  });

  it("asks neither clock nor chance nor the machine", () => {
    const impure =
      /\bDate\.now\b|\bnew Date\(\)|\bMath\.random\b|\bperformance\b|\bprocess\.|\bglobalThis\b|\bfetch\(|\bconsole\b/;
    expect(files.filter(({ text }) => impure.test(program(text))).map(({ name }) => name)).toEqual([]);
  });
});

function isOwn(name: string, target: string): boolean {
  return target.startsWith(".") && !relative(root, resolve(root, name, "..", target)).startsWith("..");
}

/** Keys cited in a comment: [KEY]. */
function citedIn(text: string): string[] {
  const comments = [...text.matchAll(/\/\*\*[\s\S]*?\*\/|\/\/.*$/gm)].map((match) => match[0]).join("\n");
  return [...comments.matchAll(/\[([A-Z][A-Z0-9]+(?:-[A-Z0-9]+)*)\]/g)].map((match) => match[1] ?? "");
}

describe("sources", () => {
  const cited = new Set(
    files.filter((file) => !sourceFiles.includes(file)).flatMap(({ text }) => citedIn(text)),
  );

  it("exist for every key that is cited", () => {
    expect([...cited].filter((key) => engineSources[key] === undefined)).toEqual([]);
  });

  it("are all cited", () => {
    expect(Object.keys(engineSources).filter((key) => !cited.has(key))).toEqual([]);
  });

  it("have keys of their own", () => {
    const keys = sourceFiles.flatMap(({ text }) =>
      [...text.matchAll(/^ {2}"?([A-Z0-9][A-Za-z0-9-]*)"?: \{/gm)].map((match) => match[1] ?? ""),
    );
    expect(keys.filter((key, index) => keys.indexOf(key) !== index)).toEqual([]);
    expect(keys.length).toBe(Object.keys(engineSources).length);
  });

  it("name author, year and title", () => {
    for (const [key, source] of Object.entries(engineSources)) {
      expect(source.author.length, key).toBeGreaterThan(1);
      expect(source.title.length, key).toBeGreaterThan(5);
      expect(Number.isInteger(source.year), key).toBe(true);
    }
  });

  it("stand behind every exported function", () => {
    const bare = files.flatMap(({ name, text }) =>
      [...text.matchAll(/(\/\*\*(?:(?!\*\/)[\s\S])*\*\/\n)?export function (\w+)/g)]
        .filter((match) => !match[1])
        .map((match) => `${name}: ${match[2]}`),
    );
    expect(bare).toEqual([]);
  });
});
