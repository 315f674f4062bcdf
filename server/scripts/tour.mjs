import { mkdirSync } from "node:fs";
import { join } from "node:path";
import { chromium } from "playwright-core";
import { projectFolder } from "./lib/paths.mjs";
import { say } from "./lib/say.mjs";

/** Takes the README's pictures from a running copy: `npm start`, then `npm run tour`. */
const base = process.env.TOUR_URL ?? "http://127.0.0.1:4100";
const folder = join(projectFolder, "data", "tour");
const desktop = { width: 1440, height: 900 };
const phone = { width: 390, height: 844 };

async function open(browser, name, viewport) {
  const context = await browser.newContext({ viewport, baseURL: base, reducedMotion: "reduce" });
  const page = await context.newPage();
  await page.goto("/sign-in");
  await page.getByRole("link", { name: new RegExp(name) }).click();
  await page.getByRole("banner").waitFor();
  return page;
}

async function picture(page, name) {
  await page.waitForLoadState("networkidle");
  await page.waitForTimeout(600);
  await page.screenshot({ path: join(folder, `${name}.png`) });
  say(`${name}.png`);
}

mkdirSync(folder, { recursive: true });
const browser = await chromium.launch({
  executablePath: "/usr/bin/chromium",
  args: ["--no-sandbox", "--disable-gpu"],
});
try {
  const adviser = await open(browser, "Ines Calloway", desktop);
  await picture(adviser, "1-map");
  await adviser.goto("/farms");
  await adviser.getByRole("link", { name: /Glenbower Plants/ }).click();
  await adviser
    .getByRole("link", { name: /Bedding tunnel/ })
    .first()
    .click();
  await adviser.getByRole("link", { name: "Survey", exact: true }).click();
  await picture(adviser, "2-survey");
  await adviser.getByRole("link", { name: "Heat balance" }).click();
  await picture(adviser, "3-heat-balance");
  await adviser.getByRole("link", { name: "Heater sizing" }).click();
  await picture(adviser, "4-heater-sizing");
  const farmer = await open(browser, "Fionn Glasheen", phone);
  await farmer
    .getByRole("link", { name: /Bedding tunnel/ })
    .first()
    .click();
  await picture(farmer, "5-review-on-the-phone");
  const manager = await open(browser, "Brigid Farthing", desktop);
  await picture(manager, "6-compare-sites");
} finally {
  await browser.close();
}
