import type { MassRange, RadiusCurve } from "../../curve/radiusCurve.ts";

/** What is known of a planet, as the likelihood of its true mass [kg] and radius [m]. */
export interface PlanetLikelihood {
  /** ln L, 0 where all data are met exactly. */
  logLikelihood(mass: number, radius: number): number;
  /** The largest ln L that any radius gives a planet of this mass. */
  logBest(mass: number): number;
  /** The masses of `range` that the data leave possible; lightest above heaviest if there are none. */
  massWindow(range: MassRange): MassRange;
  /** Masses where ln L along a curve may bend sharply; undefined or outside the window is ignored. */
  kinks(curve: RadiusCurve): readonly (number | undefined)[];
  /** How many numbers were measured. */
  readonly dataCount: number;
}

/** What is thought of true masses before the measurement: flat, or flat in the logarithm. */
export type MassPrior = "flat" | "log-flat";

/** ln of the prior density of a mass, but for a constant. */
export function logMassPrior(prior: MassPrior, mass: number): number {
  return prior === "flat" ? 0 : -Math.log(mass);
}
