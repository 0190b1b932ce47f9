import type { MeasuredQuantity } from "../planets/quantity.ts";

/**
 * Relative error taken for a value that states none: the rms rounding error of the worst value of two digits,
 * 0.05/√3 on 1.0.
 */
export const ASSUMED_RELATIVE_ERROR = 0.03;

/**
 * Findings begin here [standard errors]. A list of ten thousand tested values holds 27 beyond 3 sigma by chance, but
 * only one beyond 4.
 */
export const SIGNIFICANT = 4;

/** Distances in ln(value) to the two ends of the one-sigma interval. */
export interface LogErrors {
  readonly minus: number;
  readonly plus: number;
}

/**
 * One-sigma interval of a positive value in its logarithm. A side not given is taken from the other, or else from
 * the assumed error; zero means rounded, not certain. An interval that reaches zero has no lower end: no disagreement
 * on that side can be significant.
 */
export function logErrors(quantity: MeasuredQuantity): LogErrors {
  const { value } = quantity;
  const assumed = ASSUMED_RELATIVE_ERROR * value;
  const minus = positive(quantity.minus) ?? positive(quantity.plus) ?? assumed;
  const plus = positive(quantity.plus) ?? positive(quantity.minus) ?? assumed;
  return {
    minus: minus < value ? -Math.log1p(-minus / value) : Number.POSITIVE_INFINITY,
    plus: Math.log1p(plus / value),
  };
}

/** The error if it is one, i.e. finite and above zero. */
export function positive(error: number | undefined): number | undefined {
  return error !== undefined && error > 0 && Number.isFinite(error) ? error : undefined;
}

/** Whether a value states an error on both sides that can be used. */
export function hasBothErrors(quantity: MeasuredQuantity): boolean {
  return positive(quantity.minus) !== undefined && positive(quantity.plus) !== undefined;
}

/**
 * Difference of two independent values over their combined standard error, using of each the side that faces the
 * other; undefined where either has no error on that side. Errors in common (the same star, the same data) are ignored.
 */
export function tensionSigma(a: MeasuredQuantity, b: MeasuredQuantity): number | undefined {
  const errorA = positive(a.value > b.value ? a.minus : a.plus);
  const errorB = positive(a.value > b.value ? b.plus : b.minus);
  return errorA && errorB ? (a.value - b.value) / Math.hypot(errorA, errorB) : undefined;
}
