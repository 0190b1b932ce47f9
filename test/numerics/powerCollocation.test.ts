import { expect, it } from "vitest";
import { powerCollocation } from "../../src/numerics/powerCollocation.ts";

const { nodes, integral, ballMean } = powerCollocation(8);
const apply = (row: Float64Array, f: (t: number) => number): number =>
  row.reduce((sum, weight, j) => sum + weight * f(nodes[j]), 0);

it("has its last node at 1 and none at 0", () => {
  expect(nodes.at(-1)).toBe(1);
  expect(Math.min(...nodes)).toBeGreaterThan(0);
});

it("is exact for polynomials of degree 7", () => {
  nodes.forEach((t, i) => {
    for (let k = 0; k < 8; k++) {
      expect(apply(integral[i], (x) => x ** k)).toBeCloseTo(t ** (k + 1) / (k + 1), 12);
      // (1/t^1.5) ∫ √x x^k dx
      expect(apply(ballMean[i], (x) => x ** k)).toBeCloseTo(t ** k / (k + 1.5), 12);
    }
  });
});

it("integrates an analytic function to many digits", () => {
  nodes.forEach((t, i) => {
    expect(apply(integral[i], Math.exp)).toBeCloseTo(Math.expm1(t), 9);
  });
});
