import { describe, expect, it } from "vitest";
import { integrateDensityTable } from "../../src/interior/densityTable.ts";
import { G, GPA } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { prem, samplePrem } from "../support/samplePrem.ts";

describe("PREM", () => {
  const profile = integrateDensityTable(samplePrem(10));
  const { computed } = prem;
  const sampled = { rel: 1e-4, because: "promised for a fine sampling of the polynomials" };

  it("has the computed mass, moment of inertia and pressures", () => {
    expectClose(profile.mass, computed.massKg, sampled);
    expectClose(profile.inertiaFactor, computed.inertiaFactor, sampled);
    for (const [km, pressure] of Object.entries(computed.pressureGPa as Record<string, number>)) {
      const point = profile.points.find(({ radius }) => radius === Number(km) * 1e3);
      expectClose((point?.pressure ?? 0) / GPA, pressure, sampled);
    }
    for (const [km, gravity] of Object.entries(computed.gravity as Record<string, number>)) {
      const point = profile.points.find(({ radius }) => radius === Number(km) * 1e3);
      expectClose(point?.gravity ?? 0, gravity, sampled);
    }
    expect(profile.centralPressure).toBe(profile.points[0].pressure);
  });

  it("begins a new layer at every jump", () => {
    expect(profile.points.at(-1)?.layer).toBe(String(prem.layers.length));
  });
});

describe("a linear density", () => {
  it("gives the closed-form mass and central pressure", () => {
    // ρ = a (1 - r/R): M = π a R³/3, P_c = (5/36) π G a² R² (elementary integration).
    const [a, R] = [9000, 6e6];
    const { mass, centralPressure } = integrateDensityTable({ radius: [0, R / 3, R], density: [a, (2 / 3) * a, 1e-9] });
    expectClose(mass, (Math.PI * a * R ** 3) / 3, { rel: 1e-12, because: "exact up to round-off" });
    expectClose(centralPressure, (5 / 36) * Math.PI * G * a * a * R * R, { rel: 1e-12, because: "exact" });
  });

  it("adds the surface pressure", () => {
    const table = { radius: [0, 1e6], density: [3000, 3000] };
    const rise = integrateDensityTable(table, 1e9).centralPressure - integrateDensityTable(table).centralPressure;
    expectClose(rise, 1e9, { rel: 1e-12, because: "pressures add" });
  });
});

describe("bad tables", () => {
  it.each([
    ["density-table-radius", [0], [3000]],
    ["density-table-radius", [10, 20], [3000, 3000]],
    ["density-table-radius", [0, 20, 10], [3000, 3000, 3000]],
    ["density-table-radius", [0, 10, 10, 10, 20], [1, 1, 1, 1, 1]],
    ["density-table-radius", [0, Number.NaN], [1, 1]],
    ["density-table-density", [0, 10], [3000, 0]],
    ["density-table-density", [0, 10], [Number.NaN, 3000]],
  ])("are refused as %s: %j %j", (code, radius, density) => {
    expect(() => integrateDensityTable({ radius, density })).toThrow(expect.objectContaining({ code }));
  });
});
