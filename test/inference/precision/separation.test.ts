import { describe, expect, test } from "vitest";
import { contrastAt, limitingError, massShare, separation } from "../../../src/inference/precision/separation.ts";
import { expectClose } from "../../support/expectClose.ts";
import { powerLaw } from "../powerLaws.ts";

describe("contrastAt", () => {
  test("gives gap and mean slope of R = a M^b, in any order", () => {
    const mass = 5;
    const contrast = contrastAt({ a: powerLaw(1.4), b: powerLaw(1.1) }, mass);
    expectClose(contrast.gap, 0.3 * mass ** 0.27, { rel: 1e-14, because: "round-off" });
    expectClose(contrast.slope, 0.27 * 1.25 * mass ** (0.27 - 1), { rel: 1e-4, because: "central difference" });
    expect(contrastAt({ a: powerLaw(1.1), b: powerLaw(1.4) }, mass)).toEqual(contrast);
  });

  test("does not leave the curves at their ends", () => {
    const { heaviest } = powerLaw(1);
    const { slope } = contrastAt({ a: powerLaw(1), b: powerLaw(1.2) }, heaviest);
    expectClose(slope, 0.27 * 1.1 * heaviest ** (0.27 - 1), { rel: 0.01, because: "a one-sided difference" });
  });
});

describe("separation", () => {
  const contrast = { gap: 0.6, slope: 2 };

  test("is gap over the errors in quadrature", () => {
    // hypot(0.3, 2 · 0.2) = 0.5
    expectClose(separation(contrast, { radius: 0.3, mass: 0.2 }), 1.2, { rel: 1e-14, because: "round-off" });
    expect(separation(contrast, { radius: 0.3, mass: 0 })).toBe(2);
    expectClose(separation(contrast, { radius: 0, mass: 0.1 }), 3, { rel: 1e-14, because: "round-off" });
  });

  test("is nothing where a quantity is not measured", () => {
    expect(separation(contrast, { radius: 0.3, mass: Number.POSITIVE_INFINITY })).toBe(0);
    expect(separation(contrast, { radius: Number.POSITIVE_INFINITY, mass: 0.1 })).toBe(0);
  });

  test("names the error that limits it, by its share of the variance", () => {
    const errors = { radius: 0.3, mass: 0.2 };
    expectClose(massShare(contrast, errors), 0.16 / 0.25, { rel: 1e-14, because: "round-off" });
    expect(limitingError(contrast, errors)).toBe("mass");
    expect(limitingError(contrast, { radius: 0.5, mass: 0.2 })).toBe("radius");
    expect(limitingError(contrast, { radius: 0.5, mass: Number.POSITIVE_INFINITY })).toBe("mass");
    expect(limitingError(contrast, { radius: Number.POSITIVE_INFINITY, mass: 0.2 })).toBe("radius");
  });
});
