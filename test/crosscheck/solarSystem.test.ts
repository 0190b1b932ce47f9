import { describe, expect, test } from "vitest";
import { runRules } from "../../src/crosscheck/runRules.ts";
import { EARTH_MASS, EARTH_RADIUS } from "../../src/units/constants.ts";
import { solarSystem } from "./solarSystem.ts";

/** Pure iron grows as M^0.27 from 0.77 Earth radii at one Earth mass, roughly (Seager et al. 2007, from memory). */
const ironRadius = (mass: number) => 0.77 * EARTH_RADIUS * (mass / EARTH_MASS) ** 0.27;

describe("a correct table of the Solar System", () => {
  test.each([true, false])("draws no warning and no error (published errors: %s)", (errors) => {
    const findings = runRules(solarSystem({ errors }), { ironRadius });
    expect(findings.filter(({ severity }) => severity !== "info")).toEqual([]);
  });

  test("gives every rule on columns something to compare", () => {
    const broken = solarSystem({ errors: false }).map((row) => {
      const { radius, ...rest } = row.quantities;
      return { ...row, quantities: { ...rest, ...(radius && { radius: { ...radius, value: radius.value * 11.2 } }) } };
    });
    const fired = new Set(runRules(broken).map(({ rule }) => rule));
    expect([...fired]).toEqual(
      expect.arrayContaining(["unit-slip", "density-mass-radius", "gravity-mass-radius", "radius-ratio"]),
    );
  });
});
