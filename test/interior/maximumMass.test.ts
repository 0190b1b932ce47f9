import { describe, expect, it } from "vitest";
import type { ModelRangeError } from "../../src/errors.ts";
import { solvePlanet } from "../../src/interior/solvePlanet.ts";
import { StructureSolver } from "../../src/interior/structureSolver.ts";
import { EARTH_MASS, GPA } from "../../src/units/constants.ts";
import { planetOf, stack, vinetOf } from "../support/referenceMaterials.ts";

/** Dewaele et al. 2006, Phys. Rev. Lett. 97, 215504: V0 6.765 cm³/mol, K0 165 GPa, K0' 4.97 (from memory). */
const dewaele = stack(vinetOf(55.845e-3 / 6.765e-6, 165, 4.97));

function failure(run: () => unknown): ModelRangeError {
  try {
    run();
  } catch (error) {
    return error as ModelRangeError;
  }
  throw new Error("expected an error");
}

describe("a Vinet iron planet, whose pressure grows only as ρ^(2/3)", () => {
  const solver = new StructureSolver(planetOf([[dewaele, 1]]));

  it("names the largest mass it can have, and solves just below it on the stable branch", () => {
    const error = failure(() => solver.solve(100 * EARTH_MASS));
    expect(error.code).toBe("mass-above-maximum");
    // About 52 Earth masses by an independent scan over central pressure (SciPy).
    expect(error.maximum / EARTH_MASS).toBeCloseTo(52.05, 1);
    expect(error.message).toContain("52.0");
    const below = solver.solve(error.maximum * 0.999);
    const lower = solver.solve(error.maximum * 0.99);
    expect(below.centralPressure).toBeGreaterThan(lower.centralPressure);
    expect(failure(() => solver.solve(error.maximum * 1.001)).code).toBe("mass-above-maximum");
  });

  it("comes back to the same planet after a failure", () => {
    const before = solver.solve(10 * EARTH_MASS);
    failure(() => solver.solve(100 * EARTH_MASS));
    expect({ ...solver.solve(10 * EARTH_MASS), counters: 0 }).toEqual({ ...before, counters: 0 });
  });
});

describe("a Birch–Murnaghan form of order 4 that turns over", () => {
  it("names the largest mass and the pressure where the form ends", () => {
    const error = failure(() => solvePlanet(planetOf([["pv-bm4", 1]]), 200 * EARTH_MASS));
    expect(error.code).toBe("mass-above-maximum");
    // Turns over at 2.967e4 GPa, about 82 Earth masses by an independent scan (SciPy).
    expect(error.maximum / EARTH_MASS).toBeCloseTo(82.5, 0);
    expect(error.message).toContain("2.967e+4 GPa");
  });

  it("limits a layered planet too, where the layers grow with the mass asked for", () => {
    const solver = new StructureSolver(
      planetOf([
        ["pv-bm4", 0.5],
        ["ice-bm3", 0.5],
      ]),
    );
    const error = failure(() => solver.solve(900 * EARTH_MASS));
    expect(error.code).toBe("mass-above-maximum");
    const largest = solver.solve(error.maximum);
    expect(largest.centralPressure).toBeLessThan(2.97e4 * GPA);
    expect(largest.centralPressure).toBeGreaterThan(2.9e4 * GPA);
    expect(failure(() => solver.solve(error.maximum * 1.0001)).code).toBe("mass-above-maximum");
  });
});

describe("masses and compositions that cannot be", () => {
  it.each([0, -1, Number.NaN, 1e-4, 2e3])("refuses %d Earth masses with the range", (mass) => {
    const error = failure(() => solvePlanet(planetOf([["fe-bm3", 1]]), mass * EARTH_MASS));
    expect(error.code).toBe("mass-range");
    expect(error.message).toContain("0.001 to 1000 Earth masses");
  });

  it("solves both ends of the range for a form that reaches that far", () => {
    for (const mass of [1e-3, 1e3]) {
      const planet = solvePlanet(planetOf([["h2o-poly", 1]]), mass * EARTH_MASS);
      expect(planet.radius).toBeGreaterThan(0);
      expect(planet.radiusRelativeError).toBeLessThan(1e-7);
    }
  });

  it("refuses a composition without layers", () => {
    expect(() => new StructureSolver(planetOf([]))).toThrow(expect.objectContaining({ code: "composition-empty" }));
  });
});
