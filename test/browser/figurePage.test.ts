import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { massRadiusFigure } from "../../src/figures/massRadiusFigure.ts";
import { plotlyHtml } from "../../src/figures/plotlyHtml.ts";
import { visibleText } from "../../src/figures/visibleText.ts";
import { hostileNames, hostileSurvey, inventedSurvey } from "../figures/inventedSurvey.ts";
import { findBrowser, launchBrowser, type OpenPage, openPage } from "./openPage.ts";
import { plotlySource } from "./plotlySource.ts";
import { seriousFaults } from "./seriousFaults.ts";

const executable = findBrowser();

describe.skipIf(executable === undefined)("the mass–radius page in a browser", () => {
  const spec = massRadiusFigure(inventedSurvey);
  let browser: Browser;
  let survey: OpenPage;
  let hostile: OpenPage;

  beforeAll(async () => {
    browser = await launchBrowser(executable as string);
    const plotly = plotlySource();
    survey = await openPage(browser, await plotlyHtml(spec, plotly));
    hostile = await openPage(browser, await plotlyHtml(massRadiusFigure(hostileSurvey), plotly));
  }, 60_000);

  afterAll(() => browser?.close());

  it("draws every curve and planet", async () => {
    expect(await survey.page.locator("#diagram .points path").count()).toBe(spec.marks.length);
    expect(await survey.page.locator("#diagram .js-line").count()).toBe(2 * spec.curves.length);
    expect(await survey.page.locator("#diagram .annotation").count()).toBe(spec.curves.length);
  });

  it("labels the axes with plain numbers", async () => {
    const ticks = await survey.page.locator("#diagram .xtick text").allTextContents();
    expect(ticks).toEqual(["0.1", "0.2", "0.5", "1", "2", "5", "10", "20"]);
  });

  it.each([1400, 420])(
    "has no serious accessibility fault and no sideways scrolling at %i px",
    { timeout: 90_000 },
    async (width) => {
      const { page } = survey;
      await page.setViewportSize({ width, height: 900 });
      for (const colorScheme of ["dark", "light"] as const) {
        await page.emulateMedia({ colorScheme });
        expect(await seriousFaults(page)).toEqual([]);
      }
      await expect.poll(() => diagramWidth(page)).toBeLessThanOrEqual(width);
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(width);
    },
  );

  it("names curves beside them where there is room, off the planets, and in the legend alone where there is none", async () => {
    const { page } = survey;
    const labels = "#diagram .annotation-text";
    expect(await page.locator(labels).count()).toBe(0);
    await page.setViewportSize({ width: 800, height: 900 });
    await expect.poll(() => page.locator(labels).count()).toBe(spec.curves.length);
    const points = await boxes(page, "#diagram .points path");
    for (const label of await boxes(page, labels)) {
      expect(label.right).toBeLessThanOrEqual(800);
      expect(points.filter((point) => overlap(label, point))).toEqual([]);
    }
  });

  it("hides and shows a series from its legend entry, by keyboard", async () => {
    const { page } = survey;
    const button = page.locator('button[data-group="curve-0"]');
    const lines = page.locator("#diagram .js-line");
    await button.focus();
    await page.keyboard.press("Enter");
    expect(await button.getAttribute("aria-pressed")).toBe("false");
    await expect.poll(() => lines.count()).toBe(2 * spec.curves.length - 2);
    await page.keyboard.press("Enter");
    await expect.poll(() => lines.count()).toBe(2 * spec.curves.length);
  });

  it("prints on white whatever the screen, at the width of the paper", async () => {
    const { page } = survey;
    const paper = () => page.locator("#diagram .main-svg").first().getAttribute("style");
    await page.emulateMedia({ colorScheme: "dark" });
    await expect.poll(paper).toContain("rgb(20, 24, 29)");
    await page.emulateMedia({ media: "print", colorScheme: "dark" });
    await expect.poll(paper).toContain("rgb(255, 255, 255)");
    expect(await diagramWidth(page)).toBe(660);
  });

  it("shows a name on hover", async () => {
    const { page } = hostile;
    await page.locator("#diagram .points path").first().hover({ force: true });
    await expect.poll(() => page.locator("#diagram .hovertext .line").count()).toBeGreaterThan(3);
  });

  it("shows hostile names verbatim, on hover and in the table", async () => {
    const { page } = hostile;
    const hovered = await page.evaluate(hoverEveryPlanet);
    expect(new Set(hovered)).toEqual(new Set(hostileNames.map(visibleText)));
    const rows = await page.locator("#planets tbody th").allTextContents();
    expect(rows).toEqual(hostileSurvey.planets.map(({ name }) => visibleText(name)));
    expect(await page.title()).toBe(hostileSurvey.title);
  });

  it("adds no element for hostile names", async () => {
    const { page } = hostile;
    expect(
      await page.locator("img, [onerror], [onmouseover], main script, a:not([href^='https://doi.org/'])").count(),
    ).toBe(0);
    expect(await page.locator("main b").count()).toBe(hostileSurvey.sources.length);
    expect(await page.locator("script").count()).toBe(3);
  });

  it("never complains, and asks for nothing but itself", () => {
    expect([...survey.complaints, ...hostile.complaints]).toEqual([]);
    expect(survey.requests).toHaveLength(1);
    expect(hostile.requests).toHaveLength(1);
  });
});

const diagramWidth = async (page: Page): Promise<number> =>
  Number(await page.locator("#diagram .main-svg").first().getAttribute("width"));

/** In the page: the first line of the hover label of every planet. */
async function hoverEveryPlanet(): Promise<string[]> {
  const { Plotly } = globalThis as unknown as {
    Plotly: { Fx: { hover(element: Element, points: { curveNumber: number; pointNumber: number }[]): void } };
  };
  const diagram = document.getElementById("diagram") as HTMLElement & { data: { mode: string; x: number[] }[] };
  const points = diagram.data.flatMap(({ mode, x }, curveNumber) =>
    mode === "markers" ? x.map((_, pointNumber) => ({ curveNumber, pointNumber })) : [],
  );
  const shown: string[] = [];
  for (const point of points) {
    Plotly.Fx.hover(diagram, [point]);
    // Plotly answers to one hover in 50 ms.
    await new Promise((resolve) => setTimeout(resolve, 80));
    shown.push(diagram.querySelector(".hovertext .line")?.textContent ?? "");
  }
  return shown;
}

const boxes = (page: Page, selector: string): Promise<DOMRect[]> =>
  page.locator(selector).evaluateAll((elements) => elements.map((element) => element.getBoundingClientRect().toJSON()));

const overlap = (a: DOMRect, b: DOMRect): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;
