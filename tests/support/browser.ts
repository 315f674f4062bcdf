import { type Browser, type BrowserContext, chromium, type Page } from "playwright-core";

const FLAGS = [
  "--no-sandbox",
  "--disable-gpu",
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];

export const desktop = { width: 1440, height: 900 };
export const phone = { width: 390, height: 844 };

export function launchBrowser(): Promise<Browser> {
  return chromium.launch({ executablePath: "/usr/bin/chromium", args: FLAGS });
}

export interface Visit {
  page: Page;
  context: BrowserContext;
  /** What the page complained about; a good visit ends with none. */
  complaints: string[];
}

/** A fresh browser profile that listens for complaints on the console. */
export async function visit(browser: Browser, url: string, viewport = desktop): Promise<Visit> {
  const context = await browser.newContext({ viewport, baseURL: url, reducedMotion: "reduce" });
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on("console", (message) => {
    // A refused request is part of some tests and is checked there.
    if (message.type() === "error" && !message.text().startsWith("Failed to load resource"))
      complaints.push(message.text());
  });
  page.on("pageerror", (error) => complaints.push(error.message));
  return { page, context, complaints };
}

/** Signs in through the sign-in page and its list of demonstration people. */
export async function signInAs(page: Page, name: string): Promise<void> {
  await page.goto("/sign-in");
  await page.getByRole("link", { name: new RegExp(name) }).click();
  await page.getByRole("banner").waitFor();
}
