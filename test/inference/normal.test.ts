import { describe, expect, test } from "vitest";
import { erfc, normalBelow } from "../../src/inference/normal.ts";
import { reference } from "../fixtures/inference/reference.ts";
import { expectClose } from "../support/expectClose.ts";

describe("erfc", () => {
  test.each(reference.erfc)("at $x is that of mpmath", ({ x, erfc: expected }) => {
    const because = x > 6 ? "round-off of x² in exp(-x²)" : "a few units of round-off";
    expectClose(erfc(x), expected, { rel: x > 6 ? 1e-13 : 5e-15, because });
  });

  test("falls without a break where one method gives way to another, and ends at 0", () => {
    for (const seam of [0.5, 6]) {
      const [below, above] = [erfc(seam * (1 - 1e-9)), erfc(seam * (1 + 1e-9))];
      const slope = (2 / Math.sqrt(Math.PI)) * Math.exp(-seam * seam);
      expectClose((below - above) / (2e-9 * seam), slope, { rel: 1e-5, because: "difference of close numbers" });
    }
    expect(erfc(30)).toBe(0);
    expect(erfc(Number.POSITIVE_INFINITY)).toBe(0);
    expect(erfc(Number.NEGATIVE_INFINITY)).toBe(2);
  });
});

test("normalBelow gives the shares of one, two and three standard errors", () => {
  // 68-95-99.7: 0.682689492137086, 0.954499736103642, 0.997300203936740 (standard tables)
  [0.682689492137086, 0.954499736103642, 0.99730020393674].forEach((share, i) => {
    expectClose(normalBelow(i + 1) - normalBelow(-i - 1), share, { rel: 1e-14, because: "the table has 15 digits" });
  });
});
