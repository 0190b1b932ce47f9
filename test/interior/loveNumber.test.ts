import { describe, expect, it } from "vitest";
import type { DensityTable } from "../../src/interior/densityTable.ts";
import { fluidLoveNumber } from "../../src/interior/loveNumber.ts";
import { expectClose } from "../support/expectClose.ts";
import { samplePrem } from "../support/samplePrem.ts";

/** Density of a polytrope out to its surface: θ'' = -θ^n - 2θ'/ξ by fourth-order steps from the series at the centre. */
function polytrope(n: number, stepsPerUnit: number): DensityTable {
  const h = 1 / stepsPerUnit;
  const radius = [0];
  const density = [1];
  const slope = (x: number, t: number, p: number): [number, number] => [
    p,
    -Math.sign(t) * Math.abs(t) ** n - (2 * p) / x,
  ];
  let [x, t, p] = [h, 1 - h ** 2 / 6 + (n * h ** 4) / 120, -h / 3 + (n * h ** 3) / 30];
  for (;;) {
    const [a1, b1] = slope(x, t, p);
    const [a2, b2] = slope(x + h / 2, t + (h / 2) * a1, p + (h / 2) * b1);
    const [a3, b3] = slope(x + h / 2, t + (h / 2) * a2, p + (h / 2) * b2);
    const [a4, b4] = slope(x + h, t + h * a3, p + h * b3);
    radius.push(x);
    density.push(t ** n);
    const surface = x - t / p;
    if (surface - x < h) {
      radius.push(surface);
      density.push(1e-12);
      return { radius, density };
    }
    t += (h / 6) * (a1 + 2 * a2 + 2 * a3 + a4);
    p += (h / 6) * (b1 + 2 * b2 + 2 * b3 + b4);
    x += h;
  }
}

describe("fluidLoveNumber", () => {
  it("is 3/2 for a uniform body", () => {
    expectClose(fluidLoveNumber({ radius: [0, 6e6], density: [5000, 5000] }), 1.5, { rel: 1e-13, because: "exact" });
  });

  it("is 15/π² - 1 for the polytrope n = 1", () => {
    expectClose(fluidLoveNumber(polytrope(1, 400)), 15 / Math.PI ** 2 - 1, {
      rel: 1e-5,
      because: "linear between rows",
    });
  });

  it.each([
    // Twice the apsidal constants of Brooker & Olle 1955, MNRAS 115, 101: 0.14327, 0.07394, 0.01444 (from memory).
    [1.5, 0.28656, 5e-5],
    [2, 0.14788, 1e-4],
    [3, 0.02888, 5e-4],
  ])("agrees with the published polytrope n = %d", (n, expected, rel) => {
    expectClose(fluidLoveNumber(polytrope(n, 400)), expected, { rel, because: "digits published" });
  });

  it("converges with the square of the row spacing", () => {
    const exact = 15 / Math.PI ** 2 - 1;
    const [coarse, fine] = [50, 100].map((steps) => Math.abs(fluidLoveNumber(polytrope(1, steps)) - exact));
    expect(Math.log2(coarse / fine)).toBeGreaterThan(1.8);
    expect(Math.log2(coarse / fine)).toBeLessThan(2.2);
  });

  it("is 0.933 for PREM", () => {
    // Independent integration of the Radau–Clairaut equation over the polynomials: 0.9331.
    expectClose(fluidLoveNumber(samplePrem(10)), 0.9331, { rel: 1e-4, because: "four digits" });
  });

  it("falls towards 0 as mass gathers in the centre", () => {
    const core = (share: number) => fluidLoveNumber({ radius: [0, share, share, 1], density: [1e6, 1e6, 1, 1] });
    expect(core(0.5)).toBeLessThan(0.06);
    expect(core(0.2)).toBeLessThan(core(0.5));
  });

  it("puts a jump where it is, between two rows or across a thin shell alike", () => {
    const sharp = fluidLoveNumber({ radius: [0, 0.5, 0.5, 1], density: [10, 10, 4, 4] });
    const thin = fluidLoveNumber({ radius: [0, 0.5, 0.5 + 1e-7, 1], density: [10, 10, 4, 4] });
    expectClose(thin, sharp, { rel: 1e-6, because: "a shell of 1e-7 of the radius" });
  });
});
