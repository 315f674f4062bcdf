import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import type { Page } from "playwright-core";

const source = readFileSync(createRequire(import.meta.url).resolve("axe-core/axe.min.js"), "utf8");

interface Finding {
  id: string;
  help: string;
  nodes: { target: string[]; failureSummary?: string }[];
}

/** What axe-core finds against WCAG 2.1 AA, one line for each place. */
export async function accessibilityProblems(page: Page): Promise<string[]> {
  await page.evaluate(source);
  const findings = await page.evaluate(async () => {
    const { axe } = window as unknown as {
      axe: { run(root: Document, options: object): Promise<{ violations: Finding[] }> };
    };
    const result = await axe.run(document, { runOnly: ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa"] });
    return result.violations;
  });
  return findings.flatMap(({ id, help, nodes }) =>
    nodes.map((node) => `${id}: ${help} (${node.target.join(" ")}) ${node.failureSummary ?? ""}`),
  );
}
