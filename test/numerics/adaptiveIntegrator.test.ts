import { describe, expect, it } from "vitest";
import { AdaptiveIntegrator } from "../../src/numerics/adaptiveIntegrator.ts";
import type { RightHandSide } from "../../src/numerics/rungeKutta8.ts";
import { expectClose } from "../support/expectClose.ts";

const decay: RightHandSide = (_x, y, out) => {
  out[0] = -y[0];
};

function started(y0: number, tolerance = 1e-10): AdaptiveIntegrator {
  const integrator = new AdaptiveIntegrator(1, 1);
  integrator.y[0] = y0;
  integrator.tolerance = tolerance;
  return integrator;
}

describe("advance", () => {
  it("reaches the end exactly, forwards and backwards, within the summed error estimate", () => {
    for (const end of [5, -5]) {
      const integrator = started(1);
      expect(integrator.advance(decay, end)).toBe("arrived");
      expect(integrator.x).toBe(end);
      const truth = Math.abs(integrator.y[0] / Math.exp(-end) - 1);
      expect(truth).toBeLessThan(integrator.errorSum);
      expect(integrator.errorSum).toBeLessThan(1e-8);
    }
  });

  it("does nothing on an empty stretch", () => {
    const integrator = started(1);
    integrator.x = 3;
    expect(integrator.advance(decay, 3)).toBe("arrived");
    expect(integrator.evaluations).toBe(0);
  });

  it("lands on a falling event with the accuracy of the method", () => {
    const integrator = started(1);
    expect(integrator.advance(decay, 10, { component: 0, value: 0.25 })).toBe("event");
    expectClose(integrator.x, Math.log(4), { rel: 1e-10, because: "the step tolerance" });
    expectClose(integrator.y[0], 0.25, { rel: 1e-15, because: "Newton's iteration ends at round-off" });
  });

  it("shows every accepted point to the caller", () => {
    const integrator = started(1);
    const seen: number[] = [];
    integrator.advance(decay, 2, undefined, () => seen.push(integrator.x));
    expect(seen.at(-1)).toBe(2);
    expect(seen).toEqual([...seen].sort((a, b) => a - b));
  });

  it("says stuck where the right-hand side leaves its domain, and never returns NaN", () => {
    const integrator = started(1);
    // y = √(1 - 2x) ends at x = 1/2.
    const ending: RightHandSide = (_x, y, out) => {
      out[0] = y[0] > 0 ? -1 / y[0] : Number.NaN;
    };
    expect(integrator.advance(ending, 1)).toBe("stuck");
    expect(integrator.y[0]).toBeGreaterThan(0);
    expect(integrator.x).toBeLessThan(0.5);
    expect(integrator.x).toBeGreaterThan(0.49);
  });

  it("remembers the step between stretches", () => {
    const split = started(1);
    const whole = started(1);
    whole.advance(decay, 4);
    for (let end = 0.5; end <= 4; end += 0.5) split.advance(decay, end);
    expect(split.evaluations).toBeLessThan(4 * whole.evaluations);
  });
});
