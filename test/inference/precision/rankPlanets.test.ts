import { describe, expect, test } from "vitest";
import { expectedReduction, planetWorth, rankPlanets } from "../../../src/inference/precision/rankPlanets.ts";
import { quantity, rowWith } from "../planetRows.ts";
import { straightFamily, straightLine, wholeRange } from "./straightLines.ts";

const models = {
  a: straightLine(0.8, 0.02),
  b: straightLine(1.1, 0.02),
  family: straightFamily(0.02),
  range: wholeRange,
};
const worth = (massError: number, radiusError: number) =>
  planetWorth(
    rowWith({
      mass: quantity(5, { minus: massError, plus: massError }),
      radius: quantity(1.05, { minus: radiusError, plus: radiusError }),
    }),
    models,
    ["mass", "radius"],
  );

describe("planetWorth", () => {
  test("finds the error that is worth halving", () => {
    expect(worth(2, 0.005)).toMatchObject({ best: { improved: "mass" } });
    expect(worth(0.1, 0.02)).toMatchObject({ best: { improved: "radius" } });
  });

  test("refuses a row with the reasons of classify", () => {
    const lone = rowWith({ radius: quantity(1, { minus: 0.1, plus: 0.1 }) });
    expect(planetWorth(lone, models, ["mass"])).toEqual({ row: lone, reasons: ["mass-missing"] });
    const heavy = rowWith({
      mass: quantity(5e3, { minus: 1, plus: 1 }),
      radius: quantity(1, { minus: 0.1, plus: 0.1 }),
    });
    expect(planetWorth(heavy, models, ["mass"])).toEqual({ row: heavy, reasons: ["mass-beyond-models"] });
    const blurred = rowWith({
      mass: quantity(500, { minus: 300, plus: 300 }),
      radius: quantity(1, { minus: 0.1, plus: 0.1 }),
    });
    expect(planetWorth(blurred, models, ["mass"])).toMatchObject({ reasons: ["mass-beyond-models"] });
  });
});

describe("rankPlanets", () => {
  test("puts what is worth most first, and what cannot be ranked last", () => {
    const refused = planetWorth(rowWith({}), models, ["mass"]);
    const precise = worth(0.01, 0.001);
    const improvable = worth(0.01, 0.03);
    expect(rankPlanets([refused, precise, improvable])).toEqual([improvable, precise, refused]);
    if (improvable.reasons !== undefined) throw new Error("a planet with mass and radius can be ranked");
    expect(expectedReduction(improvable)).toBeGreaterThan(0);
  });

  test("keeps the order of the list among equals", () => {
    const equals = [rowWith({}, ["a"]), rowWith({}, ["b"])].map((row) => planetWorth(row, models, ["mass"]));
    expect(rankPlanets(equals)).toEqual(equals);
  });
});
