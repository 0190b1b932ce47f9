import { describe, expect, test } from "vitest";
import { runRules } from "../../src/crosscheck/runRules.ts";
import { EARTH_RADIUS } from "../../src/units/constants.ts";
import { planetRow } from "./planetRow.ts";

type Values = Parameters<typeof planetRow>[0];

function explanations(values: Values, rule: string): string {
  const ironRadius = () => 0.8 * EARTH_RADIUS;
  const found = runRules([planetRow(values)], { ironRadius }).filter((finding) => finding.rule === rule);
  return found.map(({ explanation }) => explanation).join(" / ");
}

/** The Earth with every column that mass, radius and orbit enter. */
const earth: Values = {
  mass: [1, 0.01],
  radius: [1, 0.01],
  density: [5500, 60],
  surfaceGravity: [9.8, 0.1],
  period: [365.25, 0.1],
  semiMajorAxis: [1, 0.01],
  starMass: [1, 0.01],
};

describe("the one slip that mends a row is named the right way round", () => {
  test.each<[string, Values, string]>([
    ["mass × 317.8", { mass: [317.8, 3] }, "mass is in Earth masses and was read as Jupiter masses"],
    ["mass ÷ 317.8", { mass: [1 / 317.8, 3e-5] }, "mass is in Jupiter masses and was read as Earth masses"],
    ["radius × 11.2", { radius: [11.2, 0.1] }, "radius is in Earth radii and was read as Jupiter radii"],
    ["radius ÷ 11.2", { radius: [1 / 11.2, 1e-3] }, "radius is in Jupiter radii and was read as Earth radii"],
    ["period × 24", { period: [365.25 * 24, 2] }, "period is in hours and was read as days"],
    ["period ÷ 24", { period: [365.25 / 24, 0.01] }, "period is in days and was read as hours"],
    ["period ÷ 2π", { period: [365.25 / (2 * Math.PI), 0.01] }, "period is one radian of the orbit"],
    ["density ÷ 1000", { density: [5.5, 0.06] }, "density is a factor 1000 too small"],
  ])("%s", (_, slip, words) => {
    const explanation = explanations({ ...earth, ...slip }, "unit-slip");
    expect(explanation).toContain(words);
    expect(explanation).not.toContain("; or");
  });
});

test("without other columns, a slip to a plausible density is offered", () => {
  const shrunk = { mass: [5, 0.01], radius: [0.2, 0.001] } as const;
  expect(explanations(shrunk, "denser-than-iron")).toContain("radius is in Jupiter radii and was read as Earth radii");
});
