import { describe, expect, it } from "vitest";
import {
  altshulerGruneisen,
  finiteStrainGruneisen,
  type GruneisenLaw,
  powerLawGruneisen,
} from "../../../src/eos/thermal/gruneisenLaw.ts";
import { expectClose } from "../../support/expectClose.ts";

const laws: [string, GruneisenLaw, number][] = [
  ["finite strain", finiteStrainGruneisen(0.99282, 2.10672), 2.10672],
  ["power", powerLawGruneisen(1.74, 0.78), 0.78],
  ["power with q = 0", powerLawGruneisen(1.74, 0), 0],
  ["Al'tshuler", altshulerGruneisen(1.875, 1.305, 3.289), (3.289 * 0.57) / 1.875],
];

describe.each(laws)("Grüneisen law: %s", (_, law, qZero) => {
  it("starts at θ0 with q0", () => {
    const { debyeRatio, gamma, gammaSlope } = law.at(1);
    expect(debyeRatio).toBe(1);
    expectClose(gammaSlope / gamma + 1, qZero + 1, { rel: 1e-14, because: "closed form" });
  });

  it.each([1.05, 0.9, 0.7])("has γ = -d ln θ/d ln V and its slope as differences give them at V/V0 = %d", (x) => {
    const h = 1e-5;
    const [before, at, after] = [law.at(x * Math.exp(-h)), law.at(x), law.at(x * Math.exp(h))];
    const because = "central differences of step 1e-5";
    expectClose(at.gamma, -Math.log(after.debyeRatio / before.debyeRatio) / (2 * h), { rel: 1e-8, because });
    expectClose(1 + at.gammaSlope, 1 + (after.gamma - before.gamma) / (2 * h), { rel: 1e-8, because });
  });
});

describe("finiteStrainGruneisen", () => {
  it("ends where γ falls to zero", () => {
    const law = finiteStrainGruneisen(1.06023, 3.6466);
    expect(law.at(1.001 / law.maxCompression).gamma).toBeGreaterThan(0);
    expect(law.at(0.999 / law.maxCompression).gamma).toBeLessThan(0);
    expect(finiteStrainGruneisen(1.56508, 1.10945).maxCompression).toBe(Number.POSITIVE_INFINITY);
    expect(finiteStrainGruneisen(-0.00296, 1).maxCompression).toBe(Number.POSITIVE_INFINITY);
  });
});
