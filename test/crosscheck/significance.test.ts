import { describe, expect, test } from "vitest";
import { logErrors, tensionSigma } from "../../src/crosscheck/significance.ts";
import { expectClose } from "../support/expectClose.ts";
import { quantity, type Written } from "./planetRow.ts";

const errors = (written: Written) => logErrors(quantity("eccentricity", written));
const roundOff = { rel: 1e-12, because: "round-off" };

describe("errors of the logarithm", () => {
  test("reach the ends of the interval", () => {
    expectClose(errors([2, [1, 2]]).minus, Math.LN2, roundOff);
    expectClose(errors([2, [1, 2]]).plus, Math.LN2, roundOff);
  });

  test("have no lower end where the interval reaches zero", () => {
    expect(errors([2, [2, 1]]).minus).toBe(Number.POSITIVE_INFINITY);
  });

  test("of a missing side are those of the other", () => {
    expectClose(errors([2, undefined, { plus: 1 }]).minus, Math.LN2, roundOff);
    expectClose(errors([2, undefined, { minus: 1 }]).plus, Math.log(1.5), roundOff);
  });

  test.each<[string, Written]>([
    ["missing", 2],
    ["zero", [2, 0]],
  ])("are 3 %% where %s", (_, written) => {
    expectClose(errors(written).plus, Math.log(1.03), roundOff);
  });
});

test("tension is signed and needs the errors that face each other", () => {
  const of = (a: Written, b: Written) => tensionSigma(quantity("eccentricity", a), quantity("eccentricity", b));
  expectClose(of([1, [9, 0.3]], [2, [0.4, 9]]) ?? 0, -2, roundOff);
  expect(of([1, undefined, { plus: 0.3 }], [2, undefined, { plus: 0.4 }])).toBeUndefined();
});
