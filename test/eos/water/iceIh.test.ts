import { expect, test } from "vitest";
import { fluidState } from "../../../src/eos/water/fluidState.ts";
import { iceIhState } from "../../../src/eos/water/iceIh.ts";
import { saturation } from "../../../src/eos/water/saturation.ts";
import { expectClose } from "../../support/expectClose.ts";

// IAPWS R10-06(2009), Table 6; the entries not in a stored copy are from memory.
test.each([
  [
    273.16,
    611.657,
    {
      gibbsEnergy: 0.611784135,
      enthalpy: -333444.253966,
      heatCapacity: 2096.78431622,
      density: 916.7094922,
      expansivity: 0.159863102566e-3,
    },
    [0.117793449348e-9, 0.114161597779e-9],
  ],
  [
    273.152519,
    101325,
    {
      gibbsEnergy: 101.34274069,
      enthalpy: -333354.873637,
      heatCapacity: 2096.71391024,
      density: 916.721463419,
      expansivity: 0.159841589458e-3,
    },
    [0.117785291765e-9, 0.114154442556e-9],
  ],
  [
    100,
    100e6,
    {
      gibbsEnergy: -222296.513088,
      entropy: -2611.95122589,
      enthalpy: -483491.635676,
      heatCapacity: 866.333195517,
      density: 941.678203297,
      expansivity: 0.258495528207e-4,
    },
    [0.886880048115e-10, 0.886060982687e-10],
  ],
] as const)("Table 6 at %s K, %s Pa", (temperature, pressure, properties, compressibilities) => {
  const state = iceIhState(pressure, temperature);
  const because = "the digits of the table, and 1e-5 J/kg in the small Gibbs energies";
  for (const [name, value] of Object.entries(properties)) {
    const rel = name === "gibbsEnergy" ? 1e-8 : 1e-11;
    expectClose(state[name as keyof typeof state], value, { rel, because });
  }
  expectClose(1 / state.isothermalBulkModulus, compressibilities[0], { rel: 1e-11, because });
  expectClose(1 / state.isentropicBulkModulus, compressibilities[1], { rel: 1e-11, because });
});

test("derivatives agree with differences of the Gibbs energy", () => {
  const [pressure, temperature] = [120e6, 220];
  const [dp, dt] = [1e5, 0.05];
  const gibbs = (p: number, t: number) => iceIhState(p, t).gibbsEnergy;
  const { density, entropy, heatCapacity, expansivity, isothermalBulkModulus } = iceIhState(pressure, temperature);
  const because = "second-order differences, rounding 1e-11 over the step";
  const volume = (gibbs(pressure + dp, temperature) - gibbs(pressure - dp, temperature)) / (2 * dp);
  expectClose(1 / density, volume, { rel: 1e-9, because });
  expectClose(entropy, -(gibbs(pressure, temperature + dt) - gibbs(pressure, temperature - dt)) / (2 * dt), {
    rel: 1e-6,
    because,
  });
  const at = (p: number, t: number) => iceIhState(p, t);
  const heating = (at(pressure, temperature + dt).entropy - at(pressure, temperature - dt).entropy) / (2 * dt);
  expectClose(heatCapacity, temperature * heating, { rel: 1e-7, because });
  const swelling = Math.log(at(pressure, temperature - dt).density / at(pressure, temperature + dt).density) / (2 * dt);
  expectClose(expansivity, swelling, { rel: 1e-6, because });
  const stiffness =
    Math.log(at(pressure + dp, temperature).density / at(pressure - dp, temperature).density) / (2 * dp);
  expectClose(isothermalBulkModulus, 1 / stiffness, { rel: 1e-7, because });
});

test("ice and IAPWS-95 liquid are in equilibrium at the triple point", () => {
  const { pressure, liquidDensity } = saturation(273.16);
  const liquid = fluidState(liquidDensity, 273.16);
  const gibbs = liquid.enthalpy - 273.16 * liquid.entropy;
  expect(Math.abs(iceIhState(pressure, 273.16).gibbsEnergy - gibbs)).toBeLessThan(1e-4);
});
