import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { WarmStackPhase } from "../../../src/eos/thermal/warmStack.ts";
import { waterAdiabat, waterIsotherm } from "../../../src/eos/water/barotrope.ts";
import { fluidDensity } from "../../../src/eos/water/fluidDensity.ts";
import { fluidState } from "../../../src/eos/water/fluidState.ts";
import { iceIhState } from "../../../src/eos/water/iceIh.ts";
import { upperBoundary } from "../../../src/eos/water/phaseDiagram.ts";
import { isFluid, stableWater } from "../../../src/eos/water/waterPhases.ts";
import { expectClose } from "../../support/expectClose.ts";

const names = (phases: readonly WarmStackPhase[]) => phases.map((phase) => phase.name);
const named = (phases: readonly WarmStackPhase[], name: string) =>
  phases.find((phase) => phase.name === name) as WarmStackPhase;

/** Pressures spread over a phase, a little inside its ends. */
function pressuresIn({ curve }: WarmStackPhase, count = 40): number[] {
  const [low, high] = [Math.max(curve.minPressure, 1e3), curve.maxPressure];
  return Array.from({ length: count }, (_, i) => low * (high / low) ** ((i + 0.5) / count));
}

describe("isotherms", () => {
  test.each([
    [100, 0, ["ice-Ih", "ice-II", "ice-VI", "ice-VII"]],
    [245, 10, ["vapour", "ice-Ih", "ice-III", "ice-II", "ice-V", "ice-VI", "ice-VII"]],
    [253, 1e3, ["ice-Ih", "liquid", "ice-III", "ice-V", "ice-VI", "ice-VII"]],
    [300, 1e3, ["vapour", "liquid", "ice-VI", "ice-VII"]],
    [1200, 1e3, ["vapour", "supercritical", "ice-VII"]],
  ])("at %s K from %s Pa", (temperature, from, sequence) => {
    expect(names(waterIsotherm(temperature, from, 100e9))).toEqual(sequence);
  });

  test.each([100, 245, 300, 500, 650, 1200])(
    "at %s K the curve has the density of the state functions",
    (temperature) => {
      for (const phase of waterIsotherm(temperature, 1e3, 100e9)) {
        for (const pressure of pressuresIn(phase)) {
          const y = phase.curve.coordinate(pressure);
          const because = "the tail allowed to the polynomials is 1e-10";
          expectClose(phase.curve.density(y), stableWater(pressure, temperature).density, { rel: 1e-9, because });
          expectClose(phase.curve.temperature(y), temperature, { rel: 1e-13, because: "rounding of a series" });
        }
      }
    },
  );

  test("phases meet where the diagram has its boundaries", () => {
    for (const phase of waterIsotherm(300, 1e3, 100e9).slice(0, -1)) {
      const boundary = upperBoundary(phase.name as "liquid", 300)?.pressure(300) as number;
      expectClose(phase.untilPressure, boundary, { rel: 1e-9, because: "a stretch is followed 1e-10 past its end" });
    }
  });
});

