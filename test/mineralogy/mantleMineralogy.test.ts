import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { atomCounts, molarMass } from "../../src/mineralogy/formula.ts";
import { type Assemblage, mantleMineralogy } from "../../src/mineralogy/mantleMineralogy.ts";
import { expectClose } from "../support/expectClose.ts";

/** Atoms per kilogram of an assemblage. */
function atoms({ minerals }: Assemblage): Record<string, number> {
  const sums: Record<string, number> = { Mg: 0, Fe: 0, Si: 0, O: 0 };
  for (const { endMember, massFraction } of minerals) {
    const moles = massFraction / molarMass(endMember.formula);
    for (const [symbol, count] of atomCounts(endMember.formula)) sums[symbol] += count * moles;
  }
  return sums;
}

const names = ({ minerals }: Assemblage) => minerals.map(({ endMember }) => endMember.name);

describe("mantleMineralogy", () => {
  it("conserves every element in every domain", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.05, max: 5, noNaN: true }),
        fc.double({ min: 0, max: 0.95, noNaN: true }),
        (mg, x) => {
          for (const assemblage of mantleMineralogy({ magnesiumToSilicon: mg, ironNumber: x })) {
            const { Mg, Fe, Si, O } = atoms(assemblage);
            const closed = { rel: 1e-12, because: "mass balance in closed form" };
            expectClose(Mg / Si, mg, closed);
            expectClose(1 + Fe / (Mg + Fe), 1 + x, closed);
            expectClose(O, Mg + Fe + 2 * Si, closed);
            expectClose(
              assemblage.minerals.reduce((sum, { massFraction }) => sum + massFraction, 0),
              1,
              closed,
            );
          }
        },
      ),
      { seed: 5, numRuns: 200 },
    );
  });

  it("holds free silica below (Mg + Fe)/Si = 1 and free periclase above 2", () => {
    const iron = 0.1;
    const at = (cations: number) => mantleMineralogy({ magnesiumToSilicon: cations * (1 - iron), ironNumber: iron });
    expect(names(at(0.8)[0])).toEqual(["enstatite", "ferrosilite (by analogy)", "coesite"]);
    expect(names(at(1.5)[0])).toEqual(["forsterite", "fayalite", "enstatite", "ferrosilite (by analogy)"]);
    expect(names(at(2.5)[0])).toEqual(["forsterite", "fayalite", "periclase", "wüstite"]);
    expect(names(at(0.8)[3])).toEqual(["Mg-bridgmanite", "Fe-bridgmanite", "stishovite"]);
    expect(names(at(1.5)[3])).toEqual(["Mg-bridgmanite", "Fe-bridgmanite", "periclase", "wüstite"]);
  });

  it("is pure at the whole-number compositions", () => {
    const pure = (magnesiumToSilicon: number) =>
      mantleMineralogy({ magnesiumToSilicon, ironNumber: 0 }).map((assemblage) => names(assemblage).join("+"));
    expect(pure(2)).toEqual([
      "forsterite",
      "Mg-wadsleyite",
      "Mg-ringwoodite",
      "Mg-bridgmanite+periclase",
      "Mg-post-perovskite+periclase",
    ]);
    expect(pure(1)).toEqual(["enstatite", "Mg-majorite", "Mg-majorite", "Mg-bridgmanite", "Mg-post-perovskite"]);
  });

  it.each([
    [0, 0.1],
    [Number.NaN, 0.1],
    [Number.POSITIVE_INFINITY, 0.1],
    [1, -0.1],
    [1, 1],
    [1, Number.NaN],
  ])("refuses Mg/Si = %d with iron number %d", (magnesiumToSilicon, ironNumber) => {
    expect(() => mantleMineralogy({ magnesiumToSilicon, ironNumber })).toThrow(
      expect.objectContaining({ code: "mantle-composition" }),
    );
  });
});
