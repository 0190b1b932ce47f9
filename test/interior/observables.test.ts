import { describe, expect, it } from "vitest";
import { coreRadiusFraction, escapeSpeed, planetLoveNumber } from "../../src/interior/observables.ts";
import { solvePlanet } from "../../src/interior/solvePlanet.ts";
import { loadLibrary } from "../../src/library/library.ts";
import { shippedFiles } from "../../src/library/shipped.generated.ts";
import { EARTH_MASS } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { classicalPolytrope, planetOf, stack, uniform } from "../support/referenceMaterials.ts";

const library = loadLibrary(shippedFiles);

describe("the Love number of a solved planet", () => {
  it("is 3/2 for a uniform one", () => {
    expectClose(planetLoveNumber(solvePlanet(planetOf([[uniform(5500), 1]]), EARTH_MASS)) ?? Number.NaN, 1.5, {
      rel: 1e-12,
      because: "exact",
    });
  });

  it("is 15/π² - 1 for P = Kρ², whose density ends at zero", () => {
    const planet = solvePlanet(planetOf([[stack(classicalPolytrope(1, 2081)), 1]]), EARTH_MASS);
    expectClose(planetLoveNumber(planet) ?? Number.NaN, 15 / Math.PI ** 2 - 1, {
      rel: 1e-5,
      because: "500 rows, linear in between",
    });
  });

  it("is that of PREM within 1 % for the shipped Earth", () => {
    const earth = solvePlanet(library.composition("earth"), EARTH_MASS);
    // Radau–Clairaut equation over the polynomials of PREM: 0.9331.
    expectClose(planetLoveNumber(earth) ?? Number.NaN, 0.9331, { rel: 0.01, because: "a model, not PREM itself" });
  });
});

describe("the core's share of the radius", () => {
  it("is that of its boundary", () => {
    const core = planetOf([
      [uniform(10000), 0.5],
      [uniform(5000), 0.5],
    ]);
    // Volumes of the two halves of the mass are as 1 to 2.
    expectClose(coreRadiusFraction(solvePlanet(core, EARTH_MASS)) ?? Number.NaN, Math.cbrt(1 / 3), {
      rel: 1e-9,
      because: "default settings",
    });
  });

  it("is none where there is but one layer", () => {
    expect(coreRadiusFraction(solvePlanet(library.composition("iron"), EARTH_MASS))).toBeUndefined();
  });
});

it("escapes the Earth at 11.18 km/s", () => {
  // √(2GM/R) of the nominal GM and equatorial radius, IAU 2015 B3: 11179.907 m/s.
  const planet = { ...solvePlanet(library.composition("iron"), EARTH_MASS), radius: 6378100 };
  expectClose(escapeSpeed(planet), 11179.907, { rel: 1e-7, because: "eight digits" });
});
