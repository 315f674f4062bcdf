import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { gzipSync } from "node:zlib";
import type { Page } from "playwright-core";
import { launchBrowser, visit } from "../support/browser.ts";

const assets = join(import.meta.dirname, "../../dist/assets");

function gzippedKb(file: string): number {
  return gzipSync(readFileSync(join(assets, file))).length / 1000;
}

/** Slow line and slow processor: 1.6 Mbit/s, 150 ms, a quarter of this machine's speed. Common practice for field phones, no source. */
async function slowDown(page: Page): Promise<void> {
  const session = await page.context().newCDPSession(page);
  await session.send("Network.enable");
  await session.send("Network.emulateNetworkConditions", {
    offline: false,
    latency: 150,
    downloadThroughput: 200_000,
    uploadThroughput: 94_000,
  });
  await session.send("Emulation.setCPUThrottlingRate", { rate: 4 });
}

/** The scripts a page asked for, by file name. */
function watchScripts(page: Page): Set<string> {
  const scripts = new Set<string>();
  page.on("response", (response) => {
    const name = /\/assets\/([^/?]+\.js)$/.exec(response.url())?.[1];
    if (name !== undefined) scripts.add(name);
  });
  return scripts;
}

const sum = (files: Iterable<string>) => [...files].reduce((total, file) => total + gzippedKb(file), 0);

/** Sizes of the browser's parts and times until sign-in and map can be used on a slow device. */
export async function clientFigures(url: string): Promise<Record<string, number>> {
  const browser = await launchBrowser();
  const { page, context } = await visit(browser, url);
  await slowDown(page);
  const scripts = watchScripts(page);
  let start = performance.now();
  await page.goto("/sign-in");
  await page.getByRole("link", { name: "Sign in with Google" }).waitFor();
  const signInMs = performance.now() - start;
  await page.waitForLoadState("networkidle");
  const first = new Set(scripts);
  start = performance.now();
  await page.goto("/auth/google?as=ines.calloway@twotides.example&to=/map");
  await page.getByRole("link", { name: "Pin a building" }).waitFor();
  const mapMs = performance.now() - start;
  await page.waitForLoadState("networkidle");
  const extra = [...scripts].filter((script) => !first.has(script));
  await context.close();
  await browser.close();
  const all = readdirSync(assets).filter((file) => file.endsWith(".js"));
  return {
    "client.firstRouteKbGz": sum(first),
    "client.mapRouteExtraKbGz": sum(extra),
    "client.largestChunkKbGz": Math.max(...all.map(gzippedKb)),
    "client.allScriptsKbGz": sum(all),
    "client.signInInteractiveMs": signInMs,
    "client.mapInteractiveMs": mapMs,
  };
}
