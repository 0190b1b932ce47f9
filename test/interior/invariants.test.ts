import { describe, expect, it } from "vitest";
import type { Planet } from "../../src/interior/planet.ts";
import { solvePlanet } from "../../src/interior/solvePlanet.ts";
import { StructureSolver } from "../../src/interior/structureSolver.ts";
import { EARTH_MASS, GPA } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { planetOf } from "../support/referenceMaterials.ts";

/** A repeatable sequence in [0, 1): the golden-ratio sequence, no random numbers. */
const spread = (i: number, step: number): number => (i * step) % 1;

/** Invented planets that use every kind of boundary, over five decades of mass. */
const planets = Array.from({ length: 60 }, (_, i) => {
  const core = 0.05 + 0.9 * spread(i, 0.618034);
  const ice = (1 - core) * spread(i, 0.754878);
  const layers: [string, number][] = [
    [i % 2 ? "fe-vinet" : "fe-bm3", core],
    [i % 3 ? "silicate-3phase" : "sil-poly", 1 - core - ice],
    [i % 5 ? "ice-bm3" : "h2o-poly", ice],
  ];
  return {
    composition: planetOf(
      layers.filter(([, fraction]) => fraction > 0),
      i % 4 ? 0 : GPA,
    ),
    mass: 10 ** (-3 + 4 * spread(i, 0.56984)) * EARTH_MASS,
  };
});

describe("60 invented planets", () => {
  it("have a radius error below the estimate, which is below 1e-7", () => {
    for (const { composition, mass } of planets) {
      const planet = solvePlanet(composition, mass);
      const exact = new StructureSolver(composition, { tolerance: 1e-14 }).solve(mass);
      const error = Math.abs(planet.radius / exact.radius - 1);
      expect(error).toBeLessThan(planet.radiusRelativeError);
      expect(planet.radiusRelativeError).toBeLessThan(1e-7);
      expectClose(planet.centralPressure, exact.centralPressure, { rel: 1e-7, because: "promised" });
      expectClose(planet.inertiaFactor ?? Number.NaN, exact.inertiaFactor, {
        rel: 1e-7,
        because: "integrated alongside",
      });
      expectClose(planet.bindingEnergy ?? Number.NaN, exact.bindingEnergy, {
        rel: 1e-7,
        because: "integrated alongside",
      });
    }
  });

  it("keep the error estimate honest at loose settings too", () => {
    for (const { composition, mass } of planets) {
      const loose = new StructureSolver(composition, { tolerance: 1e-5 }).solve(mass);
      const exact = new StructureSolver(composition, { tolerance: 1e-14 }).solve(mass);
      expect(Math.abs(loose.radius / exact.radius - 1)).toBeLessThan(loose.radiusRelativeError);
    }
  });

  it("have pressures falling and radii rising through their boundaries, and the mass asked for inside", () => {
    for (const { composition, mass } of planets) {
      const { boundaries, radius, centralPressure } = solvePlanet(composition, mass);
      const pressures = [centralPressure, ...boundaries.map(({ pressure }) => pressure)];
      const radii = [0, ...boundaries.map((boundary) => boundary.radius)];
      for (let i = 1; i < radii.length; i++) {
        expect(pressures[i]).toBeLessThan(pressures[i - 1]);
        expect(radii[i]).toBeGreaterThan(radii[i - 1]);
      }
      const surface = boundaries.at(-1);
      expect(surface?.kind).toBe("surface");
      expectClose(surface?.radius ?? 0, radius, { rel: 1e-7, because: "the last Newton step moves the radius" });
      expectClose(surface?.enclosedMass ?? 0, mass, { rel: 1e-7, because: "the shooting's own tolerance" });
    }
  });
});

describe("layers", () => {
  const without = (planet: Planet): object => ({ ...planet, composition: null, counters: null, boundaries: null });

  it("of the same material are one layer", () => {
    const whole = solvePlanet(planetOf([["mantle-bm3", 1]]), EARTH_MASS);
    const split = solvePlanet(
      planetOf([
        ["mantle-bm3", 0.2],
        ["mantle-bm3", 0.5],
        ["mantle-bm3", 0.3],
      ]),
      EARTH_MASS,
    );
    expectClose(split.radius, whole.radius, { rel: 1e-9, because: "a boundary without a change is no change" });
    expectClose(split.centralPressure, whole.centralPressure, { rel: 1e-8, because: "the same" });
  });

  it("may be as thin as a film", () => {
    const bare = solvePlanet(planetOf([["mantle-bm3", 1]]), EARTH_MASS);
    const film = solvePlanet(
      planetOf([
        ["mantle-bm3", 1 - 1e-9],
        ["ice-bm3", 1e-9],
      ]),
      EARTH_MASS,
    );
    expect(film.radius).toBeGreaterThan(bare.radius);
    expect(film.radius / bare.radius - 1).toBeLessThan(1e-8);
  });

  it("may be as small as a pebble at the centre", () => {
    const bare = solvePlanet(planetOf([["mantle-bm3", 1]]), EARTH_MASS);
    const pebble = solvePlanet(
      planetOf([
        ["fe-vinet", 1e-12],
        ["mantle-bm3", 1 - 1e-12],
      ]),
      EARTH_MASS,
    );
    expectClose(pebble.radius, bare.radius, { rel: 1e-9, because: "a pebble" });
  });

  it("give the same planet from any starting guess", () => {
    const solver = new StructureSolver(
      planetOf([
        ["fe-vinet", 0.3],
        ["pv-bm4", 0.7],
      ]),
    );
    const cold = solver.solve(3 * EARTH_MASS);
    for (const factor of [1e-4, 0.1, 0.999, 1.5, 10]) {
      const warm = solver.solve(3 * EARTH_MASS, cold.centralPressure * factor);
      expectClose(warm.radius, cold.radius, { rel: 1e-10, because: "one root" });
      expect(warm.extrapolatedLayers).toEqual(cold.extrapolatedLayers);
    }
    expect(without(solver.solve(3 * EARTH_MASS))).toEqual(without(cold));
  });
});

it("spends a bounded number of right-hand sides", () => {
  const solver = new StructureSolver(
    planetOf([
      ["fe-bm3", 0.325],
      ["mantle-bm3", 0.675],
    ]),
  );
  const cold = solver.solve(EARTH_MASS);
  expect(cold.counters.rightHandSides).toBeLessThan(1000);
  const warm = solver.solve(EARTH_MASS, cold.centralPressure);
  expect(warm.counters.integrations).toBe(1);
  expect(warm.counters.rightHandSides).toBeLessThan(250);
});
