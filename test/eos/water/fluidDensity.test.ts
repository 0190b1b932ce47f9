import fc from "fast-check";
import { expect, test } from "vitest";
import { fluidDensity } from "../../../src/eos/water/fluidDensity.ts";
import { fluidState } from "../../../src/eos/water/fluidState.ts";
import { saturation } from "../../../src/eos/water/saturation.ts";
import { expectClose } from "../../support/expectClose.ts";

const logPressure = fc.double({ min: 1, max: 11, noNaN: true });
const branchAt = (pressure: number, temperature: number) =>
  temperature < 647.096 && pressure < saturation(temperature).pressure ? "vapour" : "dense";

test("P(density(P, T), T) = P, and density grows with P", () => {
  fc.assert(
    fc.property(logPressure, fc.double({ min: 273.16, max: 5000, noNaN: true }), (exponent, temperature) => {
      const pressure = 10 ** exponent;
      const density = fluidDensity(pressure, temperature, branchAt(pressure, temperature));
      const state = fluidState(density, temperature);
      // As an error of density, since the liquid's pressure cancels to nothing near 0.
      expect(Math.abs(state.pressure - pressure) / state.isothermalBulkModulus).toBeLessThan(1e-12);
      const higher = pressure * 1.01;
      expect(fluidDensity(higher, temperature, branchAt(higher, temperature))).toBeGreaterThan(density);
    }),
    { seed: 95, numRuns: 300 },
  );
});

test("each branch ends at saturation", () => {
  const { pressure, liquidDensity, vapourDensity } = saturation(500);
  const because = "the solver's rounding";
  expectClose(fluidDensity(pressure, 500, "dense"), liquidDensity, { rel: 1e-11, because });
  expectClose(fluidDensity(pressure, 500, "vapour"), vapourDensity, { rel: 1e-11, because });
  expect(() => fluidDensity(1.2 * pressure, 500, "vapour")).toThrow(
    expect.objectContaining({ code: "water-fluid-range" }),
  );
  expect(() => fluidDensity(0.2 * pressure, 500, "dense")).toThrow(
    expect.objectContaining({ code: "water-fluid-range" }),
  );
});

test.each([0, -1, Number.NaN])("a fluid at %s Pa has no density", (pressure) => {
  expect(() => fluidDensity(pressure, 300, "vapour")).toThrow(
    expect.objectContaining({ code: "water-pressure-range" }),
  );
});
