import { describe, expect, it } from "vitest";
import { type ProfilePoint, solveProfile } from "../../src/interior/profile.ts";
import { EARTH_MASS, G } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { planetOf } from "../support/referenceMaterials.ts";

const layered = planetOf([
  ["fe-vinet", 0.325],
  ["silicate-3phase", 0.675],
]);

/** Values of `of` at 201 even points, without the boundary points that come on top. */
function even(points: ProfilePoint[], radius: number): ProfilePoint[] {
  return Array.from({ length: 201 }, (_, i) => (radius * i) / 200).map((r) =>
    points.reduce((best, point) => (Math.abs(point.radius - r) < Math.abs(best.radius - r) ? point : best)),
  );
}

describe("a profile", () => {
  const { planet, points } = solveProfile(layered, EARTH_MASS, 201);

  it("runs from the centre to the surface at evenly spaced radii", () => {
    even(points, planet.radius).forEach(({ radius }, i) => {
      expect(Math.abs(radius - (planet.radius * i) / 200)).toBeLessThan(1e-9 * planet.radius);
    });
    expect(points[0]).toMatchObject({ radius: 0, enclosedMass: 0, gravity: 0, layer: "fe-vinet" });
    expectClose(points[0].pressure, planet.centralPressure, { rel: 1e-12, because: "the same integration" });
    const surface = points[points.length - 1];
    expectClose(surface.enclosedMass, EARTH_MASS, { rel: 1e-12, because: "the shooting converged" });
    expectClose(surface.radius, planet.radius, { rel: 1e-10, because: "the same integration" });
    expect(surface.pressure).toBe(0);
  });

  it("shows both sides of every boundary: pressure and mass continuous, density not", () => {
    const sides = points.flatMap((point, i) => (i > 0 && point.radius === points[i - 1].radius ? [i] : []));
    expect(sides).toHaveLength(3);
    for (const i of sides) {
      const [below, above] = [points[i - 1], points[i]];
      expectClose(above.pressure, below.pressure, { rel: 1e-12, because: "continuous" });
      expectClose(above.enclosedMass, below.enclosedMass, { rel: 1e-12, because: "continuous" });
      expect(above.density).toBeLessThan(below.density);
      expect([above.layer, above.phase]).not.toEqual([below.layer, below.phase]);
    }
  });

  it("is in hydrostatic balance and conserves mass, by differences inside every stretch", () => {
    for (let i = 1; i < points.length - 1; i++) {
      const [before, here, after] = points.slice(i - 1, i + 2);
      if (before.phase !== after.phase || before.layer !== after.layer || here.radius < 0.1 * planet.radius) continue;
      const dr = after.radius - before.radius;
      const skew = Math.abs((after.radius + before.radius - 2 * here.radius) / dr);
      if (skew > 1e-6) continue;
      const because = "second-order difference over 1/100 of the radius";
      expectClose((after.pressure - before.pressure) / dr, -here.density * here.gravity, { rel: 5e-3, because });
      const shell = 4 * Math.PI * here.radius ** 2 * here.density;
      expectClose((after.enclosedMass - before.enclosedMass) / dr, shell, { rel: 5e-3, because });
      expectClose(here.gravity, (G * here.enclosedMass) / here.radius ** 2, { rel: 1e-14, because: "definition" });
    }
  });

  it("agrees with itself whatever the number of points", () => {
    const coarse = solveProfile(layered, EARTH_MASS, 11).points;
    for (const point of coarse) {
      const twin = points.find(
        ({ radius, density }) => Math.abs(radius - point.radius) < 1 && density === point.density,
      );
      const near = twin ?? points.find(({ radius }) => Math.abs(radius - point.radius) < 1e-3);
      expectClose(near?.density ?? 0, point.density, { rel: 1e-9, because: "points are integrated, not interpolated" });
    }
  });
});

it("handles a density that vanishes at the surface, and a surface pressure", () => {
  const { points } = solveProfile(
    planetOf(
      [
        ["sil-poly", 0.5],
        ["h2o-poly", 0.5],
      ],
      1e9,
    ),
    EARTH_MASS,
    50,
  );
  expect(points.at(-1)?.pressure).toBeCloseTo(1e9, 3);
  expect(points.every(({ density, pressure }) => density > 0 && pressure >= 1e9 - 1e-3)).toBe(true);
});
