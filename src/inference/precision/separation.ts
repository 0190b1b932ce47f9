import type { MassRange, RadiusCurve } from "../../curve/radiusCurve.ts";

/** Two compositions that a measurement shall tell apart. */
export interface CurvePair {
  readonly a: RadiusCurve;
  readonly b: RadiusCurve;
}

/** What two compositions do at one mass: all that a linear forecast needs of them. */
export interface Contrast {
  /** |R_A(M) - R_B(M)| [m]. */
  readonly gap: number;
  /** |dR/dM| [m/kg], the mean of both curves. */
  readonly slope: number;
}

/** One-sigma errors of mass [kg] and radius [m]; infinite for what is not measured. */
export interface ErrorSizes {
  readonly mass: number;
  readonly radius: number;
}

export type LimitingError = "mass" | "radius";

/** Half the step in ln M of a slope: its own error, of second order, and the interpolation's stay below 1e-4. */
const SLOPE_STEP = 0.01;

export function contrastAt({ a, b }: CurvePair, mass: number): Contrast {
  return {
    gap: Math.abs(a.radius(mass) - b.radius(mass)),
    slope: Math.abs(slopeAt(a, mass) + slopeAt(b, mass)) / 2,
  };
}

/**
 * Separation of two compositions in sigma, for errors that are small and normal:
 *   |R_A(M) - R_B(M)| / sqrt(σ_R² + (dR/dM σ_M)²)
 * The mass enters by the radius it predicts. The curves are taken as straight and parallel within the mass error, so the
 * formula fails where R(M) bends within it (a relative error above about 30 %), where the slopes of the two differ as much
 * as they do themselves, and near a composition's largest radius; `expectedEvidence` does not assume it.
 * Checked test/inference/precision/separation.test.ts
 */
export function separation(contrast: Contrast, errors: ErrorSizes): number {
  return contrast.gap / Math.hypot(errors.radius, contrast.slope * errors.mass);
}

/** The share, 0 to 1, of the variance under a separation that the mass error brings. */
export function massShare({ slope }: Contrast, errors: ErrorSizes): number {
  return 1 / (1 + (errors.radius / (slope * errors.mass)) ** 2);
}

/** The error that does more to hide the difference. */
export function limitingError(contrast: Contrast, errors: ErrorSizes): LimitingError {
  return massShare(contrast, errors) > 0.5 ? "mass" : "radius";
}

/** Masses that both compositions, and whatever else is compared, describe. */
export function sharedRange(parts: readonly MassRange[]): MassRange {
  return {
    lightest: Math.max(...parts.map(({ lightest }) => lightest)),
    heaviest: Math.min(...parts.map(({ heaviest }) => heaviest)),
  };
}

function slopeAt(curve: RadiusCurve, mass: number): number {
  const below = Math.max(curve.lightest, mass * Math.exp(-SLOPE_STEP));
  const above = Math.min(curve.heaviest, mass * Math.exp(SLOPE_STEP));
  return (curve.radius(above) - curve.radius(below)) / (above - below);
}
