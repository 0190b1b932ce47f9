import { describe, expect, test } from "vitest";
import { type RadiusSolver, radiusCurve } from "../../src/curve/radiusCurve.ts";
import { ConvergenceError, ModelRangeError } from "../../src/errors.ts";
import { expectClose } from "../support/expectClose.ts";
import { thrownBy } from "../support/thrownBy.ts";

const range = { lightest: 1e21, heaviest: 1e28 };
const solverFor =
  (radius: (mass: number) => number | undefined): RadiusSolver =>
  (masses) =>
    masses.map(radius);
/** Points that no refinement by halves lands on. */
const masses = Array.from({ length: 500 }, (_, i) => 1e21 * 10 ** ((7 * (i + 0.37)) / 500));

describe("radiusCurve", () => {
  test("reproduces a power law, which is straight in ln R over ln M", () => {
    const curve = radiusCurve(
      solverFor((m) => 3 * m ** 0.27),
      range,
    );
    for (const m of masses)
      expectClose(curve.radius(m), 3 * m ** 0.27, { rel: 1e-12, because: "round-off of exp and log" });
  });

  test("keeps to its tolerance everywhere, and measures what it reached", () => {
    // Bends like a planet that is compressed more and more, with a fold as where a phase appears.
    const radius = (m: number) =>
      m ** (1 / 3) * (1 + (m / 1e25) ** 0.6) ** -0.4 * (1 - 0.02 * Math.max(0, Math.log(m / 7e23)));
    const curve = radiusCurve(solverFor(radius), range);
    const worst = Math.max(...masses.map((m) => Math.abs(curve.radius(m) / radius(m) - 1)));
    expect(worst).toBeLessThan(1e-6);
    expect(curve.relativeError).toBeLessThan(1e-6);
    expect(curve.relativeError).toBeGreaterThan(1e-9);
    expect(curve.nodeCount).toBeLessThan(150);
  });

  test("solves every mass once and in rising order", () => {
    const seen: number[] = [];
    radiusCurve((batch) => {
      expect([...batch].sort((a, b) => a - b)).toEqual(batch);
      seen.push(...batch);
      return batch.map((m) => m ** 0.3 / (1 + m / 1e27));
    }, range);
    expect(new Set(seen).size).toBe(seen.length);
  });

  test("finds the mass with a radius on the rising branch only", () => {
    const radius = (m: number) => m ** (1 / 3) / (1 + (m / 1e27) ** (2 / 3)); // largest at 1e27 kg
    const curve = radiusCurve(solverFor(radius), range);
    for (const m of [2e21, 1e24, 6e26]) {
      expectClose(curve.massWithRadius(radius(m)) ?? 0, m, { rel: 1e-4, because: "1e-6 in R near its flat top" });
    }
    expect(curve.massWithRadius(radius(1e21) / 2)).toBeUndefined();
    expect(curve.massWithRadius(radius(1e27) * 1.01)).toBeUndefined();
  });

  test.each([3e26, 1.234e26, 7.77e27, 5e22])(
    "ends at a maximum mass of %d, within its tolerance up to there",
    (maximum) => {
      // Vertical at the maximum mass, as a stable branch is where it meets the unstable one.
      const radius = (m: number) => (m > maximum ? undefined : m ** 0.3 * (1 + 0.4 * Math.sqrt(1 - m / maximum)));
      const curve = radiusCurve(solverFor(radius), range);
      expect(curve.heaviest).toBeLessThan(maximum);
      expect(curve.heaviest).toBeGreaterThan(0.98 * maximum);
      expect(curve.relativeError).toBeLessThan(1e-6);
      for (const m of masses.filter((mass) => mass <= curve.heaviest)) {
        expectClose(curve.radius(m), radius(m) ?? 0, { rel: 1e-6, because: "the tolerance" });
      }
    },
  );

  test("refuses masses outside its range, and a composition without planets", () => {
    const curve = radiusCurve(
      solverFor((m) => m ** 0.3),
      range,
    );
    expect(curve.radius(range.lightest)).toBeGreaterThan(0);
    expect(curve.radius(range.heaviest)).toBeGreaterThan(0);
    for (const m of [0.99e21, 1.01e28, Number.NaN]) {
      const error = thrownBy(() => curve.radius(m));
      expect(error).toBeInstanceOf(ModelRangeError);
      expect(error).toMatchObject({ code: "curve-mass-range", value: m });
    }
    const empty = thrownBy(() =>
      radiusCurve(
        solverFor(() => undefined),
        range,
      ),
    );
    expect(empty).toBeInstanceOf(ConvergenceError);
    expect(empty).toMatchObject({ code: "curve-empty" });
  });
});