describe("adiabats", () => {
  test("an ocean of 300 K has ice VII below; under a cold ice shell the ocean ends in ices V, VI and VII", () => {
    expect(names(waterAdiabat(1e5, 300, 100e9))).toEqual(["liquid", "ice-VII"]);
    expect(names(waterAdiabat(1e5, 275, 100e9))).toEqual(["liquid", "ice-VI", "ice-VII"]);
    expect(names(waterAdiabat(0, 253, 10e9))).toEqual(["ice-Ih", "liquid", "ice-V", "ice-VI", "ice-VII"]);
  });

  test.each([
    ["ocean", 1e5, 300],
    ["hot ocean", 1e7, 550],
    ["steam", 1e5, 450],
    ["near-critical", 3e7, 700],
  ])("entropy is constant in the fluid: %s", (_, pressure, temperature) => {
    for (const { name, curve } of waterAdiabat(pressure, temperature, 50e9)) {
      if (!isFluid(name as "liquid")) continue;
      const entropyAt = (p: number) => {
        const y = curve.coordinate(p);
        return fluidState(curve.density(y), curve.temperature(y)).entropy;
      };
      const start = fluidState(
        fluidDensity(pressure, temperature, name === "vapour" ? "vapour" : "dense"),
        temperature,
      ).entropy;
      for (const p of pressuresIn({ curve } as WarmStackPhase, 15)) {
        expect(Math.abs(entropyAt(p) - (name === "supercritical" ? entropyAt(curve.minPressure) : start))).toBeLessThan(
          1e-4,
        );
      }
    }
  });

  test("entropy is constant in ice Ih", () => {
    const { curve } = waterAdiabat(0, 260, 1e9)[0];
    const start = iceIhState(0, 260).entropy;
    for (const pressure of [1e6, 3e7, 1e8]) {
      const y = curve.coordinate(pressure);
      expect(Math.abs(iceIhState(pressure, curve.temperature(y)).entropy - start)).toBeLessThan(1e-7);
    }
  });

  test("temperature goes on through every boundary, density jumps up", () => {
    const phases = waterAdiabat(0, 253, 10e9);
    for (let i = 1; i < phases.length; i++) {
      const [above, below] = [phases[i - 1].curve, phases[i].curve];
      const [end, start] = [above.coordinate(above.maxPressure), below.coordinate(below.minPressure)];
      expect(below.minPressure).toBe(above.maxPressure);
      expectClose(below.temperature(start), above.temperature(end), {
        rel: 1e-12,
        because: "continuous by construction",
      });
      expect(below.density(start)).toBeGreaterThan(above.density(end));
    }
  });

  test("ice that would melt again follows its melting curve", () => {
    const melting = named(waterAdiabat(0, 248, 1e9), "ice-III at its melting point");
    for (const pressure of pressuresIn(melting, 10)) {
      const temperature = melting.curve.temperature(melting.curve.coordinate(pressure));
      expectClose(upperBoundary("liquid", temperature)?.pressure(temperature) as number, pressure, {
        rel: 1e-6,
        because: "the slope of the curve is a difference good to 1e-8",
      });
    }
  });

  test("from any start the phases follow each other without gaps, slivers or a fall in density", () => {
    const logs = fc.double({ min: 0, max: 10.5, noNaN: true });
    const property = fc.property(logs, fc.double({ min: 60, max: 1200, noNaN: true }), (exponent, temperature) => {
      const phases = waterAdiabat(10 ** exponent, temperature, 200e9);
      phases.forEach(({ curve, fromPressure, untilPressure }, i) => {
        expect(curve.maxPressure).toBeGreaterThan(curve.minPressure * (1 + 1e-7));
        expect(untilPressure).toBe(phases[i + 1]?.fromPressure ?? Number.POSITIVE_INFINITY);
        if (i === 0) return;
        const above = phases[i - 1].curve;
        const [before, after] = [above.density(above.invert(fromPressure)), curve.density(curve.invert(fromPressure))];
        expect(after).toBeGreaterThan(before * (1 - 1e-9));
      });
    });
    fc.assert(property, { seed: 21, numRuns: 40 });
  });

  test("fluid hotter than 1273 K counts as extrapolated from its top; steam ends at 5000 K", () => {
    const phases = waterAdiabat(1e5, 1000, 100e9);
    const last = phases[phases.length - 1];
    expect(phases[0].calibratedTo).toBe(phases[0].fromPressure);
    expect(last.untilPressure).toBe(Number.POSITIVE_INFINITY);
    expectClose(last.curve.temperature(last.curve.invert(last.curve.maxPressure)), 5000, {
      rel: 1e-8,
      because: "the limit",
    });
  });
});

describe("as equations of state", () => {
  const curves = [...waterAdiabat(1e5, 300, 100e9), ...waterIsotherm(500, 1e3, 100e9), ...waterAdiabat(0, 100, 1e11)];

  test.each(curves.map(({ name, curve }) => [name, curve] as const))("%s keeps the contract of a curve", (_, curve) => {
    const slopes = new Float64Array(4);
    const [low, high] = [Math.max(curve.minPressure * 1.001, 1e4), curve.maxPressure * 0.999];
    const pressures = fc.double({ min: Math.log(low), max: Math.log(high), noNaN: true }).map(Math.exp);
    const property = fc.property(pressures, (pressure) => {
      const y = curve.coordinate(pressure);
      expect(Math.abs(curve.pressure(y) - pressure)).toBeLessThan(1e-12 * Math.max(pressure, 2e10));
      expect(curve.invert(pressure)).toBe(y);
      const density = curve.density(y);
      expectClose(curve.density(curve.coordinateAtDensity(density)), density, { rel: 1e-12, because: "inverse" });
      curve.slopes(y, slopes);
      const h = 1e-5 * pressure;
      const difference =
        Math.log(curve.density(curve.invert(pressure + h)) / curve.density(curve.invert(pressure - h))) / (2 * h);
      const because = "a difference over a step of 1e-5, rounding 1e-16 over the change in ln density";
      expect([slopes[0], slopes[3]]).toEqual([1, 0]);
      expectClose(slopes[1], 1 / density, { rel: 1e-14, because });
      expect(Math.abs(slopes[2] - difference) * pressure, because).toBeLessThan(
        1e-7 * Math.max(slopes[2] * pressure, 1e-2),
      );
    });
    fc.assert(property, { seed: 3, numRuns: 60 });
    expect(() => curve.coordinate(curve.maxPressure * 1.01)).toThrow(
      expect.objectContaining({ code: "eos-pressure-range" }),
    );
    expect(() => curve.coordinateAtDensity(1e5)).toThrow(expect.objectContaining({ code: "eos-density-range" }));
    expect(curve.density(curve.invert(curve.maxPressure * 1.5))).toSatisfy(Number.isFinite);
  });
});

test.each([
  [() => waterAdiabat(0, 300, 1e9), "water-bare-surface"],
  [() => waterAdiabat(1e5, 20, 1e9), "water-temperature-range"],
  [() => waterAdiabat(1e9, 300, 1e5), "water-pressure-range"],
  [() => waterIsotherm(300, Number.NaN, 1e9), "water-pressure-range"],
  [() => waterIsotherm(300, 1e5, 1e15), "water-pressure-range"],
])("refuses with a reason %#", (call, code) => {
  expect(call).toThrow(expect.objectContaining({ code }));
});
