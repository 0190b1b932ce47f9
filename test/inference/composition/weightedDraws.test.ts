import { describe, expect, test } from "vitest";
import { compositionPosterior } from "../../../src/inference/composition/compositionPosterior.ts";
import { measuredLikelihood } from "../../../src/inference/composition/measuredLikelihood.ts";
import { type RandomNumbers, randomNumbers } from "../../support/randomNumbers.ts";
import { quoted } from "../powerLaws.ts";
import { familyOf, range } from "./inventedFamilies.ts";

/**
 * The same posteriors from weighted random draws (importance sampling): slow, noisy, and sharing no code with the
 * quadrature. Masses are drawn from the measurement, fractions from the prior; the weight is the likelihood of the radius.
 */
const DRAWS = 60_000;
const PLANETS = 20;
/** Standard errors that 120 means and shares may differ by: once in a thousand runs of all. */
const FAR = 4.5;

/** Curved in the fractions and in mass, with a fold. */
function radius(mass: number, f: ArrayLike<number>): number {
  const fold = Math.min(0, f[2] * mass - 0.6);
  return mass ** 0.27 * (1.05 - 0.28 * f[0] ** 1.2 + 0.45 * Math.sqrt(f[2] + 0.02) + 0.05 * fold);
}

interface Invented {
  readonly mass: readonly [number, number, number];
  readonly radius: readonly [number, number, number];
}

/** Errors of 3 to 25 % in mass and 1 to 8 % in radius, unequal on the two sides. */
function invent(random: RandomNumbers): Invented {
  const mass = 0.3 * 30 ** random.uniform();
  const [a, b, c] = [random.uniform(), random.uniform(), random.uniform()].map((u) => -Math.log(u));
  const size = radius(mass, [a / (a + b + c), b / (a + b + c), c / (a + b + c)]);
  const error = (of: number, low: number, high: number) => of * low * (high / low) ** random.uniform();
  return {
    mass: [mass, error(mass, 0.03, 0.25), error(mass, 0.03, 0.25)],
    radius: [size, error(size, 0.01, 0.08), error(size, 0.01, 0.08)],
  };
}

interface Weighted {
  readonly fractions: readonly number[];
  readonly weight: number;
}

function draws({ mass, radius: size }: Invented, random: RandomNumbers): Weighted[] {
  return Array.from({ length: DRAWS }, () => {
    let m: number;
    do {
      const [value, minus, plus] = mass;
      const step = Math.abs(random.normal());
      m = random.uniform() < minus / (minus + plus) ? value - step * minus : value + step * plus;
    } while (!(m > range.lightest));
    const [a, b, c] = [random.uniform(), random.uniform(), random.uniform()].map((u) => -Math.log(u));
    const fractions = [a, b, c].map((x) => x / (a + b + c));
    const [value, minus, plus] = size;
    const off = radius(m, fractions) - value;
    return { fractions, weight: Math.exp(-0.5 * (off / (off < 0 ? minus : plus)) ** 2) };
  });
}

/** Weighted mean of a quantity and its standard error. */
function weightedMean(sample: readonly Weighted[], of: (fractions: readonly number[]) => number) {
  const total = sample.reduce((sum, { weight }) => sum + weight, 0);
  const mean = sample.reduce((sum, { weight, fractions }) => sum + weight * of(fractions), 0) / total;
  const spread = sample.reduce((sum, { weight, fractions }) => sum + (weight * (of(fractions) - mean)) ** 2, 0);
  return { mean, error: Math.sqrt(spread) / total };
}

describe("weighted draws", () => {
  const random = randomNumbers(20_1218);
  const planets = Array.from({ length: PLANETS }, () => invent(random));
  const family = familyOf(radius, ["a", "b", "c"]);

  test.each(planets)("agree for an invented planet: %j", (planet) => {
    const data = measuredLikelihood({ mass: quoted(...planet.mass), radius: quoted(...planet.radius), correlation: 0 });
    const posterior = compositionPosterior(data, family, range) ?? expect.fail();
    const sample = draws(planet, random);
    posterior.fractions.forEach(({ mean, median, within68 }, k) => {
      const drawn = weightedMean(sample, (f) => f[k]);
      expect(Math.abs(drawn.mean - mean) / drawn.error).toBeLessThan(FAR);
      const below = weightedMean(sample, (f) => Number(f[k] < median));
      expect(Math.abs(below.mean - 0.5) / below.error).toBeLessThan(FAR);
      const within = weightedMean(sample, (f) => Number(f[k] >= within68.lower && f[k] <= within68.upper));
      expect(Math.abs(within.mean - 0.68) / within.error).toBeLessThan(FAR);
    });
    const evidence = sample.reduce((sum, { weight }) => sum + weight, 0) / DRAWS;
    const squares = sample.reduce((sum, { weight }) => sum + weight * weight, 0) / DRAWS;
    const error = Math.sqrt((squares - evidence ** 2) / DRAWS);
    expect(Math.abs(Math.exp(posterior.logEvidence) - evidence) / error).toBeLessThan(FAR);
  });
});
