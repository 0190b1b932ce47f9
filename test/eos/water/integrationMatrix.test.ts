import { expect, test } from "vitest";
import { integrationMatrix } from "../../../src/eos/water/integrationMatrix.ts";
import { chebyshevNodes } from "../../../src/numerics/chebyshevPolynomial.ts";

test("monomials up to the degree are integrated exactly", () => {
  const nodes = chebyshevNodes(-1, 1, 8);
  const matrix = integrationMatrix(8);
  for (let power = 0; power <= 8; power++) {
    matrix.forEach((row, i) => {
      const integral = row.reduce((sum, weight, j) => sum + weight * nodes[j] ** power, 0);
      const exact = (nodes[i] ** (power + 1) - (-1) ** (power + 1)) / (power + 1);
      expect(Math.abs(integral - exact)).toBeLessThan(1e-14);
    });
  }
});
