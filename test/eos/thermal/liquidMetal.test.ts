import { describe, expect, it } from "vitest";
import { isentrope } from "../../../src/eos/thermal/temperaturePaths.ts";
import { GPA } from "../../../src/units/constants.ts";
import reference from "../../fixtures/thermal/liquid-iron.json" with { type: "json" };
import { expectClose } from "../../support/expectClose.ts";
import { liquidIron as liquid } from "../../support/thermalSubstances.ts";

describe("liquid iron", () => {
  it.each(reference)("follows its isentrope from 1811 K by quadrature: $density kg/m³", (row) => {
    const tolerance = { rel: 1e-12, because: "closed form against quadrature at 25 digits" };
    const state = liquid.at(row.pressure, row.temperature);
    expectClose(state.density, row.density, tolerance);
    expectClose(state.gruneisen, row.gamma, tolerance);
    expect(Math.abs(state.entropy)).toBeLessThan(1e-9);
    const curve = isentrope(liquid, 0, 1811);
    expectClose(curve.temperature(curve.coordinate(row.pressure)), row.temperature, {
      rel: 1e-10,
      because: "polynomial pieces",
    });
  });

  it.each([
    [135.75, 10.863],
    [330, 13.325],
    [1000, 17.798],
  ])("has the density of the fourth-order isentrope at %d GPa", (pressure, density) => {
    // Anderson & Ahrens 1994 parameters, density computed independently to five digits.
    const curve = isentrope(liquid, 0, 1811);
    expectClose(curve.density(curve.coordinate(pressure * GPA)) / 1000, density, { rel: 5e-5, because: "five digits" });
  });

  it("recovers the expansivity and heat capacity at one bar that its constant c_V rests on", () => {
    const state = liquid.at(1e5, 1811);
    expectClose(state.expansivity, 9.2e-5, { rel: 0.01, because: "Anderson & Ahrens 1994, from memory" });
    expectClose(state.heatCapacityP, 829, { rel: 0.01, because: "follows from the same" });
    expectClose(state.bulkModulusS, 109.7 * GPA, { rel: 1e-4, because: "1 bar above zero pressure" });
  });

  it("has the bulk modulus of its own density away from the isentrope", () => {
    const [pressure, temperature, dP] = [200 * GPA, 6000, 1e8];
    const density = (p: number): number => liquid.at(p, temperature).density;
    expectClose(
      liquid.at(pressure, temperature).bulkModulusT,
      (2 * dP) / Math.log(density(pressure + dP) / density(pressure - dP)),
      { rel: 1e-6, because: "central differences" },
    );
  });

  it("obeys Maxwell's relation away from the isentrope", () => {
    const [pressure, temperature, dP, dT] = [200 * GPA, 6000, 1e7, 0.5];
    const volume = (t: number): number => 1 / liquid.at(pressure, t).density;
    const entropy = (p: number): number => liquid.at(p, temperature).entropy;
    expectClose(
      (entropy(pressure + dP) - entropy(pressure - dP)) / (2 * dP),
      -(volume(temperature + dT) - volume(temperature - dT)) / (2 * dT),
      { rel: 1e-6, because: "central differences" },
    );
  });
});
