import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import type { Page } from "playwright-core";

/** Rules that axe-core, the reference implementation of accessibility checks, rates serious or critical. */
export async function seriousFaults(page: Page): Promise<string[]> {
  const axe = readFileSync(createRequire(import.meta.url).resolve("axe-core/axe.min.js"), "utf8");
  await page.evaluate(axe);
  return page.evaluate(async () => {
    const { violations } = await (globalThis as unknown as { axe: typeof import("axe-core") }).axe.run();
    return violations
      .filter(({ impact }) => impact === "serious" || impact === "critical")
      .map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 120)).join(" | ")}`);
  });
}
