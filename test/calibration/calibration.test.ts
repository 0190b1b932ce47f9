import { describe, expect, test } from "vitest";
import { logChiSquareAbove } from "../../src/inference/composition/chiSquare.ts";
import { calibrateFamily } from "./calibrateFamily.ts";
import { calibrationFaults } from "./calibrationFaults.ts";
import { shippedFamilies, statedPriors } from "./families.ts";

/** Planets by number of components: three cost ten times as much as two. Coarse lattices: radii to 1e-4, errors are 1e-2. */
const PLANETS: Record<number, number> = { 2: 300, 3: 60 };
const OPTIONS = { angleSteps: 12 };
const [rocky] = shippedFamilies.filter(({ name }) => name === "iron-silicate");

describe("posteriors are calibrated", () => {
  test("in every shipped family and with stated priors", () => {
    const all = [...shippedFamilies, statedPriors].flatMap((family) =>
      calibrateFamily(family, PLANETS[family.components.length], OPTIONS),
    );
    expect(all).toHaveLength(9);
    expect(calibrationFaults(all)).toEqual([]);
  });

  test("and found not to be if radii are taken for twice as good as they are", () => {
    const overconfident = calibrateFamily(rocky, PLANETS[2], { ...OPTIONS, assumedRadiusError: 0.5 });
    expect(calibrationFaults(overconfident)).toEqual([
      expect.stringContaining("the 68 % interval covers"),
      expect.stringContaining("the 95 % interval covers"),
      expect.stringContaining("ranks are uniform with p ="),
    ]);
  });
});

test("the chi-square probability at 19 degrees of freedom is that of Abramowitz & Stegun 1964, table 26.8", () => {
  expect(Math.exp(logChiSquareAbove(30.1435, 19))).toBeCloseTo(0.05, 6);
  expect(Math.exp(logChiSquareAbove(43.8202, 19))).toBeCloseTo(0.001, 8);
});
