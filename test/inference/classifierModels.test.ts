import { describe, expect, test } from "vitest";
import { classifier } from "../../src/inference/classifier.ts";
import { buildClassifierModels, standardFamilies } from "../../src/inference/classifierModels.ts";
import { solvePlanet } from "../../src/interior/solvePlanet.ts";
import { loadLibrary } from "../../src/library/library.ts";
import { shippedFiles } from "../../src/library/shipped.generated.ts";
import { EARTH_MASS } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { quantity, rowWith } from "./planetRows.ts";

const library = loadLibrary(shippedFiles);
const parts = {
  iron: library.composition("iron"),
  silicate: library.composition("silicate"),
  water: library.composition("water"),
  earthLike: library.composition("earth-like"),
};
const families = standardFamilies(parts);
const range = { lightest: EARTH_MASS, heaviest: 8 * EARTH_MASS };
const models = buildClassifierModels({ ...parts, ...families }, range);

describe("buildClassifierModels with the shipped compositions", () => {
  test("measures its interpolation errors and keeps them small", () => {
    for (const curve of [models.iron, models.silicate, models.water]) expect(curve.relativeError).toBeLessThan(1e-6);
    for (const grid of [models.ironSilicate, models.waterOnEarthLike]) {
      expect(grid.relativeError).toBeLessThan(1e-4);
      expect(grid.rootMeanSquareError).toBeLessThan(1.5e-5);
    }
  });

  test("has families that end in their parts", () => {
    const mass = 3.21 * EARTH_MASS;
    const tolerance = { rel: 1e-4, because: "interpolation of the grid" };
    expectClose(models.ironSilicate.member(1).radius(mass), models.iron.radius(mass), tolerance);
    expectClose(models.ironSilicate.member(0).radius(mass), models.silicate.radius(mass), tolerance);
    expectClose(models.waterOnEarthLike.member(1).radius(mass), models.water.radius(mass), tolerance);
    expectClose(models.waterOnEarthLike.member(0).radius(mass), solvePlanet(parts.earthLike, mass).radius, tolerance);
  });

  test("gives a planet made by the solver its fraction back", () => {
    const mass = 4 * EARTH_MASS;
    const { classify } = classifier(models);
    const classified = (radius: number) => {
      const sharp = (value: number, error: number) => quantity(value, { minus: error * value, plus: error * value });
      const result = classify(rowWith({ mass: sharp(mass, 1e-5), radius: sharp(radius, 1e-4) }));
      if (!result.verdict) throw new Error(result.reasons.join());
      return result;
    };
    const rocky = classified(solvePlanet(families.ironSilicateFamily(0.6), mass).radius);
    expect(rocky.verdict.code).toBe("iron-silicate");
    expect(Math.abs(rocky.coreMassFraction.median - 0.6)).toBeLessThan(rocky.coreMassFraction.plus);
    const wet = classified(solvePlanet(families.waterOnEarthLikeFamily(0.4), mass).radius);
    expect(wet.verdict.code).toBe("silicate-water");
    expect(Math.abs(wet.waterMassFraction.median - 0.4)).toBeLessThan(wet.waterMassFraction.plus);
  });
});
