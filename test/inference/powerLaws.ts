import type { RadiusCurve } from "../../src/curve/radiusCurve.ts";
import type { PlanetFamily } from "../../src/inference/fractionPosterior.ts";
import type { Measurement } from "../../src/inference/measurement.ts";
import type { SplitNormal } from "../../src/inference/splitNormal.ts";

export const range = { lightest: 1e-3, heaviest: 1e3 };

/** R = a M^b, in any units. */
export function powerLaw(a: number, b = 0.27): RadiusCurve {
  return { ...range, radius: (mass) => a * mass ** b, massWithRadius: (radius) => (radius / a) ** (1 / b) };
}

/** The boundaries and the family of test/fixtures/inference. */
export const boundaries = [powerLaw(0.8), powerLaw(1.1), powerLaw(1.4)];
export const family: PlanetFamily = { ...range, member: (f) => powerLaw(1.1 - 0.3 * f) };

export function quoted(value: number, minus: number, plus = minus): SplitNormal {
  return { mode: value, minus, plus };
}

export function measurement(mass: SplitNormal, radius: SplitNormal): Measurement {
  return { mass, radius };
}
