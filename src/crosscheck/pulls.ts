import type { QuantityName } from "../planets/quantity.ts";
import { groupBy } from "./groupBy.ts";
import type { QuantityTension } from "./tension.ts";

/** Tensions of one quantity over a whole list. With errors as quoted they would be normal deviates. */
export interface PullSummary {
  readonly quantity: QuantityName;
  /** Independent pairs; identical values are left out. */
  readonly count: number;
  readonly identical: number;
  readonly mean: number;
  readonly chiSquare: number;
  /** χ² as a standard normal deviate: beyond ±3 the quoted errors are too small (+) or too large, or not independent (−). */
  readonly chiSquareSigma: number;
  /** Expected 0.0027. */
  readonly fractionBeyond3Sigma: number;
}

/** Pulls by quantity, in the order of first appearance; quantities without an independent pair with errors are left out. */
export function summarisePulls(tensions: readonly QuantityTension[]): PullSummary[] {
  const groups = groupBy(tensions, ({ quantity }) => quantity);
  return [...groups.values()].flatMap((group) => summarise(group));
}

function summarise(group: readonly QuantityTension[]): PullSummary[] {
  const independent = group.filter(({ identical }) => !identical);
  const pulls = independent.flatMap(({ tensionSigma }) => (tensionSigma === undefined ? [] : [tensionSigma]));
  const [first] = group;
  if (!first || pulls.length === 0) return [];
  const count = pulls.length;
  const chiSquare = pulls.reduce((sum, pull) => sum + pull * pull, 0);
  return [
    {
      quantity: first.quantity,
      count,
      identical: group.length - independent.length,
      mean: pulls.reduce((sum, pull) => sum + pull, 0) / count,
      chiSquare,
      chiSquareSigma: normalDeviate(chiSquare, count),
      fractionBeyond3Sigma: pulls.filter((pull) => Math.abs(pull) > 3).length / count,
    },
  ];
}

/**
 * The normal deviate that is as improbable as a χ² of n degrees of freedom: cube root of χ²/n, whose mean is
 * 1 − 2/9n and variance 2/9n.
 * Source  Wilson & Hilferty 1931, PNAS 17, 684 (from memory); better than 0.05 within ±3 from n = 3
 */
function normalDeviate(chiSquare: number, n: number): number {
  const variance = 2 / (9 * n);
  return (Math.cbrt(chiSquare / n) - 1 + variance) / Math.sqrt(variance);
}
