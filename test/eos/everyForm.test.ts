import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { EosCurve } from "../../src/eos/curve.ts";
import { ModelRangeError } from "../../src/errors.ts";
import { expectClose } from "../support/expectClose.ts";
import { everyForm, slopesAt } from "./forms.ts";

/** Pressures [Pa] within a curve's range, spread over the decades of planets. */
function pressures(curve: EosCurve): fc.Arbitrary<number> {
  const low = Math.log(Math.max(curve.minPressure, 1e5));
  const high = Math.log(Math.min(curve.maxPressure, 1e16));
  return fc.double({ min: low, max: high, noNaN: true }).map((x) => {
    const pressure = Math.exp(x);
    return Math.min(Math.max(pressure, curve.minPressure), curve.maxPressure);
  });
}

const check = (curve: EosCurve, property: (pressure: number) => void): void =>
  fc.assert(fc.property(pressures(curve), property), { seed: 20240, numRuns: 200 });

/** Five-point difference of fourth order. */
function difference(f: (y: number) => number, y: number): number {
  const h = 1e-4 * y;
  return (f(y - 2 * h) - 8 * f(y - h) + 8 * f(y + h) - f(y + 2 * h)) / (12 * h);
}

/** A bulk modulus to measure pressures by near zero. */
const STIFFNESS = 2e10;

describe.each(Object.entries(everyForm))("%s", (name, curve) => {
  test("pressure → coordinate → pressure returns to 1e-12 of max(P, K0)", () => {
    check(curve, (pressure) => {
      const back = curve.pressure(curve.coordinate(pressure));
      expect(Math.abs(back - pressure)).toBeLessThanOrEqual(1e-12 * Math.max(pressure, STIFFNESS));
    });
  });

  test("the unchecked inverse is the checked one within the range", () => {
    check(curve, (pressure) => {
      expect(curve.invert(pressure)).toBe(curve.coordinate(pressure));
    });
  });

  test("density → coordinate → density returns to 1e-12", () => {
    check(curve, (pressure) => {
      // At its lower end Thomas–Fermi–Dirac is so flat that rounding takes a density out of the range.
      if (pressure < 1.001 * curve.minPressure) return;
      const density = curve.density(curve.coordinate(pressure));
      expectClose(curve.density(curve.coordinateAtDensity(density)), density, { rel: 1e-12, because: "required" });
    });
  });

  test("coordinate and density grow with pressure", () => {
    check(curve, (pressure) => {
      const higher = Math.min(pressure * 1.001, curve.maxPressure);
      const [y, above] = [curve.coordinate(pressure), curve.coordinate(higher)];
      if (higher > pressure * (1 + 1e-9)) expect(above).toBeGreaterThan(y);
      expect(curve.density(above)).toBeGreaterThanOrEqual(curve.density(y) * (1 - 4e-16));
    });
  });

  test("slopes agree with differences", () => {
    check(curve, (pressure) => {
      const y = curve.coordinate(pressure);
      // A difference across an end of the range or a knot of a table is no reference; nor is one near a turn-over.
      const inside = pressure < 0.99 * curve.maxPressure && curve.pressure(y * 0.999) >= curve.minPressure;
      if (!inside || name === "table") return;
      const slopes = slopesAt(curve, y);
      const because =
        "fourth-order difference with a step of 1e-4 y: truncation and rounding are both about 1e-12 / 1e-4";
      const numericalPressure = difference((x) => curve.pressure(x), y);
      expectClose(slopes[0], numericalPressure, { rel: 1e-8, because });
      expectClose(slopes[1], numericalPressure / curve.density(y), { rel: 1e-8, because });
      const logDensity = difference((x) => Math.log(curve.density(x)), y);
      expect(Math.abs(slopes[2] - logDensity) * y).toBeLessThan(1e-8 * Math.max(1, Math.abs(logDensity * y)));
      const logSlope = difference((x) => Math.log(slopesAt(curve, x)[0]), y);
      expect(Math.abs(slopes[3] - logSlope) * y).toBeLessThan(1e-8 * Math.max(1, Math.abs(logSlope * y)));
    });
  });

  test("pressures outside the range are refused with the pressure, never clamped", () => {
    const outside = [Number.NaN, Number.POSITIVE_INFINITY, -1, curve.minPressure - 1];
    if (curve.maxPressure < Number.POSITIVE_INFINITY) outside.push(curve.maxPressure * 1.0001);
    for (const pressure of outside) {
      const error = thrownBy(() => curve.coordinate(pressure));
      expect(error).toBeInstanceOf(ModelRangeError);
      expect(error).toMatchObject({ code: "eos-pressure-range", quantity: "pressure", value: pressure });
    }
  });

  test("the ends of the range belong to it", () => {
    for (const pressure of [curve.minPressure, Math.min(curve.maxPressure, 1e17)]) {
      const y = curve.coordinate(pressure);
      expect(Number.isFinite(y)).toBe(true);
      expect(curve.density(y)).toBeGreaterThanOrEqual(0);
      const [slope, enthalpySlope] = slopesAt(curve, y);
      expect(slope).toBeGreaterThanOrEqual(0);
      expect(Number.isFinite(enthalpySlope)).toBe(true);
    }
  });

  test("densities outside the range are refused", () => {
    for (const density of [Number.NaN, -1, Number.POSITIVE_INFINITY]) {
      expect(thrownBy(() => curve.coordinateAtDensity(density))).toMatchObject({ code: "eos-density-range" });
    }
  });
});

function thrownBy(action: () => unknown): unknown {
  try {
    return action();
  } catch (error) {
    return error;
  }
}
