import { describe, expect, it } from "vitest";
import { type ColourRole, darkPalette, lightPalette } from "../../src/figures/palette.ts";
import { contrast, seenDistance, sights } from "./colourVision.ts";

type Sight = (typeof sights)[string];

const numbered = (kind: "curve" | "verdict", count: number) =>
  Array.from({ length: count }, (_, i) => `${kind}-${i + 1}` as ColourRole);
const curves = numbered("curve", 8);
const verdicts = numbered("verdict", 5);

it("knows a pair that red-green blindness brings together", () => {
  const [red, green] = ["#b03030", "#6b6b1e"];
  expect(seenDistance(red, green, sights.normal as Sight)).toBeGreaterThan(0.15);
  expect(seenDistance(red, green, sights.deuteranopia as Sight)).toBeLessThan(0.1);
});

describe.each([
  ["light", lightPalette],
  ["dark", darkPalette],
] as const)("the %s palette", (_, palette) => {
  it.each(Object.keys(sights))("keeps verdicts, and curves that are neighbours, apart for %s sight", (name) => {
    const sight = sights[name] as Sight;
    // Five just visible steps.
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
