import { normalBelow } from "./normal.ts";

/**
 * A measurement with two error sizes, read as the split-normal (two-piece normal) likelihood of the true value x:
 *   L(x) ∝ exp(-z²/2),   z = (x - mode)/minus below the mode, (x - mode)/plus above it.
 * The mode is the quoted value, so L is continuous and equally high on both sides: the side with the larger error
 * holds the share plus/(minus + plus) of the area. With equal errors it is the normal distribution.
 * Source  Wallis 2014, Statist. Sci. 29, 106 (history and moments; from memory)
 * Checked test/inference/splitNormal.test.ts
 */
export interface SplitNormal {
  readonly mode: number;
  readonly minus: number;
  readonly plus: number;
}

/** Signed distance from the mode in units of the error on that side. */
export function deviation(of: SplitNormal, x: number): number {
  return (x - of.mode) / (x < of.mode ? of.minus : of.plus);
}

/** The x that lies `deviations` errors above (negative: below) the mode. */
export function atDeviation(of: SplitNormal, deviations: number): number {
  return of.mode + deviations * (deviations < 0 ? of.minus : of.plus);
}

/** Share of the area between `from` and `to` (infinite allowed), accurate where both lie in the same tail. */
export function shareBetween(of: SplitNormal, from: number, to: number): number {
  const lower = from < of.mode ? shareBelow(of, Math.min(to, of.mode)) - shareBelow(of, from) : 0;
  const upper = to > of.mode ? shareAbove(of, Math.max(from, of.mode)) - shareAbove(of, to) : 0;
  return lower + upper;
}

/** For x at or below the mode. */
function shareBelow(of: SplitNormal, x: number): number {
  return ((2 * of.minus) / (of.minus + of.plus)) * normalBelow((x - of.mode) / of.minus);
}

/** For x at or above the mode. */
function shareAbove(of: SplitNormal, x: number): number {
  return ((2 * of.plus) / (of.minus + of.plus)) * normalBelow((of.mode - x) / of.plus);
}
