import { describe, expect, test } from "vitest";
import { type BoundaryLabels, CLASS_CODES, verdictFor } from "../../src/inference/verdict.ts";

const labels: BoundaryLabels = ["iron", "silicate", "water"];

describe("verdictFor", () => {
  test.each([
    [[0.93, 0.07, 0, 0], "denser-than-iron", "denser than iron (p = 0.93); no mixture of them fits"],
    [[0.1, 0.87, 0.03, 0], "iron-silicate", "between iron and silicate (p = 0.87)"],
    [[0, 0.004, 0.996, 0], "silicate-water", "between silicate and water (p > 0.99)"],
    [[0, 0, 0.3, 0.7], "lighter-than-water", "less dense than water (p = 0.70); no mixture of them fits"],
    [
      [0, 0.48, 0.5, 0.02],
      "undecided",
      "cannot be told apart: between silicate and water (p = 0.50) or between iron and silicate (p = 0.48)",
    ],
    [
      [0.3, 0.4, 0.295, 0.005],
      "undecided",
      "cannot be told apart: between iron and silicate (p = 0.40) or denser than iron (p = 0.30) or between silicate and water (p = 0.29)",
    ],
  ])("%j is %s", (probabilities, code, statement) => {
    expect(verdictFor(probabilities, labels)).toEqual({ code, statement });
  });

  test("states a class alone from 0.68 on", () => {
    expect(verdictFor([0, 0.68, 0.32, 0], labels).code).toBe("iron-silicate");
    expect(verdictFor([0, 0.679, 0.321, 0], labels).code).toBe("undecided");
  });

  test("uses the names of the boundaries it is given", () => {
    const { statement } = verdictFor([0, 0, 1, 0], ["metal", "rock", "ice"]);
    expect(statement).toBe("between rock and ice (p > 0.99)");
    expect(CLASS_CODES).toHaveLength(4);
  });
});
