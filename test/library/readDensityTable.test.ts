import { describe, expect, test } from "vitest";
import { readDensityTable } from "../../src/library/readDensityTable.ts";

describe("a density table", () => {
  test("is CSV with a header, in any order of columns, with comments and empty lines", () => {
    const text = "\uFEFF# from nowhere\n\ndensity_kg_m3, pressure_gpa, note\n1000, 0, a\n# more\n1500, 2.5, b\n";
    expect(readDensityTable("t.csv", text)).toEqual([
      { pressure: 0, density: 1000 },
      { pressure: 2.5e9, density: 1500 },
    ]);
  });

  test("without a needed column says what it found", () => {
    expect(() => readDensityTable("t.csv", "#\npressure,density_kg_m3\n0,1\n")).toThrowError(
      expect.objectContaining({
        code: "library-table",
        place: { file: "t.csv", line: 2 },
        found: "pressure,density_kg_m3",
      }),
    );
  });

  test.each([
    ["text", "0,1000\n1,dense\n", "dense"],
    ["an empty cell", "0,1000\n1,\n", ""],
    ["a short row", "0,1000\n1\n", ""],
    ["an infinite number", "0,1000\n1,Infinity\n", "Infinity"],
  ])("with %s in it names file, line and column", (_, rows, found) => {
    expect(() => readDensityTable("t.csv", `pressure_gpa,density_kg_m3\n${rows}`)).toThrowError(
      expect.objectContaining({
        code: "library-table",
        place: { file: "t.csv", line: 3, column: "density_kg_m3" },
        found,
      }),
    );
  });
});
