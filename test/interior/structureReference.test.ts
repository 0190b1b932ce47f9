import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { StructureSolver } from "../../src/interior/structureSolver.ts";
import { EARTH_MASS } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { planetOf } from "../support/referenceMaterials.ts";

/** 30 planets by an independent SciPy integration, see test/fixtures/interior/README.md. */
const rows = readFileSync(new URL("../fixtures/interior/structure-reference.csv", import.meta.url), "utf8")
  .trim()
  .split("\n")
  .slice(1)
  .map((line) => {
    const [name, layers, mass, pressure, radius, , centralPressure, boundaries] = line.split(",");
    return {
      name: `${name} at ${mass} Earth masses`,
      layers: layers.split(";").map((text): [string, number] => {
        const [material, fraction] = text.trim().split(":");
        return [material, Number(fraction)];
      }),
      mass: Number(mass) * EARTH_MASS,
      surfacePressure: Number(pressure),
      radius: Number(radius),
      centralPressure: Number(centralPressure),
      boundaries: boundaries.split("|").map((text) => {
        const [kind, q, r, p] = text.trim().split(" ");
        const value = (field: string): number => Number(field.split("=")[1]);
        return { kind, q: value(q), radius: value(r), pressure: value(p) };
      }),
    };
  });

describe.each(rows)("$name", ({ layers, mass, surfacePressure, radius, centralPressure, boundaries }) => {
  const planet = new StructureSolver(planetOf(layers, surfacePressure)).solve(mass);

  it("has the reference radius and central pressure", () => {
    expectClose(planet.radius, radius, { rel: 1e-8, because: "promised at default settings; reference good to 1e-9" });
    expectClose(planet.centralPressure, centralPressure, { rel: 1e-7, because: "promised at default settings" });
  });

  it("has an error estimate between the true error and the promise", () => {
    // The reference's own error, 1e-9 at most, is allowed on top.
    expect(planet.radiusRelativeError + 1e-9).toBeGreaterThan(Math.abs(planet.radius / radius - 1));
    expect(planet.radiusRelativeError).toBeLessThan(1e-8);
  });

  it("crosses its boundaries where the reference does", () => {
    expect(planet.boundaries.map(({ kind }) => (kind === "surface" ? "layer" : kind))).toEqual(
      boundaries.map(({ kind }) => kind),
    );
    boundaries.forEach((expected, i) => {
      const found = planet.boundaries[i];
      expectClose(found.radius, expected.radius, { rel: 1e-7, because: "printed to 0.1 m" });
      expectClose(found.enclosedMass / mass, expected.q, { rel: 1e-7, because: "printed to 1e-8" });
      const surface = i === boundaries.length - 1;
      if (!surface) expectClose(found.pressure, expected.pressure, { rel: 5e-7, because: "printed to 7 digits" });
    });
  });
});
