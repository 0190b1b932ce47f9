import { describe, expect, it } from "vitest";
import type { EosCurve } from "../../../src/eos/curve.ts";
import { alongTemperature, isentrope, isotherm } from "../../../src/eos/thermal/temperaturePaths.ts";
import { thermalMixture } from "../../../src/eos/thermal/thermalMixture.ts";
import type { ThermalEos } from "../../../src/eos/thermal/thermalState.ts";
import type { WarmCurve } from "../../../src/eos/thermal/warmCurve.ts";
import { GPA } from "../../../src/units/constants.ts";
import { expectClose } from "../../support/expectClose.ts";
import { bridgmanite, forsterite, ironDewaele, ironFei } from "../../support/thermalSubstances.ts";

const rock = thermalMixture([
  { eos: bridgmanite, massFraction: 0.7 },
  { eos: forsterite, massFraction: 0.3 },
]);

const pressures = [0, 1e5, 0.3, 1, 5, 14, 24, 57, 110, 135, 250].map((p) => (p > 1e4 ? p : p * GPA));

const paths: [string, ThermalEos, number, number, number[]][] = [
  ["forsterite", forsterite, 0, 1600, pressures.filter((p) => p < 30 * GPA)],
  ["hot forsterite", forsterite, 0, 2600, pressures.filter((p) => p < 30 * GPA)],
  ["bridgmanite", bridgmanite, 23.5 * GPA, 1900, pressures],
  ["a mixture", rock, 23.5 * GPA, 1900, pressures],
  ["iron with electrons", ironFei, 135 * GPA, 4000, [...pressures, 400 * GPA, 2000 * GPA]],
  ["iron with anharmonicity", ironDewaele, 135 * GPA, 6000, [...pressures, 400 * GPA]],
];

describe.each(paths)("isentrope of %s", (_, eos, anchorPressure, anchorTemperature, sampled) => {
  const curve = isentrope(eos, anchorPressure, anchorTemperature);

  it("keeps the entropy, and the density of that temperature, to the stated error", () => {
    const { entropy } = eos.at(anchorPressure, anchorTemperature);
    for (const pressure of sampled.filter((p) => p >= curve.minPressure)) {
      const y = curve.coordinate(pressure);
      const state = eos.at(pressure, curve.temperature(y));
      const because = "pieces halved until their last coefficients are below 1e-9";
      expectClose(state.entropy, entropy, { rel: 1e-10, because });
      expectClose(curve.density(y), state.density, { rel: 1e-10, because });
      expect(Math.abs(curve.pressure(y) - pressure)).toBeLessThan(1e-14 * Math.max(pressure, state.bulkModulusT));
    }
  });

  it("has the adiabatic bulk modulus and temperature gradient as its slopes", () => {
    const slopes = new Float64Array(4);
    for (const pressure of sampled.filter((p) => p >= curve.minPressure)) {
      const y = curve.coordinate(pressure);
      const state = eos.at(pressure, curve.temperature(y));
      curve.slopes(y, slopes);
      expectClose(slopes[0] / slopes[2], state.bulkModulusS, { rel: 5e-9, because: "slope of the pieces" });
      const h = 1e-5;
      const warming = (curve.temperature(y + h) - curve.temperature(y - h)) / (2 * h * slopes[0]);
      expectClose(warming, state.adiabaticGradient, { rel: 1e-6, because: "differences of step 1e-5" });
    }
  });

  it("keeps the contract of a curve", () => expectConsistentCurve(curve, sampled));
});

