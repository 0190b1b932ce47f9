import { describe, expect, it } from "vitest";
import { envelopeFraction, gasPlanetRadius } from "../../src/envelope/gasPlanet.ts";
import type { EnvelopeConditions } from "../../src/envelope/lopezFortney.ts";
import { constants, EARTH_MASS, EARTH_RADIUS } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";

const GYR = 1e9 * constants.julianYear.value;
/** Earth-like cores by the fit of Zeng et al. 2016 (ApJ 819, 127), core mass fraction 0.325. */
const rocky = (mass: number): number => 6.371e6 * (1.07 - 0.21 * 0.325) * (mass / EARTH_MASS) ** (1 / 3.7);

const conditions: EnvelopeConditions = {
  planetMass: 5 * EARTH_MASS,
  flux: 100 * 1361,
  age: 5 * GYR,
  opacity: "enhanced",
};

describe("gas planets", () => {
  it("have the radius that gives back their envelope", () => {
    for (const fraction of [0.001, 0.02, 0.15]) {
      const radii = gasPlanetRadius(fraction, conditions, rocky);
      for (const reading of ["convective", "with-atmosphere"] as const) {
        expectClose(envelopeFraction(radii[reading], reading, conditions, rocky), fraction, {
          rel: 1e-11,
          because: "inverse, ill-conditioned where the envelope is thin",
        });
      }
    }
  });

  it("come within a factor of 2.5 of a published structure model of a sub-Neptune", () => {
    // GJ 1214 b: 8.17 M⊕, 2.742 R⊕, envelope 5.24 (+0.30/-0.29) % on an Earth-like core (Cloutier et al. 2021, AJ 162,
    // 174). Its flux is about 17 times the Earth's (from memory); its age, not known well, 5 Gyr.
    const planet = { ...conditions, planetMass: 8.17 * EARTH_MASS, flux: 17 * 1361 };
    const convective = envelopeFraction(2.742 * EARTH_RADIUS, "convective", planet, rocky);
    expect(0.0524 / convective).toBeGreaterThan(1 / 2.5);
    expect(0.0524 / convective).toBeLessThan(2.5);
  });

  it("need about half the envelope with the atmosphere on top, where they are small and hot", () => {
    const hot = { ...conditions, planetMass: 2 * EARTH_MASS, flux: 500 * 1361 };
    const [bare, topped] = (["convective", "with-atmosphere"] as const).map((reading) =>
      envelopeFraction(2.2 * EARTH_RADIUS, reading, hot, rocky),
    );
    expect(bare / topped).toBeGreaterThan(1.5);
  });

  it("refuse radii without room for gas", () => {
    expect(() => envelopeFraction(1.4 * EARTH_RADIUS, "with-atmosphere", conditions, rocky)).toThrow(
      expect.objectContaining({ code: "no-envelope" }),
    );
    expect(() => envelopeFraction(1.56 * EARTH_RADIUS, "with-atmosphere", conditions, rocky)).toThrow(
      expect.objectContaining({ code: expect.stringMatching(/envelope/) }),
    );
    expect(() => envelopeFraction(9 * EARTH_RADIUS, "with-atmosphere", conditions, rocky)).toThrow(
      expect.objectContaining({ code: "envelope-grid" }),
    );
  });
});
