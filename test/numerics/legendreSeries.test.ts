import { describe, expect, test } from "vitest";
import { gaussLegendre } from "../../src/numerics/gaussLegendre.ts";
import { evaluateLegendreSeries, legendreSeries } from "../../src/numerics/legendreSeries.ts";
import { expectClose } from "../support/expectClose.ts";

describe("legendreSeries", () => {
  const rule = gaussLegendre(6);

  test("finds the coefficients of x³ = (2 P_3 + 3 P_1)/5", () => {
    const coefficients = legendreSeries(
      rule,
      rule.nodes.map((x) => x ** 3),
    );
    const expected = [0, 0.6, 0, 0.4, 0, 0];
    coefficients.forEach((c, k) => {
      expect(Math.abs(c - expected[k])).toBeLessThan(1e-15);
    });
  });

  test("passes through the values at the nodes and reproduces polynomials between them", () => {
    const polynomial = (x: number) => 1 - 2 * x + 3 * x ** 4 - x ** 5;
    const coefficients = legendreSeries(rule, rule.nodes.map(polynomial));
    for (const x of [...rule.nodes, -1, -0.3, 0.77, 1]) {
      expectClose(evaluateLegendreSeries(coefficients, x), polynomial(x), { rel: 1e-13, because: "round-off" });
    }
  });
});
