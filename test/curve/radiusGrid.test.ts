import { describe, expect, test } from "vitest";
import { radiusGrid } from "../../src/curve/radiusGrid.ts";
import { ConvergenceError, ModelRangeError } from "../../src/errors.ts";
import { expectClose } from "../support/expectClose.ts";
import { thrownBy } from "../support/thrownBy.ts";

const range = { lightest: 1e23, heaviest: 1e27 };
const gridOf = (radius: (m: number, f: number) => number | undefined, options = {}) =>
  radiusGrid((f) => (masses) => masses.map((m) => radius(m, f)), range, options);

/** Places all over the plane that no halving lands on, the edges among them. */
const places = Array.from({ length: 1000 }, (_, k) => ({
  mass: 1e23 * 10 ** (4 * ((k * 0.7548776662466927) % 1)),
  fraction: k < 20 ? k % 2 : (k * 0.5698402909980532) % 1,
}));

const smooth = (m: number, f: number) => (1 - 0.25 * f ** 1.2) * m ** (1 / 3) * (1 + (m / 1e25) ** 0.6) ** -0.4;
/** A fold along a line across the plane, as where a phase appears at the base of a mantle. */
const folded = (m: number, f: number) => smooth(m, f) * (1 - 0.02 * Math.max(0, Math.log(m / 2e24) - 3 * f));

describe("radiusGrid", () => {
  test.each([
    ["smooth", smooth, 1e-4],
    ["smooth, finer", smooth, 1e-6],
    ["folded", folded, 1e-4],
    ["folded, finer", folded, 2e-5],
  ])("keeps a %s family to its tolerance and measures what it reached", (_, radius, tolerance) => {
    const grid = gridOf(radius, { tolerance });
    const errors = places.map(({ mass, fraction }) =>
      Math.abs(grid.member(fraction).radius(mass) / radius(mass, fraction) - 1),
    );
    expect(Math.max(...errors)).toBeLessThan(tolerance);
    expect(grid.relativeError).toBeLessThan(tolerance);
    expect(grid.relativeError).toBeGreaterThan(0.02 * tolerance);
    expect(grid.rootMeanSquareError).toBeLessThan(grid.relativeError);
  });

  test("a member over some masses only is the same there", () => {
    const grid = gridOf(folded);
    const within = { lightest: 1e24, heaviest: 3e24 };
    for (const fraction of [0, 0.123, 0.5, 1]) {
      const all = grid.member(fraction);
      const some = grid.member(fraction, within);
      for (const mass of [1e24, 1.7e24, 3e24]) expect(some.radius(mass)).toBe(all.radius(mass));
      expect(some.lightest).toBeLessThanOrEqual(1e24);
      expect(some.heaviest).toBeGreaterThanOrEqual(3e24);
    }
  });

  test("refines where it must: a fold takes most of the cells", () => {
    expect(gridOf(folded).cellCount).toBeGreaterThan(3 * gridOf(smooth).cellCount);
  });

  test("ends for all members where one of them has no heavier planet", () => {
    const grid = gridOf((m, f) => (f > 0.8 && m > 2e26 ? undefined : smooth(m, f)));
    expect(grid.heaviest).toBeLessThanOrEqual(2e26);
    expect(grid.heaviest).toBeGreaterThan(1.4e26);
    expectClose(grid.member(0.9).radius(1.4e26), smooth(1.4e26, 0.9), { rel: 1e-4, because: "the tolerance" });
  });

  test("refuses fractions outside 0 to 1, and a family without planets", () => {
    const grid = gridOf(smooth);
    for (const fraction of [-1e-9, 1.001, Number.NaN]) {
      const error = thrownBy(() => grid.member(fraction));
      expect(error).toBeInstanceOf(ModelRangeError);
      expect(error).toMatchObject({ code: "grid-fraction-range", value: fraction });
    }
    const empty = thrownBy(() => gridOf(() => undefined));
    expect(empty).toBeInstanceOf(ConvergenceError);
    expect(empty).toMatchObject({ code: "grid-empty" });
  });
});
