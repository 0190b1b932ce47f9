import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  requiredMassError,
  requiredRadiusError,
  requiredTogether,
} from "../../../src/inference/precision/requiredErrors.ts";
import { separation } from "../../../src/inference/precision/separation.ts";
import { expectClose } from "../../support/expectClose.ts";

const positive = fc.double({ min: 1e-3, max: 1e3, noNaN: true });
const because = "round-off, magnified where almost all of the allowed error is used up";

describe("required errors", () => {
  test("reach the level they were asked for, and are refused only where the other error alone stays below it", () => {
    fc.assert(
      fc.property(positive, positive, positive, positive, (gap, slope, level, other) => {
        const contrast = { gap, slope };
        const mass = requiredMassError(contrast, level, other);
        if (mass === undefined) expect(separation(contrast, { mass: 0, radius: other })).toBeLessThanOrEqual(level);
        else expectClose(separation(contrast, { mass, radius: other }), level, { rel: 1e-9, because });
        const radius = requiredRadiusError(contrast, level, other);
        if (radius === undefined) {
          expect(separation(contrast, { mass: other, radius: 0 })).toBeLessThanOrEqual(level * (1 + 1e-12));
        } else expectClose(separation(contrast, { mass: other, radius }), level, { rel: 1e-9, because });
      }),
      { seed: 5, numRuns: 500 },
    );
  });

  test("keep the proportion asked for", () => {
    const contrast = { gap: 0.6, slope: 2 };
    const errors = requiredTogether(contrast, 3, 0.7);
    if (errors === undefined) throw new Error("two radii that differ can be told apart");
    expectClose(errors.mass / errors.radius, 0.7, { rel: 1e-14, because: "round-off" });
    expectClose(separation(contrast, errors), 3, { rel: 1e-14, because: "round-off" });
  });

  test("do not exist for two compositions of one radius", () => {
    const same = { gap: 0, slope: 2 };
    expect(requiredMassError(same, 2, 0.1)).toBeUndefined();
    expect(requiredRadiusError(same, 2, 0.1)).toBeUndefined();
    expect(requiredTogether(same, 2, 1)).toBeUndefined();
  });

  test("let any mass error pass where the radius does not depend on mass", () => {
    expect(requiredMassError({ gap: 1, slope: 0 }, 2, 0.1)).toBe(Number.POSITIVE_INFINITY);
  });
});
