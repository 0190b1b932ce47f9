import { createHash } from "node:crypto";
import { describe, expect, it } from "vitest";
import { massRadiusFigure } from "../../src/figures/massRadiusFigure.ts";
import { plotlyHtml } from "../../src/figures/plotlyHtml.ts";
import { tableRowLimit } from "../../src/figures/table.ts";
import { hostileSurvey, inventedSurvey } from "./inventedSurvey.ts";

const plotly = 'window.Plotly = { text: "</script><!--" };';
const [firstPlanet] = inventedSurvey.planets as [(typeof inventedSurvey.planets)[number]];
const page = (changes: Partial<typeof inventedSurvey> = {}) =>
  plotlyHtml(massRadiusFigure({ ...inventedSurvey, ...changes }), plotly);

/** Attributes that would make a browser fetch something. */
const fetching = /\s(?:src|srcset|poster|data|action|background)\s*=|<(?:iframe|object|embed|base)|@import|url\(/i;

describe("plotlyHtml", () => {
  it("is one page with title, language, headings, figure, caption and tables", async () => {
    const html = await page();
    expect(html).toMatch(/^<!doctype html>\n<html lang="en">/);
    expect(html).toContain(`<title>${inventedSurvey.title}</title>`);
    expect(html.match(/<h1>/g)).toHaveLength(1);
    expect(html).toContain('<th scope="row"><bdi>Amber b</bdi></th>');
    expect(html).toContain("<bdi>5.60 ± 0.19</bdi>");
    expect(html).toContain("none: mass is computed from the radius by a relation");
    expect(html).toContain(inventedSurvey.command);
    expect(html).toContain('<a href="https://doi.org/10.1234/nothing.5">');
  });

  it("is the same page every time", async () => {
    expect(await page()).toBe(await page());
  });

  it("has nothing to fetch, and a policy that allows its own two scripts alone", async () => {
    const html = await page();
    expect(html.replace(/<script[\s\S]*?<\/script>/g, "")).not.toMatch(fetching);
    const programs = [...html.matchAll(/<script>([\s\S]*?)<\/script>/g)].map(([, code]) => code as string);
    const hashes = programs.map((code) => `'sha256-${createHash("sha256").update(code).digest("base64")}'`);
    expect(hashes).toHaveLength(2);
    expect(html).toContain(`default-src 'none'; script-src ${hashes.join(" ")};`);
  });

  it("draws with a program that stands on its own", async () => {
    const [, program] = [...(await page()).matchAll(/<script>([\s\S]*?)<\/script>/g)].map(([, code]) => code as string);
    expect(program).not.toMatch(/__vite|import_|__name/);
  });

  it("links only what has the shape of a DOI", async () => {
    const sources = [
      { subject: "x", citation: "y", doi: "javascript:alert(1)" },
      { subject: "x", citation: "y", doi: '10.1234/a"b<c' },
    ];
    const links = (await page({ sources })).match(/<a href="[^"]*"/g);
    expect(links).toEqual(['<a href="https://doi.org/10.1234/a%22b%3Cc"']);
  });

  it("shows hostile text as text alone", async () => {
    const html = await page(hostileSurvey);
    const elements = (text: string) => [...new Set(text.match(/<\/?[a-z!][a-z0-9-]*/gi))].sort();
    expect(elements(html)).toEqual(elements(await page({ sources: [{ subject: "x", citation: "y", note: "z" }] })));
    expect(html.match(/<script/g)).toHaveLength(3);
    expect(html.match(/<b>/g)).toHaveLength(hostileSurvey.sources.length);
    expect(html).not.toMatch(/[\u2028\u202E]/);
  });

  it("cuts a table that no browser would bear, and says so", async () => {
    const planets = Array.from({ length: tableRowLimit + 1 }, () => firstPlanet);
    const html = await page({ planets });
    expect(html).toContain("the first 10,000 of 10,001 rows");
    expect(html.match(/<bdi>Amber b<\/bdi>/g)).toHaveLength(tableRowLimit);
  });

  it("leaves out what is not there", async () => {
    const html = await page({ planets: [] });
    expect(html).not.toContain("<h2>Planets</h2>");
    expect(html).not.toContain("<h3>Planets</h3>");
  });
});
