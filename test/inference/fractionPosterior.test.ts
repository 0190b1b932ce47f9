import { describe, expect, test } from "vitest";
import { fractionEstimate, fractionPosterior } from "../../src/inference/fractionPosterior.ts";
import { normalBelow } from "../../src/inference/normal.ts";
import { shareBetween } from "../../src/inference/splitNormal.ts";
import { reference } from "../fixtures/inference/reference.ts";
import { expectClose } from "../support/expectClose.ts";
import { family, measurement, powerLaw, quoted, range } from "./powerLaws.ts";

const percentiles = [0.16, 0.5, 0.84];

describe("fractionPosterior", () => {
  test.each(reference.cases)(
    "mass $mass, radius $radius: percentiles of the reference",
    ({ mass, radius, fraction }) => {
      const posterior = fractionPosterior(measurement(quoted(...mass), quoted(...radius)), family, range);
      percentiles.forEach((p, i) => {
        expectClose(posterior.quantile(p), fraction[i], { rel: 1e-6, because: "the quadrature's stated error" });
      });
    },
  );

  test.each([
    ["inside", 0.95, 0.03],
    ["narrow", 0.95, 0.0003],
    ["at an edge", 1.1, 0.03],
    ["outside", 1.3, 0.05],
  ])("for radius linear in the fraction and no mass error is a truncated normal: %s", (_, radius, error) => {
    const posterior = fractionPosterior(measurement(quoted(1, 1e-9), quoted(radius, error)), family, range);
    const [mean, width] = [(1.1 - radius) / 0.3, error / 0.3];
    const share = (f: number) => normalBelow((f - mean) / width) - normalBelow(-mean / width);
    for (const p of percentiles) {
      expectClose(share(posterior.quantile(p)) / share(1), p, { rel: 1e-6, because: "the quadrature's stated error" });
    }
  });

  test("respects asymmetric radius errors: more area on the wider side", () => {
    const radius = quoted(0.95, 0.04, 0.01);
    const posterior = fractionPosterior(measurement(quoted(1, 1e-9), radius), family, range);
    const within = shareBetween(radius, 0.8, 1.1);
    for (const p of percentiles) {
      const largest = 1.1 - 0.3 * posterior.quantile(p);
      expectClose(shareBetween(radius, largest, 1.1) / within, p, {
        rel: 1e-6,
        because: "the quadrature's stated error",
      });
    }
  });

  test("is the prior where the measurement says nothing", () => {
    const { median, minus, plus } = fractionEstimate(
      fractionPosterior(measurement(quoted(1, 0.1), quoted(1, 1e4)), family, range),
    );
    for (const [value, expected] of [
      [median, 0.5],
      [minus, 0.34],
      [plus, 0.34],
    ]) {
      expectClose(value, expected, { rel: 1e-6, because: "flat from 0 to 1" });
    }
  });

  test("piles up at the edge that is nearest to a planet outside the family, however far", () => {
    for (const error of [0.2, 0.02, 0.002]) {
      const large = fractionPosterior(measurement(quoted(300, 10), quoted(12, error)), family, range);
      const small = fractionPosterior(measurement(quoted(300, 10), quoted(1, error)), family, range);
      expect(large.quantile(0.84)).toBeLessThan(0.025);
      expect(small.quantile(0.16)).toBeGreaterThan(0.975);
      expect(large.quantile(0.16)).toBeGreaterThan(0);
      expect(small.quantile(0.84)).toBeLessThanOrEqual(1);
    }
  });

  test("goes down as the radius goes up, and does not depend on the units", () => {
    const medianOf = (radius: number) =>
      fractionPosterior(measurement(quoted(1, 0.1), quoted(radius, 0.03)), family, range).quantile(0.5);
    const medians = [0.7, 0.8, 0.9, 1, 1.1, 1.2].map(medianOf);
    medians.slice(1).forEach((median, i) => {
      expect(median).toBeLessThan(medians[i]);
    });
    const [kg, m] = [6e24, 6.4e6];
    const scaled = fractionPosterior(
      measurement(quoted(kg, 0.1 * kg), quoted(0.9 * m, 0.03 * m)),
      { ...range, member: (f) => powerLaw(((1.1 - 0.3 * f) * m) / kg ** 0.27) },
      { lightest: range.lightest * kg, heaviest: range.heaviest * kg },
    );
    expectClose(scaled.quantile(0.5), medians[2], { rel: 1e-9, because: "round-off in the bisection" });
  });
});
