import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { triplePoints, waterBoundaries } from "../../../src/eos/water/phaseBoundaries.ts";
import { upperBoundary, waterPhase } from "../../../src/eos/water/phaseDiagram.ts";
import { stableWater } from "../../../src/eos/water/waterPhases.ts";
import { expectClose } from "../../support/expectClose.ts";

// States known from daily life and from the fields in published phase diagrams.
test.each([
  [1e5, 300, "liquid"],
  [1e5, 263, "ice-Ih"],
  [1e5, 400, "vapour"],
  [1e3, 300, "vapour"],
  [30e6, 700, "supercritical"],
  [1e9, 1273, "supercritical"],
  [100e6, 268, "liquid"],
  [250e6, 250, "ice-III"],
  [300e6, 220, "ice-II"],
  [500e6, 255, "ice-V"],
  [1e9, 280, "ice-VI"],
  [1e9, 300.5, "liquid"],
  [10e9, 300, "ice-VII"],
  [100e9, 1000, "ice-VII"],
  [100e9, 3000, "supercritical"],
  [0, 100, "vapour"],
])("at %s Pa and %s K water is %s", (pressure, temperature, phase) => {
  expect(waterPhase(pressure, temperature)).toBe(phase);
});

describe("boundaries", () => {
  test.each(Object.entries(triplePoints))("at %s every boundary that ends there has the same pressure", (_, point) => {
    const meeting = waterBoundaries.filter((b) => [b.coldest, b.warmest].includes(point.temperature));
    expect(meeting.length).toBeGreaterThanOrEqual(2);
    for (const boundary of meeting) {
      const because = "R14-08 gives its triple points to six digits; IAPWS-95 boils at 611.6548 Pa";
      expectClose(boundary.pressure(point.temperature), point.pressure, { rel: 5e-6, because });
    }
  });

  test("the melting curve goes on at 715 K, where R14-08 ends", () => {
    const at = (temperature: number) =>
      upperBoundary("supercritical", temperature)?.pressure(temperature) ?? Number.NaN;
    expectClose(at(715), 20.6178128e9, { rel: 1e-8, because: "digits given" });
    expectClose(at(715.001), at(715), { rel: 1e-5, because: "a step of 1 mK" });
    for (let T = 700; T < 1500; T += 1) expect(at(T + 1)).toBeGreaterThan(at(T));
  });

  test("at every temperature the phases form a chain of rising pressure and density that ends in ice VII", () => {
    fc.assert(
      fc.property(fc.double({ min: 50, max: 1500, noNaN: true }), (temperature) => {
        let phase = waterPhase(0, temperature);
        let last = 0;
        for (let b = upperBoundary(phase, temperature); b !== undefined; b = upperBoundary(phase, temperature)) {
          const pressure = b.pressure(temperature);
          expect(pressure).toBeGreaterThan(last);
          [phase, last] = [b.above, pressure];
        }
        expect(phase).toBe("ice-VII");
      }),
      { seed: 14, numRuns: 500 },
    );
  });
});

test("density grows with pressure at every temperature, through every transition", () => {
  const logs = fc.double({ min: 3, max: 11, noNaN: true });
  fc.assert(
    fc.property(logs, logs, fc.double({ min: 100, max: 1273, noNaN: true }), (a, b, temperature) => {
      fc.pre(Math.abs(a - b) > 1e-6);
      const [low, high] = [Math.min(a, b), Math.max(a, b)].map((x) => stableWater(10 ** x, temperature).density);
      expect(high).toBeGreaterThan(low);
    }),
    { seed: 8, numRuns: 400 },
  );
});

test.each([
  [1e5, 20, "water-temperature-range"],
  [1e5, 6000, "water-temperature-range"],
  [1e5, Number.NaN, "water-temperature-range"],
  [-1, 300, "water-pressure-range"],
  [Number.NaN, 300, "water-pressure-range"],
  [Number.POSITIVE_INFINITY, 300, "water-pressure-range"],
  [200e9, 4000, "water-fluid-range"],
])("refuses %s Pa, %s K", (pressure, temperature, code) => {
  expect(() => stableWater(pressure, temperature)).toThrow(expect.objectContaining({ code }));
});
