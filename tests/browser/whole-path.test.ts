import type { Browser } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { accessibilityProblems } from "../support/axe.ts";
import { launchBrowser, phone, signInAs, visit } from "../support/browser.ts";
import { startProduct } from "../support/running-product.ts";
import type { TestApp } from "../support/test-app.ts";

describe("the whole path", () => {
  let app: TestApp;
  let browser: Browser;
  beforeAll(async () => {
    app = await startProduct("whole_path");
    browser = await launchBrowser();
  });
  afterAll(async () => {
    await browser.close();
    await app.close();
  });

  it("adviser pins, surveys, sizes and sends; farmer approves on the phone; manager sees it", async () => {
    const adviser = await visit(browser, app.url);
    const { page } = adviser;
    await signInAs(page, "Ines Calloway");
    await page.waitForURL("**/map");
    await page.getByRole("link", { name: "Pin a building" }).click();

    // Pin: farm, place, shape, sizes. A wrong longitude is named before anything is stored.
    await page
      .getByLabel("Farm", { exact: true })
      .selectOption({ label: "Glenbower Plants, Irish midlands" });
    await page.getByLabel("Latitude").fill("53.3611");
    await page.getByLabel("Longitude").fill("7.4822");
    await page.getByLabel("Name", { exact: true }).fill("River tunnel");
    await page.getByText("Round arch", { exact: true }).click();
    await page.getByRole("textbox", { name: "Length along the ridge" }).fill("30");
    await page.getByRole("textbox", { name: "Width over all spans" }).fill("8");
    await page.getByRole("button", { name: "Keep it and survey" }).click();
    await page
      .getByText(/sign of the longitude looks wrong/)
      .first()
      .waitFor();
    await page.getByLabel("Longitude").fill("7.4822 W");
    await page
      .getByText(/Dublin Airport/)
      .first()
      .waitFor();
    await page.getByRole("button", { name: "Keep it and survey" }).click();
    await page.waitForURL("**/survey");

    // Survey: a heater is added, the change saves itself.
    await page.getByRole("heading", { name: /River tunnel/ }).waitFor();
    await page.getByRole("button", { name: /Heaters in place/ }).click();
    await page.getByRole("button", { name: /Add a heater/i }).click();
    await page.getByRole("textbox", { name: /Heat on the plate/ }).fill("25");
    await page
      .getByText(/Saved \d\d:\d\d/)
      .filter({ visible: true })
      .first()
      .waitFor();
    await page.getByRole("button", { name: "Work out the heat" }).filter({ visible: true }).first().click();
    await page.waitForURL("**/heat");
    await page
      .getByText(/River tunnel is .* short on the coldest night/)
      .filter({ visible: true })
      .first()
      .waitFor();

    // Sizing: the proposal that holds is sent.
    await page.getByRole("link", { name: "Heater sizing" }).click();
    await page.waitForURL("**/sizing");
    await page.getByRole("radio", { name: /Two equal new heaters/ }).click();
    await page.getByRole("button", { name: /Send to Glenbower Plants for review/ }).click();
    await page.getByLabel("A few words to go with it").fill("Two heaters, so that one can fail.");
    await page.getByRole("button", { name: "Send", exact: true }).click();
    await page.getByText(/Sent/).filter({ visible: true }).first().waitFor();
    expect(adviser.complaints).toEqual([]);
    await adviser.context.close();
    await expect.poll(() => app.mails.some((mail) => mail.raw.includes("River tunnel"))).toBe(true);

    // The farmer answers on the phone.
    const farmer = await visit(browser, app.url, phone);
    await signInAs(farmer.page, "Fionn Glasheen");
    await farmer.page.getByRole("link", { name: /River tunnel/ }).click();
    await farmer.page
      .getByRole("heading", { name: /River tunnel/ })
      .first()
      .waitFor();
    await farmer.page.getByText("Two heaters, so that one can fail.").waitFor();
    await farmer.page.getByRole("button", { name: /^Approve/ }).click();
    await farmer.page.getByRole("button", { name: "Yes, approve" }).click();
    await farmer.page
      .getByText(/approved/i)
      .first()
      .waitFor();
    expect(farmer.complaints).toEqual([]);
    await farmer.context.close();

    // The manager finds the house in the table, with its verdict.
    const manager = await visit(browser, app.url);
    await signInAs(manager.page, "Brigid Farthing");
    await manager.page.waitForURL("**/sites");
    const row = manager.page.getByRole("row", { name: /River tunnel/ });
    await row.waitFor();
    expect(await row.textContent()).toMatch(/Below critical/);
    await manager.page.getByRole("button", { name: /^Building/ }).click();
    await manager.page.waitForURL(/by=name/);
    expect(manager.complaints).toEqual([]);
    await manager.context.close();
  });

  const screens = [
    ["Ines Calloway", ["/map", "/map/new", "/farms", "/reviews"]],
    ["Fionn Glasheen", ["/reviews", "/farms"]],
    ["Brigid Farthing", ["/sites", "/people", "/farms"]],
  ] as const;

  it.each(screens)(
    "%s meets no barrier and no sideways scrolling on the main screens",
    async (name, paths) => {
      for (const viewport of [undefined, phone]) {
        const { page, complaints, context } = await visit(browser, app.url, viewport);
        await signInAs(page, name);
        for (const path of paths) {
          await page.goto(path);
          await page.waitForLoadState("networkidle");
          expect(await accessibilityProblems(page), `${name} ${path}`).toEqual([]);
          const wide = await page.evaluate(
            () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
          );
          expect(wide, `${path} is wider than the screen`).toBeLessThanOrEqual(0);
        }
        expect(complaints).toEqual([]);
        await context.close();
      }
    },
  );
});
