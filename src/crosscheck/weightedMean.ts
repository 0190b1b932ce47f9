import type { MeasuredQuantity } from "../planets/quantity.ts";
import { hasBothErrors } from "./significance.ts";

/** Inverse-variance mean of independent measurements. */
export interface WeightedMean {
  readonly value: number;
  /** Standard error, enlarged by √(χ²/(n − 1)) where the values scatter more than their errors allow. */
  readonly error: number;
  readonly chiSquare: number;
  readonly count: number;
}

/**
 * Weighted mean of the measured values with errors on both sides, each error the mean of its two sides; undefined
 * without any. Values from the same data are not independent: the error is then too small.
 * Source  scale factor of the Particle Data Group, Review of Particle Physics, introduction, §5.2.2 (number from memory)
 */
export function weightedMean(quantities: readonly MeasuredQuantity[]): WeightedMean | undefined {
  const usable = quantities.filter((quantity) => quantity.kind === "measured" && hasBothErrors(quantity));
  if (usable.length === 0) return undefined;
  const weights = usable.map(({ minus = 0, plus = 0 }) => (2 / (minus + plus)) ** 2);
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const weighted = (f: (value: number) => number) =>
    usable.reduce((sum, quantity, i) => sum + (weights[i] ?? 0) * f(quantity.value), 0);
  const value = weighted((x) => x) / total;
  const chiSquare = weighted((x) => (x - value) ** 2);
  const scale = usable.length > 1 ? Math.max(1, Math.sqrt(chiSquare / (usable.length - 1))) : 1;
  return { value, error: scale / Math.sqrt(total), chiSquare, count: usable.length };
}
