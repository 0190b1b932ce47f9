import { describe, expect, it } from "vitest";
import { mixCurves } from "../../../src/eos/mixCurves.ts";
import { isotherm } from "../../../src/eos/thermal/temperaturePaths.ts";
import { thermalMixture } from "../../../src/eos/thermal/thermalMixture.ts";
import { GPA } from "../../../src/units/constants.ts";
import { expectClose } from "../../support/expectClose.ts";
import { bridgmanite, forsterite, ironFei } from "../../support/thermalSubstances.ts";

const parts = [
  { eos: bridgmanite, massFraction: 0.5 },
  { eos: forsterite, massFraction: 0.3 },
  { eos: ironFei, massFraction: 0.2 },
];
const mixture = thermalMixture(parts);
const [pressure, temperature] = [60 * GPA, 2500];

describe("thermalMixture", () => {
  it("adds volumes and entropies", () => {
    const states = parts.map(({ eos }) => eos.at(pressure, temperature));
    const sum = (f: (i: number) => number): number =>
      parts.reduce((total, part, i) => total + part.massFraction * f(i), 0);
    const state = mixture.at(pressure, temperature);
    const exact = { rel: 1e-14, because: "sums" };
    expectClose(
      1 / state.density,
      sum((i) => 1 / states[i].density),
      exact,
    );
    expectClose(
      state.entropy,
      sum((i) => states[i].entropy),
      exact,
    );
  });

  it("has derivatives that agree with differences of those sums", () => {
    const [dP, dT] = [1e-4 * pressure, 1e-4 * temperature];
    const state = mixture.at(pressure, temperature);
    const [hot, cold] = [mixture.at(pressure, temperature + dT), mixture.at(pressure, temperature - dT)];
    const [high, low] = [mixture.at(pressure + dP, temperature), mixture.at(pressure - dP, temperature)];
    const difference = { rel: 1e-6, because: "central differences of relative step 1e-4" };
    expectClose(state.expansivity, Math.log(cold.density / hot.density) / (2 * dT), difference);
    expectClose(state.bulkModulusT, (2 * dP) / Math.log(high.density / low.density), difference);
    expectClose(state.heatCapacityP, (temperature * (hot.entropy - cold.entropy)) / (2 * dT), difference);
    // dT/dP at constant entropy.
    const gradient = -((high.entropy - low.entropy) / dP) / ((hot.entropy - cold.entropy) / dT);
    expectClose(state.adiabaticGradient, gradient, difference);
    expectClose(state.adiabaticGradient, (state.gruneisen * temperature) / state.bulkModulusS, {
      rel: 1e-13,
      because: "identity",
    });
    expectClose(state.bulkModulusS / state.bulkModulusT, state.heatCapacityP / state.heatCapacityV, {
      rel: 1e-13,
      because: "identity",
    });
  });

  it("of a phase with itself is that phase", () => {
    const halves = thermalMixture([
      { eos: ironFei, massFraction: 0.5 },
      { eos: ironFei, massFraction: 0.5 },
    ]);
    expect(halves.members).toHaveLength(1);
    const [sum, phase] = [halves.at(pressure, temperature), ironFei.at(pressure, temperature)];
    for (const key of Object.keys(phase) as (keyof typeof phase)[]) {
      expectClose(sum[key], phase[key], { rel: 1e-13, because: `identity of ${key}` });
    }
  });

  it("is the cold mixture of its cold curves at 300 K", () => {
    const rocks = parts.slice(0, 2).map(({ eos }, i) => ({ eos, massFraction: [0.6, 0.4][i] }));
    const warm = isotherm(thermalMixture(rocks), 300);
    const cold = mixCurves(rocks.map(({ eos, massFraction }) => ({ curve: eos.reference, massFraction })));
    for (const gpa of [0, 0.1, 5, 30, 130, 400]) {
      const pressure = gpa * GPA;
      expectClose(warm.density(warm.coordinate(pressure)), cold.density(cold.coordinate(pressure)), {
        rel: 1e-10,
        because: "polynomial pieces",
      });
    }
  });

  it("reaches as far as the first of its parts to break", () => {
    expect(mixture.maxPressure).toBe(Math.min(...parts.map(({ eos }) => eos.maxPressure)));
  });
});
