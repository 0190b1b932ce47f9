import type { Browser } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { precisionFigure } from "../../src/figures/precisionFigure.ts";
import { precisionHtml } from "../../src/figures/precisionHtml.ts";
import { visibleText } from "../../src/figures/visibleText.ts";
import { hostileForecast, inventedForecast } from "../figures/inventedForecast.ts";
import { findBrowser, launchBrowser, type OpenPage, openPage } from "./openPage.ts";
import { plotlySource } from "./plotlySource.ts";
import { seriousFaults } from "./seriousFaults.ts";

const executable = findBrowser();

describe.skipIf(executable === undefined)("the precision page in a browser", () => {
  let browser: Browser;
  let forecast: OpenPage;
  let hostile: OpenPage;

  beforeAll(async () => {
    browser = await launchBrowser(executable as string);
    const plotly = plotlySource();
    forecast = await openPage(browser, await precisionHtml(precisionFigure(inventedForecast), plotly));
    hostile = await openPage(browser, await precisionHtml(precisionFigure(hostileForecast), plotly));
  }, 60_000);

  afterAll(() => browser?.close());

  it("draws a labelled line for each level, and today's errors", async () => {
    const { page } = forecast;
    expect(await page.locator("#diagram .annotation-text").allTextContents()).toEqual([
      "1 sigma",
      "2 sigma",
      "3 sigma",
      "5 sigma",
      "today",
    ]);
    expect(await page.locator("#diagram .points path").count()).toBe(1);
    expect(await page.locator("#diagram .js-fill").count()).toBe(4);
  });

  it.each([1400, 420])(
    "has no serious accessibility fault and no sideways scrolling at %i px",
    { timeout: 90_000 },
    async (width) => {
      const { page } = forecast;
      await page.setViewportSize({ width, height: 900 });
      for (const colorScheme of ["dark", "light"] as const) {
        await page.emulateMedia({ colorScheme });
        expect(await seriousFaults(page)).toEqual([]);
      }
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(width);
    },
  );

  it("shows hostile text verbatim", async () => {
    const { page } = hostile;
    expect(await page.title()).toBe(hostileForecast.title);
    expect(await page.locator("#steps tbody th").allTextContents()).toEqual([visibleText(hostileForecast.title)]);
    expect(await page.locator("main img, main script").count()).toBe(0);
  });

  it("never complains, and asks for nothing but itself", () => {
    expect([...forecast.complaints, ...hostile.complaints]).toEqual([]);
    expect([forecast.requests.length, hostile.requests.length]).toEqual([1, 1]);
  });
});
