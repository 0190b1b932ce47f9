import { describe, expect, it } from "vitest";
import { finiteStrainGruneisen } from "../../../src/eos/thermal/gruneisenLaw.ts";
import type { IsothermBasedEos } from "../../../src/eos/thermal/isothermBasedEos.ts";
import { GPA } from "../../../src/units/constants.ts";
import reference from "../../fixtures/thermal/thermal-reference.json" with { type: "json" };
import { expectClose } from "../../support/expectClose.ts";
import { bridgmanite, forsterite, ironDewaele, ironFei } from "../../support/thermalSubstances.ts";

const substances = { forsterite, bridgmanite, "iron-fei": ironFei, "iron-dewaele": ironDewaele };
const substance = (name: string): IsothermBasedEos => substances[name as keyof typeof substances];

describe("IsothermBasedEos", () => {
  it.each(reference.states)(
    "agrees with derivatives of the energy: $substance, $density kg/m³, $temperature K",
    (row) => {
      const { substance: name, temperature, pressure } = row;
      if (pressure < 0) return;
      const state = substance(name).at(pressure, temperature);
      const exact = { rel: 1e-12, because: "closed forms against differentiation at 25 digits" };
      expectClose(state.density, row.density, exact);
      expectClose(state.entropy, row.entropy, exact);
      expectClose(state.heatCapacityV, row.heatCapacityV, exact);
      expectClose(state.heatCapacityP, row.heatCapacityP, exact);
      expectClose(state.bulkModulusT, row.bulkModulusT, exact);
      expectClose(state.bulkModulusS, row.bulkModulusS, exact);
      expectClose(state.expansivity, row.expansivity, exact);
      expectClose(state.adiabaticGradient, row.adiabaticGradient, exact);
    },
  );

  it.each(Object.entries(substances))("obeys the Maxwell relations in pressure and temperature: %s", (_, eos) => {
    const [pressure, temperature] = [120 * GPA, 3500];
    const [dP, dT] = [1e-4 * pressure, 1e-4 * temperature];
    const at = eos.at(pressure, temperature);
    const warmer = eos.at(pressure, temperature + dT);
    const colder = eos.at(pressure, temperature - dT);
    const higher = eos.at(pressure + dP, temperature);
    const lower = eos.at(pressure - dP, temperature);
    const difference = { rel: 1e-6, because: "central differences of relative step 1e-4" };
    // ∂S/∂P at constant T = -∂V/∂T at constant P.
    const volumeSlope = (1 / warmer.density - 1 / colder.density) / (2 * dT);
    expectClose((higher.entropy - lower.entropy) / (2 * dP), -volumeSlope, difference);
    expectClose(at.expansivity, volumeSlope * at.density, difference);
    expectClose(at.heatCapacityP, (temperature * (warmer.entropy - colder.entropy)) / (2 * dT), difference);
    expectClose(at.bulkModulusT, (at.density * 2 * dP) / (higher.density - lower.density), difference);
    expectClose(at.bulkModulusS / at.bulkModulusT, at.heatCapacityP / at.heatCapacityV, {
      rel: 1e-13,
      because: "exact",
    });
  });

  it("is the cold curve at the reference temperature", () => {
    for (const pressure of [0, 20 * GPA, 300 * GPA]) {
      const cold = bridgmanite.reference;
      expectClose(bridgmanite.at(pressure, 300).density, cold.density(cold.coordinate(pressure)), {
        rel: 1e-14,
        because: "thermal parts cancel exactly",
      });
    }
  });

  it("gives the heat capacity that calorimetry finds, as far as one Debye temperature can", () => {
    // Forsterite at 298.15 K: c_P = 118.6 J/(mol K), Robie & Hemingway 1995, USGS Bull. 2131 (from memory).
    expectClose(forsterite.at(1e5, 298.15).heatCapacityP * 0.140691, 118.6, {
      rel: 0.06,
      because: "one Debye temperature cannot fit all vibrations of a silicate",
    });
  });

  it("ends where heating would contract it, at the cold pressure there", () => {
    const { maxCompression } = finiteStrainGruneisen(0.99282, 2.10672);
    const cold = forsterite.reference;
    const limit = cold.pressure(cold.coordinateAtDensity(cold.density(1) * maxCompression));
    expectClose(forsterite.maxPressure, limit, { rel: 1e-12, because: "same point" });
    expect(bridgmanite.maxPressure).toBe(Number.POSITIVE_INFINITY);
  });

  it("refuses states that do not exist", () => {
    expect(() => forsterite.at(0, 9000)).toThrow(expect.objectContaining({ code: "thermal-unstable" }));
    expect(() => forsterite.at(GPA, 0)).toThrow(expect.objectContaining({ code: "temperature-range" }));
    expect(() => forsterite.at(GPA, Number.NaN)).toThrow(expect.objectContaining({ code: "temperature-range" }));
    expect(() => forsterite.at(forsterite.maxPressure * 1.01, 300)).toThrow(
      expect.objectContaining({ code: "eos-pressure-range" }),
    );
  });
});
