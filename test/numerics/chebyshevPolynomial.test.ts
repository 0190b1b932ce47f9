import { describe, expect, it } from "vitest";
import { ChebyshevPolynomial, chebyshevNodes } from "../../src/numerics/chebyshevPolynomial.ts";

const through = (f: (x: number) => number, from: number, to: number, degree: number) =>
  new ChebyshevPolynomial(from, to, Array.from(chebyshevNodes(from, to, degree), f));

describe("ChebyshevPolynomial", () => {
  it("reproduces a polynomial of its own degree, value and slope", () => {
    const cubic = through((x) => 2 - x + 3 * x ** 2 - x ** 3, -1, 4, 3);
    for (const x of [-1, 0.3, 2.9, 4]) {
      expect(cubic.value(x)).toBeCloseTo(2 - x + 3 * x ** 2 - x ** 3, 12);
      expect(cubic.slope(x)).toBeCloseTo(-1 + 6 * x - 3 * x ** 2, 12);
    }
  });

  it("converges geometrically on an analytic function", () => {
    const exponential = through(Math.exp, 0, 1, 13);
    for (const x of [0, 0.123, 0.77, 1]) {
      expect(Math.abs(exponential.value(x) - Math.exp(x))).toBeLessThan(1e-14);
      expect(Math.abs(exponential.slope(x) - Math.exp(x))).toBeLessThan(1e-12);
    }
  });

  it("takes the sampled values at both ends, so that neighbours join", () => {
    const piece = through((x) => 1 / (1 + 25 * x * x), -1, 0.5, 5);
    expect(piece.value(-1)).toBeCloseTo(1 / 26, 15);
    expect(piece.value(0.5)).toBeCloseTo(1 / 7.25, 15);
  });
});