function expectConsistentCurve(curve: EosCurve, sampled: number[]): void {
  const slopes = new Float64Array(4);
  const [before, after] = [new Float64Array(4), new Float64Array(4)];
  for (const pressure of sampled.filter((p) => p >= curve.minPressure)) {
    const y = curve.coordinate(pressure);
    const h = 1e-6;
    curve.slopes(y, slopes);
    curve.slopes(y - h, before);
    curve.slopes(y + h, after);
    const because = "central differences of step 1e-6";
    expectClose(slopes[0], (curve.pressure(y + h) - curve.pressure(y - h)) / (2 * h), { rel: 1e-7, because });
    expectClose(slopes[1], slopes[0] / curve.density(y), { rel: 1e-12, because: "exact" });
    expectClose(slopes[2], Math.log(curve.density(y + h) / curve.density(y - h)) / (2 * h), { rel: 1e-7, because });
    expectClose(slopes[3], Math.log(after[0] / before[0]) / (2 * h), { rel: 1e-7, because });
    expectClose(curve.coordinateAtDensity(curve.density(y)), y, { rel: 1e-12, because: "inverse" });
  }
}

describe("isentrope of a Debye solid", () => {
  it("keeps T/θ constant, in closed form", () => {
    const curve = isentrope(bridgmanite, 23.5 * GPA, 1900);
    const law = (density: number): number => {
      const strain = ((density / 4106.6) ** (2 / 3) - 1) / 2;
      const a1 = 6 * 1.56508;
      const a2 = -12 * 1.56508 + 36 * 1.56508 ** 2 - 18 * 1.10945 * 1.56508;
      return Math.sqrt(1 + a1 * strain + (a2 / 2) * strain ** 2);
    };
    const [top, bottom] = [23.5 * GPA, 135 * GPA].map((pressure) => curve.coordinate(pressure));
    expectClose(curve.temperature(bottom) / 1900, law(curve.density(bottom)) / law(curve.density(top)), {
      rel: 1e-5,
      because: "zero-pressure density rounded to five digits here",
    });
  });

  it("begins at its anchor where the phase cannot be decompressed", () => {
    const hot: WarmCurve = isentrope(forsterite, 120 * GPA, 12_000);
    expect(hot.minPressure).toBe(120 * GPA);
    expect(() => hot.coordinate(100 * GPA)).toThrow(expect.objectContaining({ code: "eos-pressure-range" }));
    expect(hot.temperature(hot.coordinate(120 * GPA))).toBeCloseTo(12_000, 6);
  });
});

describe("isotherm", () => {
  it("is the cold curve at the reference temperature, to the last digit", () => {
    const curve = isotherm(bridgmanite, 300);
    const cold = bridgmanite.reference;
    for (const pressure of pressures) {
      expect(curve.density(curve.coordinate(pressure))).toBe(cold.density(cold.coordinate(pressure)));
    }
    expect(curve.temperature(1.1)).toBe(300);
  });

  it("joins the cold curve smoothly next to the reference temperature", () => {
    const curve = isotherm(bridgmanite, 300 + 1e-9);
    const cold = bridgmanite.reference;
    for (const pressure of pressures) {
      expectClose(curve.density(curve.coordinate(pressure)), cold.density(cold.coordinate(pressure)), {
        rel: 1e-11,
        because: "polynomial pieces",
      });
    }
  });

  it("keeps the contract of a curve", () => expectConsistentCurve(isotherm(ironFei, 2000), pressures));
});

describe("alongTemperature", () => {
  it("follows a table with kinks", () => {
    const rows = [0, 10 * GPA, 40 * GPA];
    const temperatureAt = (p: number): number =>
      p < rows[1] ? 300 + 80e-9 * p : 1100 + 10e-9 * (Math.min(p, rows[2]) - rows[1]);
    const curve = alongTemperature(bridgmanite, temperatureAt, { kinks: rows });
    const besideKinks = [9.99, 9.99999, 10, 10.00001, 10.01, 39.999, 40.001].map((gpa) => gpa * GPA);
    for (const pressure of [...pressures, ...besideKinks]) {
      const y = curve.coordinate(pressure);
      expectClose(curve.temperature(y), temperatureAt(pressure), { rel: 1e-9, because: "pieces end at the kinks" });
      expectClose(curve.density(y), bridgmanite.at(pressure, temperatureAt(pressure)).density, {
        rel: 1e-9,
        because: "hardest case: 80 K/GPa from 300 K, where vibrations freeze out",
      });
    }
    expectConsistentCurve(
      curve,
      pressures.filter((pressure) => pressure > 0),
    );
  });
});
