import { existsSync } from "node:fs";
import { mkdtemp, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { type Browser, chromium, type Page } from "playwright-core";

/** Browsers of common systems; `CHROMIUM_PATH` names another one. */
const candidates = [
  process.env.CHROMIUM_PATH,
  "/usr/bin/chromium",
  "/usr/bin/chromium-browser",
  "/usr/bin/google-chrome",
  "/Applications/Google Chrome.app/Contents/MacOS/Google Chrome",
];

/** Path of a Chromium, or undefined where there is none, which is said aloud and is an error if one is required. */
export function findBrowser(): string | undefined {
  const path = candidates.find((candidate) => candidate !== undefined && existsSync(candidate));
  if (path === undefined) {
    const message = `no Chromium at ${candidates.filter(Boolean).join(", ")} (CHROMIUM_PATH names another)`;
    if (process.env.BULKWRIGHT_REQUIRE_BROWSER === "1") throw new Error(message);
    console.log(`Pages are not tested in a browser: ${message}.`);
  }
  return path;
}

export function launchBrowser(executablePath: string): Promise<Browser> {
  return chromium.launch({
    executablePath,
    args: [
      "--headless",
      "--no-sandbox",
      "--disable-gpu",
      "--disable-quic",
      "--no-first-run",
      "--disable-background-networking",
      "--disable-component-update",
      "--disable-sync",
    ],
  });
}

export interface OpenPage {
  readonly page: Page;
  /** Console warnings and errors, uncaught errors, dialogs. */
  readonly complaints: readonly string[];
  /** Every address the page asked for, itself first. */
  readonly requests: readonly string[];
}

export interface Viewport {
  readonly width?: number;
  readonly height?: number;
  readonly colorScheme?: "light" | "dark";
}

/** Opens `html` from a file URL in a context of its own. */
export async function openPage(browser: Browser, html: string, viewport: Viewport = {}): Promise<OpenPage> {
  const { width = 1400, height = 900, colorScheme = "light" } = viewport;
  const page = await browser.newPage({ viewport: { width, height }, colorScheme });
  const complaints: string[] = [];
  const requests: string[] = [];
  page.on("console", (message) => {
    if (["warning", "error"].includes(message.type())) complaints.push(message.text());
  });
  page.on("pageerror", (error) => complaints.push(error.message));
  page.on("dialog", (dialog) => {
    complaints.push(`dialog: ${dialog.message()}`);
    void dialog.dismiss();
  });
  page.on("request", (request) => requests.push(request.url()));
  const folder = await mkdtemp(join(tmpdir(), "bulkwright-page-"));
  const file = join(folder, "page.html");
  await writeFile(file, html);
  await page.goto(pathToFileURL(file).href);
  await rm(folder, { recursive: true });
  return { page, complaints, requests };
}
