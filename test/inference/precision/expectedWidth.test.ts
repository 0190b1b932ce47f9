import { describe, expect, test } from "vitest";
import { fractionPosterior } from "../../../src/inference/fractionPosterior.ts";
import { expectedLearning, width68 } from "../../../src/inference/precision/expectedWidth.ts";
import { withErrors } from "../../../src/inference/precision/plannedMeasurement.ts";
import { expectClose } from "../../support/expectClose.ts";
import { measurement, quoted } from "../powerLaws.ts";
import { straightFamily, wholeRange } from "./straightLines.ts";

/** The 84th percentile of the standard normal distribution (scipy.stats.norm.ppf(0.84)). */
const Z84 = 0.994457883209753;

describe("expectedLearning", () => {
  test("has the closed form of straight relations with normal errors", () => {
    const slope = 0.02;
    const present = measurement(quoted(5, 0.5), quoted(1.1 - 0.3 * 0.5 + slope * 5, 0.008));
    const sigma = (mass: number, radius: number) => Math.hypot(radius, slope * mass) / 0.3;
    for (const [mass, radius] of [
      [0.25, 0.008],
      [0.5, 0.004],
      [0.25, 0.004],
    ]) {
      const { width68, informationBits } = expectedLearning(
        present,
        withErrors(present, { mass, radius }),
        straightFamily(slope),
        wholeRange,
      );
      expectClose(width68, 2 * Z84 * sigma(mass, radius), { rel: 1e-6, because: "quadrature and normal quantiles" });
      const bits = Math.log2(sigma(0.5, 0.008) / sigma(mass, radius));
      expectClose(informationBits, bits, { rel: 1e-5, because: "the fraction's ends are 10 errors away" });
    }
  });

  test("teaches nothing where no error shrinks", () => {
    const present = measurement(quoted(5, 0.5, 0.7), quoted(1.0, 0.03, 0.05));
    const family = straightFamily(0.02);
    const { width68: width, informationBits } = expectedLearning(present, present, family, wholeRange);
    expect(width).toBe(width68(fractionPosterior(present, family, wholeRange)));
    expect(informationBits).toBe(0);
  });

  test("leaves out masses to come that are none", () => {
    const present = measurement(quoted(5, 3), quoted(1.1, 0.03));
    const planned = withErrors(present, { mass: 0.05, radius: 0.03 });
    const { width68, informationBits } = expectedLearning(present, planned, straightFamily(0.02), wholeRange);
    expect(width68).toBeLessThan(0.3);
    expect(informationBits).toBeGreaterThan(0);
  });

  test("weighs values to come by how probable the present data and the family make them", () => {
    // The radius is quoted outside the family, whose largest is 1.1: most values to come lie nearer.
    const [quotedRadius, now, then] = [1.2, 0.12, 0.06];
    const present = measurement(quoted(5, 0.1), quoted(quotedRadius, now));
    const planned = withErrors(present, { mass: 0.1, radius: then });
    const { width68, informationBits } = expectedLearning(present, planned, straightFamily(0), wholeRange);
    const reference = bruteForce(quotedRadius, now, then);
    expectClose(width68, reference.width, { rel: 0.01, because: "7 values to come" });
    expectClose(informationBits, reference.bits, { rel: 0.02, because: "7 values to come" });
  });
});

/** Midpoint sums over the fraction and the radius to come, for R = 1.1 - 0.3 f. */
function bruteForce(quotedRadius: number, now: number, then: number): { width: number; bits: number } {
  const count = 2000;
  const fractions = Array.from({ length: count }, (_, i) => (i + 0.5) / count);
  const posterior = (radius: number, error: number) => {
    const densities = fractions.map((f) => Math.exp(-(((1.1 - 0.3 * f - radius) / error) ** 2) / 2));
    const evidence = densities.reduce((sum, p) => sum + p, 0) / count;
    const probabilities = densities.map((p) => p / evidence / count);
    let below = 0;
    const quantiles: number[] = [];
    probabilities.forEach((p, i) => {
      for (const share of [0.16, 0.84]) {
        if (below < share && below + p >= share) quantiles.push((i + (share - below) / p) / count);
      }
      below += p;
    });
    const entropy = -probabilities.reduce((sum, p) => sum + p * Math.log2(p * count), 0);
    return { evidence, width: quantiles[1] - quantiles[0], entropy };
  };
  const spread = Math.sqrt(now ** 2 - then ** 2);
  let [total, width, entropy] = [0, 0, 0];
  for (let z = -6; z <= 6; z += 0.02) {
    const future = posterior(quotedRadius + z * spread, then);
    const weight = Math.exp(-(z ** 2) / 2) * future.evidence;
    total += weight;
    width += weight * future.width;
    entropy += weight * future.entropy;
  }
  return { width: width / total, bits: posterior(quotedRadius, now).entropy - entropy / total };
}
