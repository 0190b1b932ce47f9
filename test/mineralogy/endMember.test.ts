import { describe, expect, it } from "vitest";
import { endMemberEos } from "../../src/mineralogy/endMember.ts";
import { endMembers } from "../../src/mineralogy/endMembers.ts";
import { molarMass } from "../../src/mineralogy/formula.ts";
import { GPA } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";

// Densities in g/cm³ at 300 K, computed independently from Table A1 of Stixrude & Lithgow-Bertelloni 2011.
const densities: [keyof typeof endMembers, number, number, number][] = [
  ["forsterite", 3.2267, 3.727, 4.634],
  ["mgWadsleyite", 3.4726, 3.897, 4.711],
  ["mgRingwoodite", 3.5625, 3.967, 4.767],
  ["periclase", 3.5845, 4.051, 4.984],
  ["mgBridgmanite", 4.1066, 4.466, 5.229],
  ["mgPostPerovskite", 4.111, 4.499, 5.321],
  ["wustite", 5.8581, 6.519, 7.741],
];

describe("endMembers", () => {
  it.each(densities)("%s has the density of the table at 0, 25 and 100 GPa", (name, ...expected) => {
    const eos = endMemberEos(endMembers[name]);
    expected.forEach((density, i) => {
      expectClose(eos.at([0, 25, 100][i] * GPA, 300).density / 1000, density, { rel: 2e-4, because: "four digits" });
    });
  });

  // Entropy of well-known minerals at 298.15 K, J/(mol K): CODATA key values for MgO, Al2O3 and quartz (Cox, Wagman &
  // Medvedev 1989, from memory). The Debye temperatures were fitted to such data at higher temperature.
  it.each([
    ["periclase", 26.95, 0.05, "one Debye temperature"],
    ["corundum", 50.92, 0.05, "one Debye temperature"],
    ["quartz", 41.46, 0.12, "soft vibrations of an open framework, which no Debye temperature describes"],
  ] as const)("%s has the calorimetric entropy", (name, entropy, rel, because) => {
    const member = endMembers[name];
    const { entropy: perKg } = endMemberEos(member).at(1e5, 298.15);
    expectClose(perKg * molarMass(member.formula), entropy, { rel, because });
  });

  it("all compress and warm like solids", () => {
    for (const member of Object.values(endMembers)) {
      const eos = endMemberEos(member);
      const [cold, warm] = [eos.at(10 * GPA, 300), eos.at(10 * GPA, 1000)];
      expect(warm.bulkModulusT, member.name).toBeGreaterThan(0);
      expect(warm.entropy, member.name).toBeGreaterThan(cold.entropy);
    }
  });
});
