import { expect, test } from "vitest";
import { fluidState } from "../../../src/eos/water/fluidState.ts";
import { saturation } from "../../../src/eos/water/saturation.ts";
import { ModelRangeError } from "../../../src/errors.ts";
import { expectClose } from "../../support/expectClose.ts";

// IAPWS R6-95(2018), Table 8 (from memory): p [MPa], densities [kg/m3], h [kJ/kg], s [kJ/kg/K], liquid then vapour.
test.each([
  {
    T: 275,
    p: 0.698451167e-3,
    density: [999.887406, 0.550664919e-2],
    h: [7.759722, 2504.28995],
    s: [0.028309467, 9.10660121],
  },
  { T: 450, p: 0.932203564, density: [890.34125, 4.8120036], h: [749.161585, 2774.41078], s: [2.10865845, 6.60921221] },
  { T: 625, p: 16.9082693, density: [567.090385, 118.29028], h: [1686.26976, 2550.71625], s: [3.80194683, 5.18506121] },
])("Table 8 at $T K", ({ T, p, density, h, s }) => {
  const found = saturation(T);
  const because = "half a unit in the ninth digit, or in the seventh for h at 275 K";
  expectClose(found.pressure / 1e6, p, { rel: 5e-9, because });
  [found.liquidDensity, found.vapourDensity].forEach((value, i) => {
    expectClose(value, density[i], { rel: 5e-9, because });
    const state = fluidState(value, T);
    expectClose(state.enthalpy / 1e3, h[i], { rel: 1e-7, because });
    expectClose(state.entropy / 1e3, s[i], { rel: 5e-9, because });
  });
});

test("both phases have one pressure and one Gibbs energy, up to 6 mK below the critical point", () => {
  for (const temperature of [260, 300, 500, 640, 646.9, 647.09]) {
    const { liquidDensity, vapourDensity, pressure } = saturation(temperature);
    const [liquid, vapour] = [fluidState(liquidDensity, temperature), fluidState(vapourDensity, temperature)];
    const gibbs = [liquid, vapour].map((state) => state.enthalpy - temperature * state.entropy);
    expect(Math.abs(gibbs[0] - gibbs[1])).toBeLessThan(1e-6);
    // Densities hold to 1e-13, which in the stiff cold liquid is 2e-4 Pa.
    expect(Math.abs(liquid.pressure - pressure)).toBeLessThan(1e-3 + 1e-11 * pressure);
    expect(liquidDensity).toBeGreaterThan(vapourDensity);
  }
});

test("the balance is found at every temperature", () => {
  for (let i = 0; i <= 1000; i++)
    expect(saturation(248.15 + (i / 1000) * (647.096 - 248.15)).pressure).toBeGreaterThan(0);
});

test.each([240, 647.1, Number.NaN])("no equilibrium at %s K", (temperature) => {
  expect(() => saturation(temperature)).toThrow(ModelRangeError);
});
