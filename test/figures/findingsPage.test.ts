import { createHash } from "node:crypto";
import { describe, expect, it } from "vitest";
import { findingsPage } from "../../src/figures/findingsPage.ts";
import { hostileFindings, inventedFindings } from "./inventedFindings.ts";

describe("findingsPage", () => {
  it("counts findings by severity and by rule", async () => {
    const html = await findingsPage(inventedFindings);
    expect(html).toContain("450 findings in 500 rows: 150 error, 150 warning, 150 info.");
    expect(html).toMatch(/<bdi>kepler-third-law<\/bdi><\/th><td><\/td><td class="number"><bdi>150<\/bdi>/);
  });

  it("is the same page every time, with a policy that allows its one script alone", async () => {
    const html = await findingsPage(inventedFindings);
    expect(await findingsPage(inventedFindings)).toBe(html);
    const programs = [...html.matchAll(/<script>([\s\S]*?)<\/script>/g)].map(([, code]) => code as string);
    expect(programs).toHaveLength(1);
    expect(programs[0]).not.toMatch(/__vite|import_|__name/);
    const hash = createHash("sha256")
      .update(programs[0] ?? "")
      .digest("base64");
    expect(html).toContain(`default-src 'none'; script-src 'sha256-${hash}';`);
  });

  it("shows hostile text as text alone", async () => {
    const elements = (html: string) => [...new Set(html.match(/<\/?[a-z!][a-z0-9-]*/gi))].sort();
    const html = await findingsPage(hostileFindings);
    expect(elements(html)).toEqual(elements(await findingsPage(inventedFindings)));
    expect(html.match(/<script/g)).toHaveLength(2);
  });

  it("stores a text that repeats once", async () => {
    const [first] = inventedFindings.records;
    const page = (count: number) =>
      findingsPage({ ...inventedFindings, records: Array(count).fill({ ...first, explanation: "x".repeat(1000) }) });
    expect((await page(100)).length - (await page(99)).length).toBeLessThan(60);
  });
});
