import type { Browser, Page } from "playwright-core";
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from "vitest";
import { findingsPage } from "../../src/figures/findingsPage.ts";
import { visibleText } from "../../src/figures/visibleText.ts";
import { hostileFindings, inventedFindings } from "../figures/inventedFindings.ts";
import { hostileNames } from "../figures/inventedSurvey.ts";
import { findBrowser, launchBrowser, type OpenPage, openPage } from "./openPage.ts";
import { seriousFaults } from "./seriousFaults.ts";

const executable = findBrowser();
const { records } = inventedFindings;

describe.skipIf(executable === undefined)("the page of findings in a browser", () => {
  let browser: Browser;
  let html: string;
  let opened: OpenPage;
  let page: Page;

  beforeAll(async () => {
    browser = await launchBrowser(executable as string);
    html = await findingsPage(inventedFindings);
  }, 60_000);
  afterAll(() => browser?.close());

  beforeEach(async () => {
    opened = await openPage(browser, html);
    page = opened.page;
  });
  afterEach(async () => {
    expect(opened.complaints).toEqual([]);
    expect(opened.requests).toHaveLength(1);
    await page.close();
  });

  const status = () => page.getByRole("status").textContent();
  const column = (place: number) => page.locator(`#findings tbody tr > :nth-child(${place})`).allTextContents();

  it("turns pages", async () => {
    expect(await status()).toBe("1–200 of 450 findings");
    expect(await page.getByRole("button", { name: "Previous" }).isDisabled()).toBe(true);
    await page.getByRole("button", { name: "Next" }).click();
    await page.getByRole("button", { name: "Next" }).click();
    expect(await status()).toBe("401–450 of 450 findings");
    expect((await column(1))[0]).toBe(records[400]?.name);
    expect(await page.getByRole("button", { name: "Next" }).isDisabled()).toBe(true);
  });

  it("filters by severity, rule and text, all together", async () => {
    await page.getByRole("combobox", { name: "Severity" }).selectOption("error");
    expect(await status()).toBe("1–150 of 150 findings, of 450 in all");
    expect(new Set(await column(3))).toEqual(new Set(["error"]));
    await page.getByLabel("Text").fill("OSTARA 12");
    expect(await column(1)).toEqual(["Ostara 12 b", "Ostara 120 b", "Ostara 123 b", "Ostara 126 b", "Ostara 129 b"]);
    await page.getByRole("combobox", { name: "Rule" }).selectOption("kepler-third-law");
    expect(await status()).toBe("0 findings, of 450 in all");
  });

  it("sorts numbers as numbers, up, down and back, by keyboard, blanks last", async () => {
    const heading = page.getByRole("columnheader", { name: "Value" });
    const values = async () => (await column(6)).map((text) => (text === "" ? null : Number(text.replace("−", "-"))));
    await heading.getByRole("button").focus();
    await page.keyboard.press("Enter");
    expect(await heading.getAttribute("aria-sort")).toBe("ascending");
    const rising = await values();
    expect(rising).toEqual([...rising].sort((a, b) => (a ?? 1e9) - (b ?? 1e9)));
    expect(rising[0]).toBe(-20);
    await page.keyboard.press("Enter");
    expect(await heading.getAttribute("aria-sort")).toBe("descending");
    expect((await values())[0]).toBe(55);
    await page.keyboard.press("Enter");
    expect(await heading.getAttribute("aria-sort")).toBeNull();
    expect((await column(1))[0]).toBe(records[0]?.name);
  });

  it("sorts severities by gravity", async () => {
    await page.getByRole("columnheader", { name: "Severity" }).getByRole("button").click();
    expect(new Set((await column(3)).slice(0, 150))).toEqual(new Set(["error"]));
    expect((await column(3))[150]).toBe("warning");
  });

  it.each([1400, 420])("has no serious accessibility fault and no sideways scrolling at %i px", async (width) => {
    await page.setViewportSize({ width, height: 900 });
    for (const colorScheme of ["dark", "light"] as const) {
      await page.emulateMedia({ colorScheme });
      expect(await seriousFaults(page)).toEqual([]);
    }
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(width);
  });

  it("shows hostile text verbatim and as nothing but text", async () => {
    const hostile = await openPage(browser, await findingsPage(hostileFindings));
    const names = await hostile.page.locator("#findings tbody th").allTextContents();
    expect(names).toEqual(hostileNames.map(visibleText));
    expect(await hostile.page.locator("img, [onerror], [onmouseover], main script, main a, main b").count()).toBe(0);
    expect(hostile.complaints).toEqual([]);
    expect(hostile.requests).toHaveLength(1);
  });
});
