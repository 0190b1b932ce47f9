import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { fluidState } from "../../../src/eos/water/fluidState.ts";
import { expectClose } from "../../support/expectClose.ts";

// IAPWS R6-95(2018), Table 7: T [K], density [kg/m3], p [MPa], c_v [kJ/kg/K], w [m/s] (from memory), s [kJ/kg/K].
const table7: readonly (readonly [number, number, number, number, number, number])[] = [
  [300, 996.556, 0.099241835, 4.13018112, 1501.51914, 0.393062643],
  [300, 1005.308, 20.0022515, 4.06798347, 1534.92501, 0.387405401],
  [300, 1188.202, 700.004704, 3.4613558, 2443.57992, 0.132609616],
  [500, 0.435, 0.0999679423, 1.50817541, 548.314253, 7.94488271],
  [500, 4.532, 0.999938125, 1.66991025, 535.739001, 6.82502725],
  [500, 838.025, 10.0003858, 3.22106219, 1271.28441, 2.56690919],
  [500, 1084.564, 700.000405, 3.07437693, 2412.00877, 2.03237509],
  [647, 358, 22.0384756, 6.18315728, 252.145078, 4.32092307],
  [900, 0.241, 0.100062559, 1.75890657, 724.027147, 9.16653194],
  [900, 52.615, 20.000069, 1.93510526, 698.445674, 6.59070225],
  [900, 870.769, 700.000006, 2.6642235, 2019.33608, 4.17223802],
];

test.each(table7)("Table 7 at %s K, %s kg/m3, to nine digits", (temperature, density, p, cv, w, s) => {
  const state = fluidState(density, temperature);
  const found = [state.pressure / 1e6, state.isochoricHeatCapacity / 1e3, state.soundSpeed, state.entropy / 1e3];
  // The release cuts some digits instead of rounding them, so one unit of the ninth is allowed.
  [p, cv, w, s].forEach((value, i) => {
    expectClose(found[i], value, { rel: 1.0e-9 * (10 / leadingDigits(value)), because: "one unit in the ninth digit" });
  });
});

/** 1 to 10: the number without its power of ten. */
function leadingDigits(value: number): number {
  return value / 10 ** Math.floor(Math.log10(value));
}

const rows = readFileSync("test/fixtures/water/derivatives.csv", "utf8")
  .trim()
  .split("\n")
  .slice(2)
  .map((line) => line.split(",").map(Number));

test.each(rows)("derivatives at %s K, %s kg/m3 by 40-digit differences", (temperature, density, ...reference) => {
  const { pressure, isothermalBulkModulus, expansivity, heatCapacity } = fluidState(density, temperature);
  // Near the critical point the sums cancel to 1e-4 of their terms.
  [pressure, isothermalBulkModulus, expansivity, heatCapacity].forEach((value, i) => {
    expectClose(value, reference[i], { rel: 1e-10, because: "rounding, 1e-16 over cancellation to 1e-6 at worst" });
  });
});

test("the state is thermodynamically consistent: h = u + p/rho, K_S = rho w^2, K_S/K_T = c_p/c_v", () => {
  const state = fluidState(800, 560);
  const because = "identities, to rounding";
  expectClose(state.enthalpy, state.internalEnergy + state.pressure / 800, { rel: 1e-14, because });
  expectClose(state.isentropicBulkModulus, 800 * state.soundSpeed ** 2, { rel: 1e-14, because });
  expectClose(
    state.heatCapacity - state.isochoricHeatCapacity,
    (560 * state.expansivity ** 2 * state.isothermalBulkModulus) / 800,
    { rel: 1e-12, because },
  );
});

test("the liquid at the triple point is the zero of energy and entropy", () => {
  const state = fluidState(999.792520031618, 273.16);
  expect(Math.abs(state.internalEnergy)).toBeLessThan(1e-4);
  expect(Math.abs(state.entropy)).toBeLessThan(1e-6);
});
