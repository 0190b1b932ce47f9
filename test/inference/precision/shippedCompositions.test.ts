import { describe, expect, test } from "vitest";
import { radiusCurve } from "../../../src/curve/radiusCurve.ts";
import { sweepMasses } from "../../../src/curve/sweep.ts";
import { expectedEvidence } from "../../../src/inference/precision/expectedEvidence.ts";
import { type CurvePair, contrastAt, separation } from "../../../src/inference/precision/separation.ts";
import { outerFractionFamily } from "../../../src/inference/twoPartFamily.ts";
import type { Composition } from "../../../src/library/composition.ts";
import { loadLibrary } from "../../../src/library/library.ts";
import { shippedFiles } from "../../../src/library/shipped.generated.ts";
import { EARTH_MASS } from "../../../src/units/constants.ts";
import { expectClose } from "../../support/expectClose.ts";

const library = loadLibrary(shippedFiles);
const [earthLikeComposition, waterComposition] = ["earth-like", "water"].map((name) => library.composition(name));
const range = { lightest: 0.1 * EARTH_MASS, heaviest: 30 * EARTH_MASS };

const iron = curveOf(library.composition("iron"));
const silicate = curveOf(library.composition("silicate"));
const water = curveOf(waterComposition);
const earthLike = curveOf(earthLikeComposition);
const wet = curveOf(outerFractionFamily(earthLikeComposition, waterComposition)(0.25));

/** Separations of a planet between two compositions, its radius the mean of theirs, with errors of 5 % in both. */
function separations({ a, b }: CurvePair): number[] {
  return [1, 2, 3, 5, 7, 10].map((massEarth) => {
    const mass = massEarth * EARTH_MASS;
    const radius = (a.radius(mass) + b.radius(mass)) / 2;
    const linear = separation(contrastAt({ a, b }, mass), { mass: 0.05 * mass, radius: 0.05 * radius });
    const quoted = (mode: number) => ({ mode, minus: 0.05 * mode, plus: 0.05 * mode });
    const full = expectedEvidence({ mass: quoted(mass), radius: quoted(radius) }, { a, b }, range);
    expectClose(full.separation, linear, { rel: 0.03, because: "iron and water differ by 30 % in slope" });
    return linear;
  });
}

describe("errors of 5 % in mass and radius, from 1 to 10 Earth masses", () => {
  test("tell iron, silicate and water apart pairwise at more than 4 sigma", () => {
    for (const pair of [
      { a: iron, b: silicate },
      { a: silicate, b: water },
      { a: iron, b: water },
    ]) {
      expect(Math.min(...separations(pair))).toBeGreaterThan(4);
    }
  });

  test("tell Earth-like from 25 % water on it at more than 2 sigma", () => {
    expect(Math.min(...separations({ a: earthLike, b: wet }))).toBeGreaterThan(2);
  });

  test("do not tell pure silicate from 25 % water on an Earth-like interior", () => {
    expect(Math.max(...separations({ a: silicate, b: wet }))).toBeLessThan(1);
  });
});

function curveOf(composition: Composition) {
  return radiusCurve((masses) => Array.from(sweepMasses(composition, masses), ({ planet }) => planet?.radius), range);
}
