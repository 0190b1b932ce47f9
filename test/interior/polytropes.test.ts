import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { solvePlanet } from "../../src/interior/solvePlanet.ts";
import { StructureSolver } from "../../src/interior/structureSolver.ts";
import { EARTH_MASS, G } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { classicalPolytrope, planetOf, stack, uniform } from "../support/referenceMaterials.ts";

/** Closed forms, and the numbers of the Lane–Emden equation (Chandrasekhar 1939, ch. IV). */
const laneEmden: Record<string, number[]> = JSON.parse(
  readFileSync(new URL("../fixtures/interior/lane-emden.json", import.meta.url), "utf8"),
).index;

const printed = { rel: 3e-7, because: "the table's own digits" };
const closed = { rel: 1e-9, because: "default settings against a closed form" };

describe("a uniform sphere", () => {
  const planet = solvePlanet(planetOf([[uniform(5500), 1]]), EARTH_MASS);

  it("has the closed-form radius, pressure, inertia and binding energy", () => {
    const radius = Math.cbrt(EARTH_MASS / ((4 / 3) * Math.PI * 5500));
    expectClose(planet.radius, radius, closed);
    // P = 3GM²/8πR⁴, U = 3GM²/5R
    expectClose(planet.centralPressure, (3 * G * EARTH_MASS ** 2) / (8 * Math.PI * radius ** 4), closed);
    expectClose(planet.inertiaFactor ?? Number.NaN, 0.4, closed);
    expectClose(planet.bindingEnergy ?? Number.NaN, (0.6 * G * EARTH_MASS ** 2) / radius, closed);
    expectClose(planet.bulkDensity, 5500, closed);
  });
});

describe("two uniform layers", () => {
  it("have the closed-form boundary and central pressures", () => {
    const [core, mantle, share] = [11000, 4500, 0.325];
    const planet = solvePlanet(
      planetOf([
        [uniform(core), share],
        [uniform(mantle), 1 - share],
      ]),
      EARTH_MASS,
    );
    const cubed = (mass: number, density: number): number => mass / ((4 / 3) * Math.PI * density);
    const r = Math.cbrt(cubed(share * EARTH_MASS, core));
    const R = Math.cbrt(r ** 3 + cubed((1 - share) * EARTH_MASS, mantle));
    const boundary =
      (2 / 3) * Math.PI * G * mantle ** 2 * (R * R - r * r) +
      (4 / 3) * Math.PI * G * mantle * (core - mantle) * r ** 3 * (1 / r - 1 / R);
    expectClose(planet.radius, R, closed);
    expectClose(planet.boundaries[0].radius, r, closed);
    expectClose(planet.boundaries[0].pressure, boundary, closed);
    expectClose(planet.centralPressure, boundary + (2 / 3) * Math.PI * G * core ** 2 * r ** 2, closed);
    const inertia = ((8 * Math.PI) / 15) * (core * r ** 5 + mantle * (R ** 5 - r ** 5));
    expectClose(planet.inertiaFactor ?? Number.NaN, inertia / (EARTH_MASS * R * R), closed);
  });
});

describe("P = K ρ²", () => {
  it("has a radius √(πK/2G) whatever the mass", () => {
    const K = 2.6e5;
    for (const mass of [0.01, 1, 300]) {
      const { radius } = solvePlanet(planetOf([[stack(classicalPolytrope(1, K)), 1]]), mass * EARTH_MASS);
      expectClose(radius, Math.sqrt((Math.PI * K) / (2 * G)), closed);
    }
  });
});

describe.each([
  [0.5, 3e-3],
  [1, 2.6e5],
  [1.5, 3e6],
  [2, 2e7],
])("the polytrope of index %d", (index, K) => {
  const planet = solvePlanet(planetOf([[stack(classicalPolytrope(index, K)), 1]]), EARTH_MASS);
  const [xi, slope, concentration, pressure] = laneEmden[String(index)];

  it("has the central pressure and concentration of the Lane–Emden equation", () => {
    const { mass, radius, centralPressure, bulkDensity } = planet;
    expectClose((centralPressure * radius ** 4) / (G * mass * mass), pressure, printed);
    const centralDensity = (centralPressure / K) ** (index / (index + 1));
    expectClose(centralDensity / bulkDensity, concentration, printed);
  });

  it("has the radius that follows from K", () => {
    const centralDensity = (planet.centralPressure / K) ** (index / (index + 1));
    const scale = Math.sqrt((((index + 1) * K) / (4 * Math.PI * G)) * centralDensity ** (1 / index - 1));
    expectClose(planet.radius, scale * xi, { rel: 1e-6, because: "promised where density goes to 0 at the surface" });
    expectClose(planet.mass, 4 * Math.PI * scale ** 3 * centralDensity * slope, { rel: 1e-6, because: "the same" });
  });

  it("has the binding energy 3/(5 - n) G M²/R", () => {
    // Chandrasekhar 1939, ch. IV, eq. 90.
    const { bindingEnergy, mass, radius } = planet;
    expectClose(bindingEnergy ?? Number.NaN, ((3 / (5 - index)) * G * mass * mass) / radius, closed);
  });
});

describe("the polytrope of index 3", () => {
  const K = 1e9;
  const solver = new StructureSolver(planetOf([[stack(classicalPolytrope(3, K)), 1]]));
  const [, slope, , pressure] = laneEmden["3"];

  it("holds one mass whatever the central pressure", () => {
    const only = 4 * Math.PI * slope * (K / (Math.PI * G)) ** 1.5;
    for (const centralPressure of [1e10, 1e12]) {
      const planet = solver.fromCentralPressure(centralPressure);
      expectClose(planet.mass, only, printed);
      expectClose((planet.centralPressure * planet.radius ** 4) / (G * planet.mass ** 2), pressure, printed);
    }
  });

  it("cannot be asked for by mass, and says which mass it has", () => {
    const only = 4 * Math.PI * slope * (K / (Math.PI * G)) ** 1.5;
    expect(() => solver.solve(EARTH_MASS)).toThrow(
      expect.objectContaining({ code: "mass-independent-of-pressure", maximum: expect.closeTo(only, -25) }),
    );
  });
});

it("refuses a polytrope that no central pressure can hold up in a stable way", () => {
  const composition = planetOf([[stack(classicalPolytrope(3.5, 1e7)), 1]]);
  expect(() => solvePlanet(composition, EARTH_MASS)).toThrow(expect.objectContaining({ code: "no-central-pressure" }));
});
