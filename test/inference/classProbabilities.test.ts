import { describe, expect, test } from "vitest";
import { classProbabilities } from "../../src/inference/classProbabilities.ts";
import { shareBetween } from "../../src/inference/splitNormal.ts";
import { reference } from "../fixtures/inference/reference.ts";
import { expectClose } from "../support/expectClose.ts";
import { boundaries, measurement, powerLaw, quoted, range } from "./powerLaws.ts";

describe("classProbabilities", () => {
  test.each(reference.cases)("mass $mass, radius $radius: those of mpmath", ({ mass, radius, classes }) => {
    const found = classProbabilities(measurement(quoted(...mass), quoted(...radius)), boundaries, range);
    found.forEach((p, i) => {
      expect(Math.abs(p - classes[i]), `class ${i}: ${p} against ${classes[i]}`).toBeLessThan(1e-8);
      if (classes[i] > 1e-6) expectClose(p, classes[i], { rel: 1e-6, because: "the quadrature's stated error" });
    });
  });

  test("for a mass without error are differences of the distribution of the radius", () => {
    const radius = quoted(1.2, 0.1, 0.2);
    const found = classProbabilities(measurement(quoted(1, 1e-7), radius), boundaries, range);
    const edges = [0, 0.8, 1.1, 1.4, Number.POSITIVE_INFINITY];
    const positive = shareBetween(radius, 0, Number.POSITIVE_INFINITY);
    found.forEach((p, i) => {
      expectClose(p, shareBetween(radius, edges[i], edges[i + 1]) / positive, {
        rel: 1e-6,
        because: "mass error 1e-7",
      });
    });
  });

  test("sum to 1, also where the radius could as well be negative, and far from every curve", () => {
    for (const [mass, radius] of [
      [quoted(1, 0.5, 0.9), quoted(0.1, 0.3)],
      [quoted(1, 0.1), quoted(1, 0.001)],
      [quoted(300, 10), quoted(12, 0.02)],
      [quoted(500, 200), quoted(0.01, 0.001)],
    ]) {
      const found = classProbabilities(measurement(mass, radius), boundaries, range);
      for (const p of found) expect(p).toBeGreaterThanOrEqual(0);
      expectClose(
        found.reduce((sum, p) => sum + p),
        1,
        { rel: 1e-12, because: "normalised" },
      );
    }
  });

  test("move to the less dense classes as the radius grows, and mirror asymmetric errors", () => {
    let lastAbove = [0, 0, 0];
    for (let r = 0.6; r < 1.3; r += 0.05) {
      const [, p2, p3, p4] = classProbabilities(measurement(quoted(1, 0.1), quoted(r, 0.05)), boundaries, range);
      const above = [p2 + p3 + p4, p3 + p4, p4];
      above.forEach((p, i) => {
        expect(p).toBeGreaterThan(lastAbove[i]);
      });
      lastAbove = above;
    }
    const bySide = (radius: ReturnType<typeof quoted>) =>
      classProbabilities(measurement(quoted(1, 1e-6), radius), [powerLaw(1)], range)[0];
    expectClose(bySide(quoted(1, 0.03, 0.01)), 0.75, { rel: 1e-5, because: "3/4 of the area is on the wider side" });
    expectClose(bySide(quoted(1, 0.01, 0.03)), 0.25, { rel: 1e-5, because: "1/4 of the area is on the narrower side" });
  });

  test("do not depend on the units of mass and radius", () => {
    const plain = classProbabilities(measurement(quoted(1, 0.1, 0.2), quoted(1, 0.05)), boundaries, range);
    const [kg, m] = [6e24, 6.4e6];
    const inUnits = classProbabilities(
      measurement(quoted(kg, 0.1 * kg, 0.2 * kg), quoted(m, 0.05 * m)),
      [0.8, 1.1, 1.4].map((a) => powerLaw((a * m) / kg ** 0.27)),
      { lightest: range.lightest * kg, heaviest: range.heaviest * kg },
    );
    inUnits.forEach((p, i) => {
      expectClose(p, plain[i], { rel: 1e-12, because: "round-off" });
    });
  });
});
