import { describe, expect, test } from "vitest";
import { classProbabilities } from "../../src/inference/classProbabilities.ts";
import { fractionPosterior } from "../../src/inference/fractionPosterior.ts";
import { boundaries, family, measurement, quoted, range } from "./powerLaws.ts";

/**
 * The same posteriors from weighted random draws: slow, noisy and sharing no code with the quadrature. Masses are drawn
 * from the measurement, fractions from the prior; the weight is the likelihood of the radius.
 */
const DRAWS = 100_000;

/** Numbers in (0, 1) of a fixed sequence (Lehmer generator, multiplier 48271 modulo 2^31 - 1: Park & Miller 1988, corrected 1993). */
function uniformNumbers(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 48271) % 2147483647;
    return state / 2147483647;
  };
}

type Errors = readonly [value: number, minus: number, plus: number];

/** One draw from a two-piece normal (Box–Muller, the side chosen by its area), repeated until it is in the range. */
function draw([value, minus, plus]: Errors, uniform: () => number, lowest: number): number {
  for (;;) {
    const size = Math.abs(Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform()));
    const x = uniform() < minus / (minus + plus) ? value - size * minus : value + size * plus;
    if (x >= lowest) return x;
  }
}

function likelihood([value, minus, plus]: Errors, radius: number): number {
  return Math.exp(-0.5 * ((radius - value) / (radius < value ? minus : plus)) ** 2);
}

const planets: { mass: Errors; radius: Errors }[] = [
  { mass: [1, 0.1, 0.1], radius: [1, 0.04, 0.04] },
  { mass: [1, 0.2, 0.1], radius: [0.9, 0.03, 0.06] },
  { mass: [4.2, 0.5, 0.7], radius: [1.5, 0.1, 0.05] },
  { mass: [0.4, 0.15, 0.3], radius: [0.8, 0.03, 0.03] },
  { mass: [9, 1, 1], radius: [2.2, 0.12, 0.12] },
  { mass: [20, 6, 9], radius: [2.1, 0.2, 0.3] },
  { mass: [7, 0.3, 0.3], radius: [1.45, 0.08, 0.08] },
  { mass: [2, 1.2, 1.5], radius: [1.3, 0.1, 0.1] },
  { mass: [60, 5, 5], radius: [3.1, 0.3, 0.3] },
  { mass: [0.08, 0.05, 0.1], radius: [0.45, 0.03, 0.04] },
];

describe.each(planets)("mass $mass, radius $radius", ({ mass, radius }) => {
  const uniform = uniformNumbers(20_240_607);
  const planet = measurement(quoted(...mass), quoted(...radius));

  test("class probabilities agree with counted draws within four standard errors", () => {
    const counts = [0, 0, 0, 0];
    for (let n = 0; n < DRAWS; n++) {
      const m = draw(mass, uniform, range.lightest);
      const r = draw(radius, uniform, 0);
      counts[[0.8, 1.1, 1.4].filter((a) => r > a * m ** 0.27).length]++;
    }
    classProbabilities(planet, boundaries, range).forEach((p, i) => {
      const allowed = 4 * Math.sqrt((p * (1 - p)) / DRAWS) + 1 / DRAWS;
      expect(Math.abs(counts[i] / DRAWS - p)).toBeLessThan(allowed);
    });
  });

  test("percentiles of the fraction agree with weighted draws within four standard errors", () => {
    const posterior = fractionPosterior(planet, family, range);
    const percentiles = [0.16, 0.5, 0.84].map((p) => ({ p, at: posterior.quantile(p), below: 0, squares: 0 }));
    let total = 0;
    for (let n = 0; n < DRAWS; n++) {
      const f = uniform();
      const weight = likelihood(radius, (1.1 - 0.3 * f) * draw(mass, uniform, range.lightest) ** 0.27);
      total += weight;
      for (const percentile of percentiles) {
        const isBelow = f < percentile.at ? 1 : 0;
        percentile.below += weight * isBelow;
        percentile.squares += (weight * (isBelow - percentile.p)) ** 2;
      }
    }
    for (const { p, below, squares } of percentiles) {
      expect(Math.abs(below / total - p)).toBeLessThan((4 * Math.sqrt(squares)) / total);
    }
  });
});
