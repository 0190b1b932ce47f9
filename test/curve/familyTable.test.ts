import { describe, expect, test } from "vitest";
import { FamilyTable } from "../../src/curve/familyTable.ts";
import { solveFamily } from "../../src/curve/solveFamily.ts";
import { ConvergenceError, InputError } from "../../src/errors.ts";
import { expectClose } from "../support/expectClose.ts";
import { thrownBy } from "../support/thrownBy.ts";

const range = { lightest: 1e23, heaviest: 1e26 };
type Radius = (mass: number, f: readonly number[]) => number | undefined;

const solve = (radius: Radius, components: number, options = {}) =>
  solveFamily((f) => (masses) => masses.map((m) => radius(m, f)), components, range, options);

const smooth = (m: number, f: readonly number[]) =>
  (1 - 0.2 * f[0] + 0.4 * f[f.length - 1] ** 2) * m ** (1 / 3) * (1 + (m / 1e25) ** 0.6) ** -0.4;

describe("a family's table", () => {
  test.each([2, 3, 4])("of %d components meets a smooth family between its nodes", (components) => {
    const { lattice, error } = solve(smooth, components, { angleSteps: components === 4 ? 12 : 24 });
    const table = new FamilyTable(lattice);
    const parts = [0.11, 0.23, 0.37, 0.29].slice(0, components);
    const fractions = parts.map((part) => part / parts.reduce((sum, x) => sum + x));
    for (const mass of [1e23, 3.3e24, 1e26]) {
      const because = "quintics over steps of 1/24 and 0.2, 1/12 for four components";
      expectClose(table.member(fractions).radius(mass), smooth(mass, fractions), { rel: 2e-5, because });
    }
    expect(error.largest).toBeLessThan(1e-4);
    expect(error.largest).toBeGreaterThan(error.rootMeanSquare);
    expect(error.rootMeanSquare).toBeGreaterThan(error.median);
  });

  test("is exact at its nodes, pure components among them", () => {
    const table = new FamilyTable(solve(smooth, 3).lattice);
    for (const pure of [
      [1, 0, 0],
      [0, 1, 0],
      [0, 0, 1],
    ]) {
      expectClose(table.member(pure).radius(1e23), smooth(1e23, pure), { rel: 1e-12, because: "round-off" });
    }
  });

  test("of one component is its curve", () => {
    const { lattice } = solve(smooth, 1, { massStep: 0.1 });
    expectClose(new FamilyTable(lattice).member([1]).radius(7e24), smooth(7e24, [1]), { rel: 1e-7, because: "0.1⁶" });
  });

  test("a member over some masses only is the same there", () => {
    const table = new FamilyTable(solve(smooth, 3).lattice);
    const within = { lightest: 2e24, heaviest: 5e24 };
    const [some, all] = [table.member([0.2, 0.3, 0.5], within), table.member([0.2, 0.3, 0.5])];
    for (const mass of [2e24, 3.1e24, 5e24]) {
      expectClose(some.radius(mass), all.radius(mass), { rel: 1e-13, because: "round-off of another first node" });
    }
  });

  test("says how far it is off at a fold, and where", () => {
    const folded: Radius = (m, f) => smooth(m, f) * (1 - 0.02 * Math.max(0, Math.log(m / 2e24) - 3 * f[1]));
    const [coarse, fine] = [12, 48].map(
      (angleSteps) => solve(folded, 2, { angleSteps, massStep: 4.8 / angleSteps }).error,
    );
    expect(coarse.largest).toBeGreaterThan(2e-4);
    expect(fine.largest).toBeLessThan(coarse.largest / 2);
    const { mass, fractions } = coarse.worst;
    expect(Math.abs(Math.log(mass / 2e24) - 3 * fractions[1])).toBeLessThan(0.6);
  });

  test("ends where some member has no heavier planet", () => {
    const bounded: Radius = (m, f) => (f[0] > 0.9 && m > 2e25 ? undefined : smooth(m, f));
    const { lattice } = solve(bounded, 2);
    const { heaviest } = new FamilyTable(lattice);
    expect(heaviest).toBeLessThan(2e25);
    expect(heaviest).toBeGreaterThan(2e25 * Math.exp(-0.2));
  });

  test("a member without light planets is an error", () => {
    const error = thrownBy(() => solve((m, f) => (f[0] === 1 ? undefined : smooth(m, f)), 2));
    expect(error).toBeInstanceOf(ConvergenceError);
    expect(error).toHaveProperty("code", "grid-empty");
  });

  test.each([[[0.5, 0.6]], [[1]], [[-0.1, 1.1]], [[Number.NaN, 1]]])("fractions %j are refused", (fractions) => {
    const table = new FamilyTable(solve(smooth, 2).lattice);
    expect(thrownBy(() => table.member(fractions))).toBeInstanceOf(InputError);
  });
});
