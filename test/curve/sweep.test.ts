import { describe, expect, it } from "vitest";
import { sweepMasses } from "../../src/curve/sweep.ts";
import { solvePlanet } from "../../src/interior/solvePlanet.ts";
import { EARTH_MASS } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { planetOf } from "../support/referenceMaterials.ts";

const composition = planetOf([
  ["fe-bm3", 0.325],
  ["mantle-bm3", 0.675],
]);
const masses = (...earths: number[]): number[] => earths.map((mass) => mass * EARTH_MASS);

describe("a sweep", () => {
  it("gives the planets one would get one by one, in the order asked for", () => {
    const asked = masses(5, 0.1, 0.1, 300, 0.11, 0.12, 0.13, 7);
    const points = [...sweepMasses(composition, asked)];
    expect(points.map(({ mass }) => mass)).toEqual(asked);
    points.forEach(({ planet }, i) => {
      expectClose(planet?.radius ?? 0, solvePlanet(composition, asked[i]).radius, { rel: 1e-10, because: "one root" });
    });
  });

  it("needs hardly more than one integration a planet when masses are close", () => {
    const close = Array.from({ length: 500 }, (_, i) => 0.1 * 100 ** (i / 499) * EARTH_MASS);
    const total = [...sweepMasses(composition, close)].reduce(
      (sum, { planet }) => sum + (planet?.counters.integrations ?? 0),
      0,
    );
    expect(total / close.length).toBeLessThan(1.6);
  });

  it("records a mass that cannot be solved and goes on", () => {
    const points = [...sweepMasses(planetOf([["pv-bm4", 1]]), masses(1, 200, 2))];
    expect(points.map(({ planet }) => planet !== undefined)).toEqual([true, false, true]);
    expect(points[1].error?.code).toBe("mass-above-maximum");
  });
});
