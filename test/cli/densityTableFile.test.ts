import { expect, test } from "vitest";
import { parseDensityTable } from "../../src/cli/densityTableFile.ts";

test("rows become an SI table in their order; comments and other columns are ignored", () => {
  const text = "\ufeff# a comment\nlayer,radius_km,density_kg_m3\ncore,0,13000\ncore,3480,9900\nmantle,3480, 5566\n";
  expect(parseDensityTable(text, "t.csv")).toEqual({
    radius: [0, 3.48e6, 3.48e6],
    density: [13000, 9900, 5566],
  });
});

test.each([
  ["an empty file", "", "empty-table", /radius_km, density_kg_m3/],
  ["a header alone", "radius_km,density_kg_m3\n", "empty-table", /no rows/],
  [
    "missing columns",
    "radius_km,rho\n0,1\n",
    "missing-columns",
    /has the columns radius_km, rho. Needed: radius_km, density_kg_m3/,
  ],
  [
    "text in a number",
    "radius_km,density_kg_m3\n0,1\n5,heavy\n",
    "not-a-number",
    /t.csv, line 3, column density_kg_m3: found "heavy"/,
  ],
  ["an empty cell", "radius_km,density_kg_m3\n0,\n", "not-a-number", /line 2/],
  ["a ragged row", "radius_km,density_kg_m3\n0,1,2\n", "csv-syntax", /line 2/],
  ["an open quote", 'radius_km,density_kg_m3\n0,"1\n', "csv-syntax", /Quote/],
])("%s is an error that says what is needed", (_, text, code, message) => {
  expect(() => parseDensityTable(text, "t.csv")).toThrow(
    expect.objectContaining({ code, message: expect.stringMatching(message) }),
  );
});
