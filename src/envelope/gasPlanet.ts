import { ConvergenceError, ModelRangeError } from "../errors.ts";
import { equilibriumTemperature, radiusWithAtmosphere, radiusWithoutAtmosphere } from "./atmosphere.ts";
import { type EnvelopeConditions, envelopeThickness, massFractionOfThickness } from "./lopezFortney.ts";

/** Radius [m] of the planet under the envelope for its mass [kg]: any composition, solved elsewhere. */
export type CoreRadius = (coreMass: number) => number;

/**
 * What a measured radius means: where the published scaling ends, or the transit radius of a radiative atmosphere on
 * top of that. The two readings of one radius differ by up to a factor of 2 in the envelope's mass, so report both.
 */
export type RadiusReading = "convective" | "with-atmosphere";

/**
 * Radius of a planet with a gas envelope [m], by both readings.
 * Throws  ModelRangeError `envelope-grid`
 * Checked test/envelope/gasPlanet.test.ts
 */
export function gasPlanetRadius(
  massFraction: number,
  conditions: EnvelopeConditions,
  coreRadius: CoreRadius,
): Readonly<Record<RadiusReading, number>> {
  const { planetMass, flux } = conditions;
  const thickness = envelopeThickness(massFraction, conditions);
  const convective = coreRadius((1 - massFraction) * planetMass) + thickness;
  return {
    convective,
    "with-atmosphere": radiusWithAtmosphere(planetMass, convective, equilibriumTemperature(flux)),
  };
}

/**
 * Envelope mass fraction that gives a planet its radius [m], by one reading of it.
 * Throws  ModelRangeError `no-envelope` where the planet is no larger than its core, `envelope-grid`
 * Checked test/envelope/gasPlanet.test.ts
 */
export function envelopeFraction(
  radius: number,
  reading: RadiusReading,
  conditions: EnvelopeConditions,
  coreRadius: CoreRadius,
): number {
  const { planetMass, flux } = conditions;
  const convective =
    reading === "convective" ? radius : radiusWithoutAtmosphere(planetMass, radius, equilibriumTemperature(flux));
  return fractionOfConvectiveRadius(convective, conditions, coreRadius);
}

const MAX_ITERATIONS = 100;

/** The core shrinks little as the envelope takes its mass, so repeated substitution converges fast. */
function fractionOfConvectiveRadius(radius: number, conditions: EnvelopeConditions, coreRadius: CoreRadius): number {
  let massFraction = 0;
  for (let i = 0; i < MAX_ITERATIONS; i++) {
    const core = coreRadius((1 - massFraction) * conditions.planetMass);
    if (!(radius > core)) {
      throw new ModelRangeError(
        "no-envelope",
        `The planet's radius, ${radius} m up to where its gas convects, does not exceed that of its core, ${core} m: there is no room for an envelope.`,
        { quantity: "radius", value: radius, minimum: core },
      );
    }
    const next = massFractionOfThickness(radius - core, conditions);
    if (Math.abs(next - massFraction) <= 1e-13 * next) return next;
    massFraction = next;
  }
  throw new ConvergenceError("envelope-fraction", "The envelope's mass fraction did not settle.", massFraction);
}
