import { describe, expect, it } from "vitest";
import { envelopeFraction } from "../../src/envelope/gasPlanet.ts";
import { planetSolver } from "../../src/interior/planetSolver.ts";
import { solveProfile } from "../../src/interior/profile.ts";
import { solvePlanet } from "../../src/interior/solvePlanet.ts";
import type { Composition, GasEnvelope } from "../../src/library/composition.ts";
import { loadLibrary } from "../../src/library/library.ts";
import { shippedFiles } from "../../src/library/shipped.generated.ts";
import { EARTH_FLUX, EARTH_MASS, EARTH_RADIUS, G, GIGAYEAR } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";

const rocky = loadLibrary(shippedFiles).composition("earth-like");
const gas: GasEnvelope = { massFraction: 0.05, flux: EARTH_FLUX, age: 5 * GIGAYEAR, opacity: "enhanced" };
const wrapped = (changes: Partial<GasEnvelope> = {}): Composition => ({ ...rocky, envelope: { ...gas, ...changes } });
const mass = 5 * EARTH_MASS;
const rounding = { rel: 1e-12, because: "the same numbers, rounded" };

describe("a planet with a gas envelope", () => {
  const planet = solvePlanet(wrapped(), mass);
  const core = solvePlanet(rocky, 0.95 * mass);

  it("is its core, solved for the rest of the mass, and the published thickness", () => {
    // Lopez & Fortney 2014, equation 4, where all factors but that of the mass are 1: 2.06 R⊕ 5^-0.21.
    const thickness = 2.06 * EARTH_RADIUS * 5 ** -0.21;
    expectClose(planet.envelope?.convectiveRadius ?? Number.NaN, core.radius + thickness, rounding);
    expect(planet.mass).toBe(mass);
    expect(planet.centralPressure).toBe(core.centralPressure);
    expect(planet.boundaries).toEqual(core.boundaries);
  });

  it("has the radiative atmosphere in its radius, and gravity and density of the whole", () => {
    expect(planet.radius).toBeGreaterThan(planet.envelope?.convectiveRadius ?? Number.NaN);
    expectClose(planet.surfaceGravity, (G * mass) / planet.radius ** 2, rounding);
    expectClose(planet.bulkDensity, mass / ((4 / 3) * Math.PI * planet.radius ** 3), rounding);
  });

  it("does not say how mass it cannot place would turn", () => {
    expect(planet.inertiaFactor).toBeUndefined();
    expect(planet.bindingEnergy).toBeUndefined();
  });

  it("gives its envelope back from its radius", () => {
    const solver = planetSolver(rocky);
    const conditions = { ...gas, planetMass: mass, flux: EARTH_FLUX, age: 5 * GIGAYEAR };
    const coreRadius = (coreMass: number): number => solver.solve(coreMass).radius;
    expectClose(envelopeFraction(planet.radius, "with-atmosphere", conditions, coreRadius), 0.05, {
      rel: 1e-7,
      because: "core radii good to 1e-8",
    });
  });

  it("has a profile of what the equations describe, up to the gas", () => {
    const { planet: whole, points } = solveProfile(wrapped(), mass, 20);
    expect(whole.radius).toBe(planet.radius);
    expectClose(points[points.length - 1].radius, core.radius, { rel: 1e-9, because: "default settings" });
  });
});

describe("an envelope that could not survive", () => {
  const notes = (changes: Partial<GasEnvelope>, planetMass = mass): string =>
    solvePlanet(wrapped(changes), planetMass).notes.join("\n");

  it("is said so when high-energy light removes it, or its own heat", () => {
    expect(notes({ flux: 500 * EARTH_FLUX, massFraction: 0.001 })).toContain("removes it in");
    expect(notes({ flux: 900 * EARTH_FLUX }, 2 * EARTH_MASS)).toContain("escape parameter");
  });

  it("is not said of one that can", () => {
    expect(notes({}, 10 * EARTH_MASS)).toBe("");
  });
});

describe("envelopes outside what is published or given", () => {
  it.each([
    [{}, 0.9 * EARTH_MASS],
    [{}, 21 * EARTH_MASS],
    [{ massFraction: 0.21 }, mass],
    [{ massFraction: 5e-5 }, mass],
    [{ flux: 1100 * EARTH_FLUX }, mass],
    [{ age: 11 * GIGAYEAR }, mass],
  ])("%j at %d kg is refused", (changes, planetMass) => {
    expect(() => solvePlanet(wrapped(changes), planetMass)).toThrow(expect.objectContaining({ code: "envelope-grid" }));
  });

  it.each(["flux", "age"] as const)("a missing %s is asked for", (key) => {
    expect(() => planetSolver(wrapped({ [key]: undefined }))).toThrow(
      expect.objectContaining({ code: "envelope-conditions" }),
    );
  });
});
