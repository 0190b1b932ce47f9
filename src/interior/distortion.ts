import { ModelRangeError } from "../errors.ts";
import { G } from "../units/constants.ts";

/** Shape of a planet that keeps one face to its star. SI. */
export interface SynchronousFigure {
  /** Half axes: towards the star, along the orbit, and along the axis of rotation. */
  readonly substellar: number;
  readonly orbital: number;
  readonly polar: number;
  /** Of the disc seen in transit, when the star is right behind: √(orbital · polar). */
  readonly transitRadius: number;
}

/** Of h2 q: what is of second order in it reaches 1 % here, and a fluid planet is near being torn apart. */
const LARGEST_DISTORTION = 0.1;

/**
 * The figure that tide and rotation give a planet in hydrostatic equilibrium on a circular orbit of this period [s].
 * Formula half axes R (1 + 7/6 h2 q), R (1 - 1/3 h2 q), R (1 - 5/6 h2 q) about the volumetric radius R, h2 = 1 + k2,
 *         q = (2π/T)² R³/(G M); by Kepler's third law the star's mass cancels but for the planet's share of it
 * Source  first order of hydrostatic figures; in these terms Correia 2014, Astron. Astrophys. 570, L5 (from memory)
 * Range   h2 q up to 0.1; relative error of the transit radius about (h2 q)², of the substellar axis 3 (h2 q)²
 * Throws  ModelRangeError `distortion-range`
 * Checked Roche ellipsoids: test/interior/distortion.test.ts
 */
export function synchronousFigure(
  { mass, radius }: { readonly mass: number; readonly radius: number },
  fluidLoveNumber: number,
  period: number,
): SynchronousFigure {
  const q = ((2 * Math.PI) / period) ** 2 * (radius ** 3 / (G * mass));
  const distortion = (1 + fluidLoveNumber) * q;
  if (!(distortion <= LARGEST_DISTORTION)) {
    throw new ModelRangeError(
      "distortion-range",
      `Tide and rotation distort this planet by h2 q = ${distortion.toPrecision(3)}; the first-order figure holds up to ${LARGEST_DISTORTION}. Use a longer period.`,
      { quantity: "h2 q", value: distortion, maximum: LARGEST_DISTORTION },
    );
  }
  const orbital = radius * (1 - distortion / 3);
  const polar = radius * (1 - (5 / 6) * distortion);
  return { substellar: radius * (1 + (7 / 6) * distortion), orbital, polar, transitRadius: Math.sqrt(orbital * polar) };
}
