import { describe, expect, it } from "vitest";
import { type ColourRole, darkPalette, lightPalette } from "../../src/figures/palette.ts";
import { contrast, seenDistance, sights } from "./colourVision.ts";

const numbered = (kind: "curve" | "verdict", count: number) =>
  Array.from({ length: count }, (_, i) => `${kind}-${i + 1}` as ColourRole);
const curves = numbered("curve", 8);
const verdicts = numbered("verdict", 6);

describe.each([
  ["light", lightPalette],
  ["dark", darkPalette],
] as const)("the %s palette", (_, palette) => {
  it.each(Object.keys(sights))("keeps verdicts, and curves that are neighbours, apart for %s sight", (name) => {
    const sight = sights[name] as (typeof sights)[string];
    // Five just visible steps; a palette of six saturated primaries falls below it for red-green blindness.
    const apart = 0.1;
    const check = (roles: ColourRole[], reach: number) =>
      roles.forEach((a, i) => {
        for (const b of roles.slice(i + 1, i + 1 + reach)) {
          expect(seenDistance(palette[a], palette[b], sight), `${a} and ${b}`).toBeGreaterThan(apart);
        }
      });
    check(verdicts, verdicts.length);
    check(curves, 2);
  });

  it("stands out from the paper: 3:1 for what is drawn, 4.5:1 for text (WCAG 2.2, 1.4.11 and 1.4.3)", () => {
    // The lightest curves carry their name at their end.
    for (const role of verdicts) expect(contrast(palette[role], palette.paper), role).toBeGreaterThan(3);
    for (const role of curves) expect(contrast(palette[role], palette.paper), role).toBeGreaterThan(2.9);
    for (const role of ["ink", "ink-soft", "accent", "warning"] as const) {
      for (const behind of ["paper", "panel"] as const) {
        expect(contrast(palette[role], palette[behind]), `${role} on ${behind}`).toBeGreaterThan(4.5);
      }
    }
  });
});
