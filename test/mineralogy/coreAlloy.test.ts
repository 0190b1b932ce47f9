import { describe, expect, it } from "vitest";
import { alloyPhases, coreAlloyEos } from "../../src/mineralogy/coreAlloy.ts";
import { molarMass } from "../../src/mineralogy/formula.ts";
import { GPA } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { ironFei, liquidIron as liquid } from "../support/thermalSubstances.ts";

const none = { kind: "elements", nickel: 0, sulphur: 0, silicon: 0, oxygen: 0 } as const;
describe("coreAlloyEos", () => {
  it("is iron where nothing is added", () => {
    expect(coreAlloyEos(ironFei, none)).toBe(ironFei);
  });

  it("conserves elements in its compounds", () => {
    const fractions = alloyPhases({ ...none, nickel: 0.05, sulphur: 0.06, silicon: 0.04, oxygen: 0.02 });
    const exact = { rel: 1e-14, because: "mass balance" };
    expectClose((fractions.FeS * molarMass("S")) / molarMass("FeS"), 0.06, exact);
    expectClose((fractions.FeSi * molarMass("Si")) / molarMass("FeSi"), 0.04, exact);
    expectClose((fractions.FeO * molarMass("O")) / molarMass("FeO"), 0.02, exact);
    expectClose(
      Object.values(fractions).reduce((sum, value) => sum + value, 0),
      1,
      exact,
    );
  });

  it("lets volumes add", () => {
    const alloy = coreAlloyEos(ironFei, { ...none, nickel: 0.1 });
    const [mixed, pure] = [alloy.at(100 * GPA, 3000), ironFei.at(100 * GPA, 3000)];
    // Nickel at iron's volume per atom: 1/ρ falls by 10 % of 1 - 55.845/58.693.
    expectClose(pure.density / mixed.density, 0.9 + 0.1 * (55.845 / 58.693), { rel: 1e-13, because: "sum of volumes" });
    expectClose(mixed.bulkModulusS, pure.bulkModulusS, { rel: 1e-12, because: "same crystal" });
    expectClose(mixed.adiabaticGradient, pure.adiabaticGradient, { rel: 1e-12, because: "same crystal" });
  });

  it("needs more sulphur than chemistry allows, as known, for the density of the Martian core", () => {
    // 6.1 to 6.6 g/cm³ at about 25 GPa: Samuel et al. 2023, Khan et al. 2023, Nature 622 (from memory), who call for
    // carbon, oxygen and hydrogen besides some 15 % sulphur.
    const at = (sulphur: number): number =>
      coreAlloyEos(liquid, { ...none, nickel: 0.05, sulphur }).at(25 * GPA, 2100).density;
    expect(at(0.15)).toBeGreaterThan(6600);
    expect(at(0.3)).toBeGreaterThan(6100);
    expect(at(0.3)).toBeLessThan(6600);
  });

  it("takes a density deficit at face value", () => {
    const alloy = coreAlloyEos(liquid, { kind: "density-deficit", deficit: 0.076, derivedFromPrem: true });
    expectClose(alloy.at(200 * GPA, 4500).density, 0.924 * liquid.at(200 * GPA, 4500).density, {
      rel: 1e-14,
      because: "definition",
    });
  });

  it.each([
    { ...none, sulphur: -0.1 },
    { ...none, oxygen: Number.NaN },
    { ...none, sulphur: 0.4 },
    { kind: "density-deficit", deficit: 1, derivedFromPrem: false } as const,
  ])("refuses %o", (alloy) => {
    expect(() => coreAlloyEos(ironFei, alloy)).toThrow(expect.objectContaining({ code: "core-alloy" }));
  });
});
