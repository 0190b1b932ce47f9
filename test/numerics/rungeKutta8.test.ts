import { describe, expect, it } from "vitest";
import {
  fifthOrderError,
  nodes,
  solutionWeights,
  stageWeights,
  thirdOrderError,
} from "../../src/numerics/dormandPrinceTableau.ts";
import { type RightHandSide, RungeKutta8 } from "../../src/numerics/rungeKutta8.ts";

const sum = (row: readonly (readonly [number, number])[]): number =>
  row.reduce((total, [, weight]) => total + weight, 0);

describe("the tableau", () => {
  it("meets the row-sum and quadrature conditions", () => {
    stageWeights.forEach((row, i) => {
      expect(sum(row)).toBeCloseTo(nodes[i + 1], 13);
    });
    for (let power = 0; power < 8; power++) {
      const moment = solutionWeights.reduce((total, [i, weight]) => total + weight * nodes[i] ** power, 0);
      expect(moment).toBeCloseTo(1 / (power + 1), 13);
    }
    expect(sum(fifthOrderError)).toBeCloseTo(0, 13);
    expect(sum(thirdOrderError)).toBeCloseTo(0, 13);
  });
});

/** y' = y cos x has the solution exp(sin x). */
const growth: RightHandSide = (x, [y], out) => {
  out[0] = y * Math.cos(x);
};

function errorAt5(steps: number): number {
  const stepper = new RungeKutta8(1, 1);
  const y = Float64Array.of(1);
  const h = 5 / steps;
  for (let i = 0; i < steps; i++) stepper.step(growth, i * h, y, h, y);
  expect(stepper.evaluations).toBe(12 * steps);
  return Math.abs(y[0] / Math.exp(Math.sin(5)) - 1);
}

describe("a step", () => {
  it("converges with order 8", () => {
    const [coarse, fine] = [30, 45].map(errorAt5);
    const order = Math.log(coarse / fine) / Math.log(1.5);
    expect(Math.abs(order - 8)).toBeLessThan(0.2);
  });

  it("estimates an error that bounds the true one of the step", () => {
    const stepper = new RungeKutta8(1, 1);
    const next = new Float64Array(1);
    for (const h of [0.2, 0.5, 1]) {
      const estimate = stepper.step((_x, y, out) => out.set([y[0]]), 0, Float64Array.of(1), h, next);
      const truth = Math.abs(next[0] / Math.exp(h) - 1);
      expect(estimate).toBeGreaterThan(truth);
      expect(estimate).toBeLessThan(1e-3);
    }
  });

  it("ignores the components that only ride along", () => {
    const stepper = new RungeKutta8(2, 1);
    const wild: RightHandSide = (x, y, out) => out.set([y[0], Math.sin(1e3 * x)]);
    const estimate = stepper.step(wild, 0, Float64Array.of(1, 0), 0.1, new Float64Array(2));
    expect(estimate).toBeLessThan(1e-9);
  });
});
