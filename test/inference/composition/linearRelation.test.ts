import { describe, expect, test } from "vitest";
import { compositionPosterior } from "../../../src/inference/composition/compositionPosterior.ts";
import { measuredLikelihood } from "../../../src/inference/composition/measuredLikelihood.ts";
import { normalBelow } from "../../../src/inference/normal.ts";
import { expectClose } from "../../support/expectClose.ts";
import { quoted } from "../powerLaws.ts";
import { familyOf, range } from "./inventedFamilies.ts";

const SLOPE = 0.27;
const fine = { tolerance: 1e-8 };
const because = "the aim for relations with a closed form";

/** R = 1 + SLOPE (M - 1) + RISE f_outer: with normal errors the posterior of f is a normal one cut off at 0 and 1. */
const RISE = 0.5;
const twoParts = familyOf((m, f) => 1 + SLOPE * (m - 1) + RISE * f[1], ["inner", "outer"]);

interface Case {
  readonly mass: readonly [number, number];
  readonly radius: readonly [number, number];
  readonly correlation: number;
}

const cases: Case[] = [
  { mass: [1, 0.1], radius: [1.25, 0.02], correlation: 0 },
  { mass: [1.2, 0.1], radius: [1.1, 0.1], correlation: 0 },
  { mass: [1, 0.15], radius: [1.25, 0.06], correlation: 0.6 },
  { mass: [0.9, 0.05], radius: [0.9, 0.04], correlation: -0.3 },
];

/** Mean and error of (R - 1 - SLOPE (M - 1)) / RISE. */
function normalOf({ mass, radius, correlation }: Case): { mean: number; sigma: number } {
  const [s, r] = [SLOPE * mass[1], radius[1]];
  return {
    mean: (radius[0] - 1 - SLOPE * (mass[0] - 1)) / RISE,
    sigma: Math.sqrt(r * r + s * s - 2 * correlation * r * s) / RISE,
  };
}

/** Quantile of a normal distribution cut off at 0 and 1, by bisection. */
function cutQuantile(share: number, { mean, sigma }: { mean: number; sigma: number }): number {
  const below = (x: number) => normalBelow((x - mean) / sigma) - normalBelow(-mean / sigma);
  let [low, high] = [0, 1];
  for (let step = 0; step < 60; step++) {
    const middle = (low + high) / 2;
    if (below(middle) < share * below(1)) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

describe("a linear relation with normal errors", () => {
  test.each(cases)("has the analytic median and mean: %j", (given) => {
    const data = measuredLikelihood({
      mass: quoted(...given.mass),
      radius: quoted(...given.radius),
      correlation: given.correlation,
    });
    const posterior = compositionPosterior(data, twoParts, range, fine);
    const normal = normalOf(given);
    const outer = posterior?.fractions[1];
    expect(Math.abs((outer?.median ?? Number.NaN) - cutQuantile(0.5, normal)), because).toBeLessThan(1e-6);

    const { mean, sigma } = normal;
    const density = (x: number) => Math.exp(-0.5 * ((x - mean) / sigma) ** 2) / Math.sqrt(2 * Math.PI);
    const area = normalBelow((1 - mean) / sigma) - normalBelow(-mean / sigma);
    const cutMean = mean + (sigma * (density(0) - density(1))) / area;
    expect(Math.abs((outer?.mean ?? Number.NaN) - cutMean), because).toBeLessThan(1e-6);
  });

  test("has the analytic interval where it is far from both ends", () => {
    const [given] = cases;
    const data = measuredLikelihood({ mass: quoted(...given.mass), radius: quoted(...given.radius), correlation: 0 });
    const posterior = compositionPosterior(data, twoParts, range, fine);
    const { mean, sigma } = normalOf(given);
    // 0.9944579 and 1.9599640 errors hold 68 and 95 % of a normal distribution (Abramowitz & Stegun 1964, table 26.6).
    const { within68, within95 } = posterior?.fractions[1] ?? expect.fail();
    for (const [end, k] of [
      [within68.lower, -0.99445788],
      [within68.upper, 0.99445788],
      [within95.lower, -1.95996398],
      [within95.upper, 1.95996398],
    ]) {
      // The shortest interval is flat in its position: an error of 1e-6 there would be no error of its width.
      expect(Math.abs(end - (mean + k * sigma))).toBeLessThan(1e-4);
    }
    expect(Math.abs(within95.upper - within95.lower - 2 * 1.95996398 * sigma)).toBeLessThan(5e-6);
  });

  test("has the analytic evidence and predictive probability where it is far from both ends", () => {
    const [given] = cases;
    const data = measuredLikelihood({ mass: quoted(...given.mass), radius: quoted(...given.radius), correlation: 0 });
    const posterior = compositionPosterior(data, twoParts, range, fine);
    // ∫ exp(-(R_obs - R)²/2σ²) df = √(2π) σ / RISE whatever the mass.
    expectClose(Math.exp(posterior?.logEvidence ?? 0), (Math.sqrt(2 * Math.PI) * given.radius[1]) / RISE, {
      rel: 1e-6,
      because,
    });
    // Both deviations are standard normal after the fact: E[exp(-χ²/2)] = 1/2.
    expectClose(posterior?.predictiveP ?? 0, 0.5, { rel: 1e-6, because });
  });
});

/** By mpmath (25 digits, nested tanh-sinh quadrature over the two other fractions): see origin below. */
const reference = {
  // R = 1 - 0.25 f_1 + 0.5 f_3 + 0.27 (M - 1), M = 1 ± 0.1, R = 1.05 ± 0.04
  median: [0.30724573383762, 0.43874525570509, 0.25157892555052],
  mean: [0.30902113606078, 0.44230470402496, 0.24867415991426],
};

describe("three components in a linear relation", () => {
  const radius = (m: number, f: ArrayLike<number>) => 1 - 0.25 * f[0] + 0.5 * f[2] + SLOPE * (m - 1);
  const data = measuredLikelihood({ mass: quoted(1, 0.1), radius: quoted(1.05, 0.04), correlation: 0 });

  test("have the medians and means of a reference quadrature", () => {
    const posterior = compositionPosterior(data, familyOf(radius, ["a", "b", "c"]), range, { tolerance: 1e-7 });
    posterior?.fractions.forEach(({ median, mean }, k) => {
      expect(Math.abs(median - reference.median[k]), because).toBeLessThan(1e-6);
      expect(Math.abs(mean - reference.mean[k]), because).toBeLessThan(1e-6);
    });
    expect(posterior?.fractions).toHaveLength(3);
  });

  test("are met to 3e-4 with the default tolerance", () => {
    const posterior = compositionPosterior(data, familyOf(radius, ["a", "b", "c"]), range);
    posterior?.fractions.forEach(({ median, mean }, k) => {
      expect(Math.abs(median - reference.median[k])).toBeLessThan(3e-4);
      expect(Math.abs(mean - reference.mean[k])).toBeLessThan(3e-4);
    });
    expect(posterior?.fractions).toHaveLength(3);
  });
});
