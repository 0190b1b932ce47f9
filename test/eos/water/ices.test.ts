import { describe, expect, test } from "vitest";
import { fluidDensity } from "../../../src/eos/water/fluidDensity.ts";
import { iceIhState } from "../../../src/eos/water/iceIh.ts";
import { iceIIIState, iceIIState, iceVState, tanhState, tanhVolumes } from "../../../src/eos/water/icesToV.ts";
import { iceVIState } from "../../../src/eos/water/iceVI.ts";
import { iceVIIState } from "../../../src/eos/water/iceVII.ts";
import { meltingPressureVI, meltingPressureVII } from "../../../src/eos/water/meltingCurves.ts";
import { expectClose } from "../../support/expectClose.ts";

describe("derivatives agree with differences", () => {
  test.each([
    ["II", iceIIState, 0.4e9, 220],
    ["III", iceIIIState, 0.3e9, 250],
    ["V", iceVState, 0.5e9, 250],
    ["VI", iceVIState, 1.4e9, 310],
    ["VII below 300 K", iceVIIState, 10e9, 200],
    ["VII", iceVIIState, 30e9, 600],
    ["VII above 850 K", iceVIIState, 60e9, 1100],
  ] as const)("ice %s", (_, state, pressure, temperature) => {
    const here = state(pressure, temperature);
    const logDensity = (p: number, t: number) => Math.log(state(p, t).density);
    const [dp, dt] = [1e-4 * pressure, 1e-4 * temperature];
    const because = "second-order differences with a step of 1e-4";
    const stiffness = (logDensity(pressure + dp, temperature) - logDensity(pressure - dp, temperature)) / (2 * dp);
    expectClose(here.isothermalBulkModulus, 1 / stiffness, { rel: 1e-7, because });
    const swelling = (logDensity(pressure, temperature - dt) - logDensity(pressure, temperature + dt)) / (2 * dt);
    expectClose(here.expansivity, swelling, { rel: 1e-6, because });
  });
});

// Unit cells (from memory): III Londono 1993, V Kamb 1967 at 1 atm brought to 0.5 GPa, VI Kuhs 1984 (6.181^2 x 5.698 A, 10 molecules).
test.each([
  ["II, Kamb 1964", iceIIState, 0.28e9, 237, 1180],
  ["III", iceIIIState, 0.28e9, 250, 1165],
  ["V", iceVState, 0.53e9, 223, 1267],
  ["VI", iceVIState, 1.1e9, 225, 1374],
] as const)(
  "the density of ice %s is within 1.5 %% of its crystal cell",
  (_, state, pressure, temperature, density) => {
    expectClose(state(pressure, temperature).density, density, {
      rel: 0.015,
      because: "1 % of the form, 0.5 % of memory",
    });
  },
);

test("the tanh form for ice Ih is within 0.15 % of IAPWS R10-06, which tests its arithmetic and units", () => {
  const volume = {
    referenceTemperature: 273.16,
    V0: 1.086e-3,
    a0: 0.019,
    a1: 0.0075,
    b0: 0.974,
    b1: 0.0302,
    b2: 0.00395e-6,
  };
  const { density } = tanhState(volume, 150e6, 255, 1);
  expectClose(density, iceIhState(150e6, 255).density, { rel: 1.5e-3, because: "the two sources" });
});

test("the two published forms of ice VI differ as iceVI.ts says", () => {
  const ratio = (pressure: number) =>
    tanhState(tanhVolumes.VI, pressure, 300, 1).density / iceVIState(pressure, 300).density;
  expect(ratio(0.632e9)).toBeCloseTo(1.028, 3);
  expect(ratio(2.216e9)).toBeCloseTo(0.967, 3);
});

/** Entropy of fusion [J/kg/K] that a melting curve implies by Clapeyron's equation. */
function fusionEntropy(
  melting: (temperature: number) => number,
  iceDensity: number,
  liquidDensity: number,
  temperature = 355,
): number {
  const slope = (melting(temperature + 0.01) - melting(temperature - 0.01)) / 0.02;
  return (1 / liquidDensity - 1 / iceDensity) * slope;
}

test("volumes at the VI-VII-liquid triple point give the VI-VII boundary its slope, which the other form does not", () => {
  const pressure = 2.216e9;
  const liquid = fluidDensity(pressure, 355, "dense");
  const seven = iceVIIState(pressure, 355).density;
  const implied = (six: number) =>
    (fusionEntropy(meltingPressureVII, seven, liquid) - fusionEntropy(meltingPressureVI, six, liquid)) /
    (1 / six - 1 / seven);
  // Pistorius 1968 (from memory): 2.1 GPa at 278 K to 2.216 GPa at 355 K, 1.5 MPa/K.
  expect(implied(iceVIState(pressure, 355).density) / 1e6).toBeGreaterThan(0);
  expect(implied(iceVIState(pressure, 355).density) / 1e6).toBeLessThan(3);
  expect(implied(tanhState(tanhVolumes.VI, pressure, 355, 1).density) / 1e6).toBeGreaterThan(8);
});

test.each([
  [355, 1340],
  [420, 1470],
  [650, 5290],
])("R14-08 implies at %s K a fusion entropy of %s J/kg/K, as meltingCurves.ts says", (temperature, entropy) => {
  const pressure = meltingPressureVII(temperature);
  const liquid = fluidDensity(pressure, temperature, "dense");
  const found = fusionEntropy(meltingPressureVII, iceVIIState(pressure, temperature).density, liquid, temperature);
  expectClose(found, entropy, { rel: 0.01, because: "three digits" });
});

// Birch-Murnaghan with the parameters of Hemley et al. 1987, computed independently (SciPy).
test.each([
  [2.1, 1575],
  [10, 1875],
  [30, 2339],
  [44.3, 2576],
  [100, 3225],
  [128, 3471],
])("ice VII at 300 K and %s GPa has %s kg/m3", (pressure, density) => {
  expectClose(iceVIIState(pressure * 1e9, 300).density, density, { rel: 5e-4, because: "four digits given" });
});

test("ice VII at 10 K is within 1 % of ice VIII at low pressure", () => {
  // BM3, 12.03 cm3/mol, 30.8 GPa, 3.7: J. Chem. Phys. 156, 064504 (2022); Murnaghan's form differs by less than 1e-3 at 2.1 GPa.
  const density = (18.015268e-3 / 12.03e-6) * (1 + (3.7 * 2.1) / 30.8) ** (1 / 3.7);
  expectClose(iceVIIState(2.1e9, 10).density, density, {
    rel: 0.01,
    because: "expansivity below 300 K is an assumption",
  });
});
