import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { atDeviation, deviation, shareBetween } from "../../src/inference/splitNormal.ts";
import { expectClose } from "../support/expectClose.ts";

const measured = { mode: 5, minus: 1, plus: 3 };
const [least, most] = [Number.NEGATIVE_INFINITY, Number.POSITIVE_INFINITY];

describe("shareBetween", () => {
  test("gives each side of the mode its share of the errors", () => {
    expectClose(shareBetween(measured, least, 5), 1 / 4, { rel: 1e-15, because: "minus / (minus + plus)" });
    expectClose(shareBetween(measured, 5, most), 3 / 4, { rel: 1e-15, because: "plus / (minus + plus)" });
    expectClose(shareBetween(measured, 4, 8), 0.682689492137086, { rel: 1e-14, because: "one error on each side" });
  });

  test("is the area of the density exp(-z²/2), by the trapezoidal rule", () => {
    const step = 1e-3;
    let area = 0;
    for (let x = 3.2; x < 9.6 - step / 2; x += step) {
      const at = (y: number) => Math.exp(-0.5 * deviation(measured, y) ** 2);
      area += (step * (at(x) + at(x + step))) / 2;
    }
    const whole = Math.sqrt(Math.PI / 2) * (measured.minus + measured.plus);
    expectClose(shareBetween(measured, 3.2, 9.6), area / whole, { rel: 1e-7, because: "step² / 12" });
  });

  test("keeps its digits in both tails", () => {
    // 2 w Φ(-10), w = 1/4 and 3/4; Φ(-10) = 7.61985302416053e-24 (mpmath)
    expectClose(shareBetween(measured, least, -5), 3.80992651208026e-24, { rel: 1e-13, because: "round-off of z²" });
    expectClose(shareBetween(measured, 35, most), 1.14297795362408e-23, { rel: 1e-13, because: "round-off of z²" });
  });

  test("adds up, is never negative, and does not care about the unit", () => {
    const size = fc.double({ min: 1e-3, max: 1e3, noNaN: true });
    const place = fc.double({ min: -1e4, max: 1e4, noNaN: true });
    fc.assert(
      fc.property(place, size, size, place, place, size, (mode, minus, plus, a, b, unit) => {
        const of = { mode, minus, plus };
        const [from, to] = a < b ? [a, b] : [b, a];
        const parts = [shareBetween(of, least, from), shareBetween(of, from, to), shareBetween(of, to, most)];
        for (const part of parts) expect(part).toBeGreaterThanOrEqual(0);
        expect(Math.abs(parts[0] + parts[1] + parts[2] - 1)).toBeLessThan(1e-14);
        const scaled = { mode: mode * unit, minus: minus * unit, plus: plus * unit };
        expect(Math.abs(shareBetween(scaled, from * unit, to * unit) - parts[1])).toBeLessThan(1e-9);
      }),
      { seed: 11, numRuns: 300 },
    );
  });
});

test("atDeviation undoes deviation on both sides", () => {
  for (const x of [-3, 4.5, 5, 7, 20]) {
    expectClose(atDeviation(measured, deviation(measured, x)), x, { rel: 1e-14, because: "round-off" });
  }
});
