import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { massRadiusFigure } from "../../src/figures/massRadiusFigure.ts";
import type { MassRadiusInput } from "../../src/figures/massRadiusInput.ts";
import { plotlyHtml } from "../../src/figures/plotlyHtml.ts";
import { hostileNames, inventedSurvey } from "../figures/inventedSurvey.ts";
import { findBrowser, launchBrowser, openPage } from "./openPage.ts";
import { plotlySource } from "./plotlySource.ts";

const executable = findBrowser();

/** The survey with every text that a user's files can hold replaced by hostile ones. */
const hostileSurvey: MassRadiusInput = {
  ...inventedSurvey,
  title: `Survey ${hostileNames[1]}`,
  planets: inventedSurvey.planets.map((planet, i) => {
    const name = hostileNames[i % hostileNames.length] as string;
    return { ...planet, name, note: name, reason: planet.reason && name };
  }),
  curves: inventedSurvey.curves.map((curve, i) => ({
    ...curve,
    composition: hostileNames[i] as string,
    title: `${hostileNames[i]}`,
    layers: curve.layers.map((layer) => ({ ...layer, name: hostileNames[i] as string })),
  })),
  sources: hostileNames.map((name) => ({ subject: name, citation: name, doi: name, note: name })),
  warnings: [...hostileNames],
  command: hostileNames.join(" "),
};

describe.skipIf(executable === undefined)("the mass–radius page in a browser", () => {
  let browser: Browser;
  let survey: string;
  let hostile: string;

  beforeAll(async () => {
    browser = await launchBrowser(executable as string);
    const plotly = plotlySource();
    survey = await plotlyHtml(massRadiusFigure(inventedSurvey), plotly);
    hostile = await plotlyHtml(massRadiusFigure(hostileSurvey), plotly);
  }, 60_000);

  afterAll(() => browser?.close());

  it("draws curves and planets without complaint and asks for nothing but itself", async () => {
    const { page, complaints, requests } = await openPage(browser, survey);
    const drawn = massRadiusFigure(inventedSurvey).marks.length;
    expect(await page.locator("#diagram .points path").count()).toBe(drawn);
    expect(await page.locator("#diagram .js-line").count()).toBe(2 * inventedSurvey.curves.length);
    expect(await page.locator("#diagram .annotation").count()).toBe(inventedSurvey.curves.length);
    await page.close();
    expect(complaints).toEqual([]);
    expect(requests).toHaveLength(1);
  });

  it("labels the axes with plain numbers", async () => {
    const { page } = await openPage(browser, survey);
    expect(await page.locator("#diagram .xtick text").allTextContents()).toEqual([
      "0.1",
      "0.2",
      "0.5",
      "1",
      "2",
      "5",
      "10",
      "20",
    ]);
    await page.close();
  });

  it.each([1400, 420])("has no serious accessibility fault and no sideways scrolling at %i px", async (width) => {
    for (const colorScheme of ["light", "dark"] as const) {
      const { page } = await openPage(browser, survey, { width, colorScheme });
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width);
      expect(await seriousFaults(page)).toEqual([]);
      await page.close();
    }
  });

  it("keeps curve names inside the page and off the planets on a wide page", async () => {
    const { page } = await openPage(browser, survey, { width: 800 });
    const [labels, points] = await Promise.all([
      boxes(page, "#diagram .annotation-text"),
      boxes(page, "#diagram .points path"),
    ]);
    for (const label of labels) {
      expect(label.right).toBeLessThanOrEqual(800);
      for (const point of points) expect(overlap(label, point)).toBe(false);
    }
    await page.close();
  });

  it("shows hostile names verbatim on hover and adds no element for them", async () => {
    const { page, complaints, requests } = await openPage(browser, hostile);
    const shown = new Set<string>();
    for (const point of await page.locator("#diagram .points path").all()) {
      await point.hover({ force: true });
      shown.add((await page.locator("#diagram .hovertext .line").first().textContent()) ?? "");
    }
    const seen = (name: string) => name.replace("\u2028", "[U+2028]").replace("\u202E", "[U+202E]");
    expect([...shown].sort()).toEqual([...new Set(hostileNames.map(seen))].sort());
    expect(await page.locator("#planets tbody th").allTextContents()).toEqual(
      inventedSurvey.planets.map((_, i) => seen(hostileNames[i % hostileNames.length] as string)),
    );
    expect(await page.locator("img, main a[href*=example], [onerror], [onmouseover]").count()).toBe(0);
    expect(await page.locator("script").count()).toBe(3);
    expect(await page.title()).toBe("Survey </script><script>alert(1)</script>");
    await page.close();
    expect(complaints).toEqual([]);
    expect(requests).toHaveLength(1);
  });

  it("hides and shows a series from its legend entry, by keyboard", async () => {
    const { page } = await openPage(browser, survey);
    const button = page.locator('button[data-group="curve-0"]');
    await button.focus();
    await page.keyboard.press("Enter");
    expect(await button.getAttribute("aria-pressed")).toBe("false");
    expect(await page.locator("#diagram .annotation").count()).toBe(inventedSurvey.curves.length - 1);
    await page.keyboard.press("Enter");
    expect(await page.locator("#diagram .annotation").count()).toBe(inventedSurvey.curves.length);
    await page.close();
  });

  it("prints on white whatever the screen, at the width of the paper", async () => {
    const { page } = await openPage(browser, survey, { colorScheme: "dark" });
    const background = () => page.locator("#diagram .main-svg").first().getAttribute("style");
    expect(await background()).toContain("rgb(20, 24, 29)");
    await page.emulateMedia({ media: "print", colorScheme: "dark" });
    expect(await background()).toContain("rgb(255, 255, 255)");
    expect(await page.locator("#diagram .main-svg").first().getAttribute("width")).toBe("660");
    await page.close();
  });
});

/** Rules that axe-core, the reference implementation of accessibility checks, rates serious or critical. */
async function seriousFaults(page: Page): Promise<string[]> {
  const axe = readFileSync(createRequire(import.meta.url).resolve("axe-core/axe.min.js"), "utf8");
  await page.evaluate(axe);
  return page.evaluate(async () => {
    const { violations } = await (globalThis as unknown as { axe: typeof import("axe-core") }).axe.run();
    return violations
      .filter(({ impact }) => impact === "serious" || impact === "critical")
      .map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 120)).join(" | ")}`);
  });
}

const boxes = (page: Page, selector: string): Promise<DOMRect[]> =>
  page.locator(selector).evaluateAll((elements) => elements.map((element) => element.getBoundingClientRect().toJSON()));

const overlap = (a: DOMRect, b: DOMRect): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;
