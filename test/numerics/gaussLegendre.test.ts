import { describe, expect, test } from "vitest";
import { gaussLegendre } from "../../src/numerics/gaussLegendre.ts";
import { expectClose } from "../support/expectClose.ts";

describe("gaussLegendre", () => {
  test("has the published nodes and weights", () => {
    // Abramowitz & Stegun 1964, table 25.4, n = 5
    const { nodes, weights } = gaussLegendre(5);
    const tolerance = { rel: 1e-14, because: "the table has 15 digits" };
    expectClose(nodes[4], 0.906179845938664, tolerance);
    expectClose(weights[4], 0.236926885056189, tolerance);
    expectClose(nodes[3], 0.538469310105683, tolerance);
    expectClose(weights[3], 0.478628670499366, tolerance);
    expect(Math.abs(nodes[2])).toBeLessThan(1e-16);
    expectClose(weights[2], 0.568888888888889, tolerance);
  });

  test.each([1, 2, 5, 10, 40])("with %i nodes is exact up to degree 2n - 1 and no further", (n) => {
    const { nodes, weights } = gaussLegendre(n);
    const moment = (power: number) => nodes.reduce((sum, x, i) => sum + weights[i] * x ** power, 0);
    for (let power = 0; power < 2 * n; power += 2) {
      expectClose(moment(power), 2 / (power + 1), { rel: 1e-13, because: "round-off of n terms" });
    }
    for (let power = 1; power < 2 * n; power += 2) expect(Math.abs(moment(power))).toBeLessThan(1e-15);
    if (n <= 5) expect(Math.abs(moment(2 * n) * ((2 * n + 1) / 2) - 1)).toBeGreaterThan(1e-3);
  });

  test("lists nodes rising and mirrored", () => {
    const { nodes } = gaussLegendre(12);
    nodes.forEach((x, i) => {
      if (i > 0) expect(x).toBeGreaterThan(nodes[i - 1]);
      expect(Math.abs(x + nodes[11 - i])).toBeLessThan(1e-15);
    });
  });
});
