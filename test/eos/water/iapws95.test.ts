import { expect, test } from "vitest";
import { type HelmholtzDerivatives, idealHelmholtz, residualHelmholtz } from "../../../src/eos/water/iapws95.ts";

const delta = (density: number) => density / 322;
const tau = (temperature: number) => 647.096 / temperature;
const digits = (d: HelmholtzDerivatives) =>
  [d.phi, d.delta, d.deltaDelta, d.tau, d.tauTau, d.deltaTau].map((v) => v.toPrecision(9));
const nine = (...values: number[]) => values.map((v) => v.toPrecision(9));

// IAPWS R6-95(2018), Table 6 (from memory), all nine digits; order phi, delta, delta delta, tau, tau tau, delta tau.
test.each([
  {
    at: [838.025, 500],
    ideal: [2.04797733, 0.384236747, -0.147637878, 9.04611106, -1.93249185, 0],
    residual: [-3.42693206, -0.36436665, 0.856063701, -5.81403435, -2.23440737, -1.12176915],
  },
  {
    at: [358, 647],
    ideal: [-1.56319605, 0.899441341, -0.808994726, 9.80343918, -3.43316334, 0],
    residual: [-1.21202657, -0.714012024, 0.475730696, -3.21722501, -9.96029507, -1.3321472],
  },
])("the Helmholtz energy and its derivatives at %o", ({ at: [density, temperature], ideal, residual }) => {
  expect(digits(idealHelmholtz(delta(density), tau(temperature)))).toEqual(nine(...ideal));
  expect(digits(residualHelmholtz(delta(density), tau(temperature)))).toEqual(nine(...residual));
});

test("on the critical isochore no power of zero appears", () => {
  for (const value of Object.values(residualHelmholtz(1, tau(660)))) expect(value).toSatisfy(Number.isFinite);
});
