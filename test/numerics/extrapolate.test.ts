import fc from "fast-check";
import { expect, it } from "vitest";
import { polynomialThrough } from "../../src/numerics/extrapolate.ts";

it("reproduces quadratics, inside and outside the points", () => {
  const coefficient = fc.double({ min: -10, max: 10, noNaN: true });
  fc.assert(
    fc.property(coefficient, coefficient, coefficient, fc.double({ min: -5, max: 5, noNaN: true }), (a, b, c, x) => {
      const f = (t: number): number => a + t * (b + t * c);
      const xs = [-1, 0.5, 2];
      expect(polynomialThrough(xs, xs.map(f), x)).toBeCloseTo(f(x), 9);
    }),
    { seed: 8 },
  );
});

it("repeats a single point", () => {
  expect(polynomialThrough([3], [7], 100)).toBe(7);
});
