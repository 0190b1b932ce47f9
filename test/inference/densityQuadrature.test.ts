import { describe, expect, test } from "vitest";
import { densityQuadrature, FINE, logIntegral } from "../../src/inference/densityQuadrature.ts";
import { normalBelow } from "../../src/inference/normal.ts";
import { gaussLegendre } from "../../src/numerics/gaussLegendre.ts";
import { expectClose } from "../support/expectClose.ts";

const normal = (mean: number, error: number) => (x: number) => -0.5 * ((x - mean) / error) ** 2;

describe("densityQuadrature of a normal density cut off at 0 and 1", () => {
  test.each([
    [0.3, 0.1],
    [0.3, 0.001],
    [0.3123, 1e-6],
    [0.5, 10],
    [0.999, 0.02],
    [-0.05, 0.02],
  ])("mean %d, error %d", (mean, error) => {
    const density = densityQuadrature(normal(mean, error), [0, 1]);
    const share = (x: number) => normalBelow((x - mean) / error) - normalBelow(-mean / error);
    const whole = share(1);
    expectClose(Math.exp(density.logIntegral), whole * error * Math.sqrt(2 * Math.PI), {
      rel: 1e-7,
      because: "parts below 1e-9 of the peak are left out",
    });
    for (const p of [0.025, 0.16, 0.5, 0.84, 0.975]) {
      expectClose(share(density.quantile(p)) / whole, p, { rel: 1e-6, because: "interpolation of the log-density" });
    }
    expectClose(
      density.probabilities.reduce((sum, value) => sum + value, 0),
      1,
      { rel: 1e-14, because: "normalised" },
    );
  });

  test("far outside is an exponential at the edge: ln of its integral, and its quantiles", () => {
    // ∫_0^∞ exp(-a x - x²/2σ²) dx with a = |mean|/σ²; the quadratic term shifts the logarithm by -1/(a σ)² at first order
    const [mean, error] = [-10, 0.01];
    const slope = -mean / error ** 2;
    const density = densityQuadrature(normal(mean, error), [0, 1]);
    expectClose(density.logIntegral, -0.5 * (mean / error) ** 2 - Math.log(slope), {
      rel: 1e-11,
      because: "second order",
    });
    for (const p of [0.16, 0.5, 0.84]) {
      expectClose(density.quantile(p), -Math.log(1 - p) / slope, {
        rel: 2e-6,
        because: "first order in 1/(a σ)² = 1e-6",
      });
    }
  });
});

describe("densityQuadrature", () => {
  test("takes the mean of a function as a sum over its nodes", () => {
    const density = densityQuadrature(normal(2, 0.5), [-5, 10]);
    const mean = density.nodes.reduce((sum, x, i) => sum + density.probabilities[i] * x ** 3, 0);
    expectClose(mean, 2 ** 3 + 3 * 2 * 0.5 ** 2, { rel: 1e-7, because: "parts below 1e-9 of the peak are left out" });
  });

  test("handles a kink at an edge like a smooth density", () => {
    const split = (x: number) => (x < 0.4 ? normal(0.4, 0.02)(x) : normal(0.4, 0.1)(x));
    const density = densityQuadrature(split, [0, 0.4, 1]);
    expectClose(density.quantile(1 / 6), 0.4, { rel: 1e-7, because: "the lower side holds 0.02 / 0.12 of the area" });
  });

  test("converges with the number of nodes", () => {
    const exact = Math.log(Math.sqrt(2 * Math.PI) * 0.1);
    const errors = [2, 4, 6, 8].map((n) =>
      Math.abs(densityQuadrature(normal(0.437, 0.1), [-1, 2], { ...FINE, rule: gaussLegendre(n) }).logIntegral - exact),
    );
    errors.slice(1).forEach((error, i) => {
      expect(error).toBeLessThan(errors[i] / 5);
    });
    expect(errors[3]).toBeLessThan(1e-6);
  });

  test("costs little: about a hundred evaluations for a normal density", () => {
    let calls = 0;
    densityQuadrature(
      (x) => {
        calls++;
        return normal(0.3, 0.05)(x);
      },
      [0, 1],
    );
    expect(calls).toBeLessThan(120);
  });

  test("logIntegral alone is the same number", () => {
    const density = densityQuadrature(normal(0.3, 0.05), [0, 0.3, 1]);
    expect(logIntegral(normal(0.3, 0.05), [0, 0.3, 1])).toBeCloseTo(density.logIntegral, 14);
  });
});
