import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { type TableRow, tabulated } from "../../src/eos/tabulated.ts";
import { expectClose } from "../support/expectClose.ts";
import { slopesAt } from "./forms.ts";

/** By SciPy's PchipInterpolator: test/fixtures/eos/makeTablePoints.py. */
const reference: { rows: TableRow[]; points: { pressure: number; logDensity: number; slope: number }[] } = JSON.parse(
  readFileSync("test/fixtures/eos/tablePoints.json", "utf8"),
);

describe("table", () => {
  const curve = tabulated(reference.rows);

  test.each(reference.points)("agrees with SciPy at $pressure Pa", ({ pressure, logDensity, slope }) => {
    const y = curve.coordinate(pressure);
    expectClose(Math.log(curve.density(y)), logDensity, { rel: 1e-14, because: "rounding" });
    expect(Math.abs(slopesAt(curve, y)[2] - slope)).toBeLessThanOrEqual(1e-13 * Math.abs(slope) + 1e-26);
  });

  test("goes through its rows and never falls between them", () => {
    for (const { pressure, density } of reference.rows) {
      expectClose(curve.density(curve.coordinate(pressure)), density, {
        rel: 1e-14,
        because: "rounding of exp and log",
      });
    }
    let before = 0;
    for (let pressure = 0; pressure <= 5e12; pressure += 1e9) {
      const density = curve.density(curve.coordinate(pressure));
      expect(density).toBeGreaterThanOrEqual(before * (1 - 1e-15));
      before = density;
    }
  });

  test("gives a pressure for a density, also on a flat piece", () => {
    expectClose(curve.density(curve.coordinateAtDensity(1120)), 1120, { rel: 1e-12, because: "required" });
    expectClose(curve.density(curve.coordinateAtDensity(5000)), 5000, { rel: 1e-12, because: "required" });
    expect(() => curve.coordinateAtDensity(999)).toThrowError(expect.objectContaining({ code: "eos-density-range" }));
  });

  test("ends where its rows end", () => {
    const short = tabulated([
      { pressure: 2e9, density: 1000 },
      { pressure: 3e9, density: 1100 },
    ]);
    expect(() => short.coordinate(1.9e9)).toThrowError(/1.9 GPa is outside.*2 GPa to 3 GPa/);
    expect(() => short.coordinate(3.1e9)).toThrowError(expect.objectContaining({ code: "eos-pressure-range" }));
  });
});

describe("a table that cannot be used", () => {
  const rows = (...pairs: [number, number][]): TableRow[] =>
    pairs.map(([pressure, density]) => ({ pressure, density }));
  test.each<[string, number | undefined, TableRow[]]>([
    ["has one row", undefined, rows([0, 1000])],
    ["repeats a pressure", 2, rows([1e9, 1000], [1e9, 1100])],
    ["falls in pressure", 3, rows([1e9, 1000], [2e9, 1100], [1.5e9, 1200])],
    ["falls in density", 2, rows([0, 1000], [1e9, 999])],
    ["begins at negative pressure", 1, rows([-1e9, 1000], [1e9, 1100])],
    ["has no density", 1, rows([0, 0], [1e9, 1100])],
    ["is not a number", 2, rows([0, 1000], [Number.NaN, 1100])],
    ["is infinite", 2, rows([0, 1000], [1e9, Number.POSITIVE_INFINITY])],
  ])("%s", (_, line, bad) => {
    const place = line === undefined ? {} : { line };
    expect(() => tabulated(bad)).toThrowError(expect.objectContaining({ code: "eos-table", place }));
  });
});
