import { describe, expect, it } from "vitest";
import {
  type EnvelopeConditions,
  envelopeThickness,
  massFractionOfThickness,
} from "../../src/envelope/lopezFortney.ts";
import { constants, EARTH_MASS, EARTH_RADIUS } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";

const GYR = 1e9 * constants.julianYear.value;
const earthLike: EnvelopeConditions = {
  planetMass: EARTH_MASS,
  flux: 1361,
  age: 5 * GYR,
  opacity: "enhanced",
};

describe("envelopeThickness", () => {
  it("is 2.06 Earth radii where every factor is 1", () => {
    // Lopez & Fortney 2014, equation 4.
    expectClose(envelopeThickness(0.05, earthLike), 2.06 * EARTH_RADIUS, { rel: 1e-14, because: "the prefactor" });
  });

  it("has the published exponents", () => {
    const base = envelopeThickness(0.05, earthLike);
    const exact = { rel: 1e-13, because: "powers" };
    expectClose(envelopeThickness(0.1, earthLike) / base, 2 ** 0.59, exact);
    expectClose(envelopeThickness(0.05, { ...earthLike, planetMass: 8 * EARTH_MASS }) / base, 8 ** -0.21, exact);
    expectClose(envelopeThickness(0.05, { ...earthLike, flux: 100 * 1361 }) / base, 100 ** 0.044, exact);
    expectClose(envelopeThickness(0.05, { ...earthLike, age: GYR }) / base, 5 ** 0.18, exact);
    const solar = { ...earthLike, opacity: "solar" } as const;
    expectClose(envelopeThickness(0.05, { ...solar, age: GYR }) / base, 5 ** 0.11, exact);
  });

  it("inverts", () => {
    for (const fraction of [1e-4, 0.003, 0.05, 0.2]) {
      const thickness = envelopeThickness(fraction, earthLike);
      expectClose(massFractionOfThickness(thickness, earthLike), fraction, { rel: 1e-13, because: "closed form" });
    }
  });

  it.each([
    [0.3, {}, "massFraction"],
    [0.00005, {}, "massFraction"],
    [Number.NaN, {}, "massFraction"],
    [0.05, { planetMass: 0.9 * EARTH_MASS }, "planetMass"],
    [0.05, { planetMass: 21 * EARTH_MASS }, "planetMass"],
    [0.05, { flux: 100 }, "flux"],
    [0.05, { flux: 2e6 }, "flux"],
    [0.05, { age: 0.05 * GYR }, "age"],
    [0.05, { age: 12 * GYR }, "age"],
  ])("refuses what the grid does not cover: %d %o", (fraction, change, quantity) => {
    expect(() => envelopeThickness(fraction, { ...earthLike, ...change })).toThrow(
      expect.objectContaining({ code: "envelope-grid", quantity }),
    );
  });
});
