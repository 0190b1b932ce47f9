import { describe, expect, it } from "vitest";
import { meltingCurves } from "../../../src/eos/melting/meltingCurves.ts";
import { meltingPressure, meltingTemperature } from "../../../src/eos/melting/meltingTemperature.ts";
import { boundaryPressure, mantleBoundaries } from "../../../src/eos/melting/phaseBoundaries.ts";
import { isentrope, isotherm } from "../../../src/eos/thermal/temperaturePaths.ts";
import type { ThermalEos } from "../../../src/eos/thermal/thermalState.ts";
import { type WarmPhase, warmStack } from "../../../src/eos/thermal/warmStack.ts";
import { GPA } from "../../../src/units/constants.ts";
import { expectClose } from "../../support/expectClose.ts";
import { bridgmanite, forsterite, ironFei, liquidIron as liquid } from "../../support/thermalSubstances.ts";

const phase = (name: string, eos: ThermalEos, stableFrom: WarmPhase["stableFrom"]): WarmPhase => ({
  name,
  form: "test",
  eos,
  stableFrom,
  calibratedTo: 100 * GPA,
  source: { citation: "invented stack for the test" },
});

// Equations of state do not matter here: forsterite stands in for its high-pressure forms.
const mantle = [
  phase("olivine", forsterite, () => 0),
  phase("wadsleyite", forsterite, (t) => boundaryPressure(mantleBoundaries.olivineToWadsleyite, t)),
  phase("ringwoodite", forsterite, (t) => boundaryPressure(mantleBoundaries.wadsleyiteToRingwoodite, t)),
  phase("bridgmanite", bridgmanite, (t) => boundaryPressure(mantleBoundaries.ringwooditeToBridgmanite, t)),
  phase("post-perovskite", bridgmanite, (t) => boundaryPressure(mantleBoundaries.bridgmaniteToPostPerovskite, t)),
];
const core = [
  phase("liquid", liquid, () => 0),
  phase("hcp", ironFei, (t) => meltingPressure(meltingCurves.ironAnzellini, t)),
];

describe("warmStack", () => {
  it("finds every boundary where its own line meets the adiabat, with continuous temperature", () => {
    const stack = warmStack(mantle, isentrope, 0, 1600);
    expect(stack.map(({ name }) => name)).toEqual(mantle.map(({ name }) => name));
    for (let i = 1; i < stack.length; i++) {
      const pressure = stack[i].fromPressure;
      expect(stack[i - 1].untilPressure).toBe(pressure);
      const [above, below] = [stack[i - 1].curve, stack[i].curve];
      const temperature = above.temperature(above.coordinate(pressure));
      expectClose(mantle[i].stableFrom(temperature), pressure, { rel: 1e-12, because: "root" });
      expectClose(below.temperature(below.coordinate(pressure)), temperature, { rel: 1e-12, because: "anchor" });
    }
    expect(stack[0].fromPressure).toBe(0);
    expect(stack.at(-1)?.untilPressure).toBe(Number.POSITIVE_INFINITY);
  });

  it("leaves out a phase that a hot mantle never enters", () => {
    // Above 2700 K wadsleyite decomposes before ringwoodite forms.
    const names = warmStack(mantle, (eos, p, t) => isotherm(eos, t, p), 0, 2800).map(({ name }) => name);
    expect(names).toEqual(["olivine", "wadsleyite", "bridgmanite", "post-perovskite"]);
  });

  it("starts in the phase stable at the top", () => {
    const stack = warmStack(mantle, isentrope, 30 * GPA, 2000);
    expect(stack.map(({ name }) => name)).toEqual(["bridgmanite", "post-perovskite"]);
  });

  it("grows an inner core where the adiabat crosses the melting curve", () => {
    const [outer, inner] = warmStack(core, isentrope, 135.8 * GPA, 4500);
    expect([outer.name, inner.name]).toEqual(["liquid", "hcp"]);
    const pressure = inner.fromPressure;
    const temperature = outer.curve.temperature(outer.curve.coordinate(pressure));
    expectClose(temperature, meltingTemperature(meltingCurves.ironAnzellini, pressure), {
      rel: 1e-10,
      because: "root",
    });
    expect(pressure).toBeGreaterThan(250 * GPA);
    expect(pressure).toBeLessThan(400 * GPA);
  });

  it("keeps a cold core solid and a hot one liquid to its centre", () => {
    expect(warmStack(core, isentrope, 135.8 * GPA, 2500).map(({ name }) => name)).toEqual(["hcp"]);
    const [outer] = warmStack(core, isentrope, 135.8 * GPA, 6000);
    expect(outer.name).toBe("liquid");
    expect(outer.untilPressure).toBeGreaterThan(500 * GPA);
  });
});
