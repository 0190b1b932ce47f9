import { erfc } from "../normal.ts";

/**
 * ln of the probability that a chi-square variable of n degrees of freedom exceeds x (0 or more), for whole n from 1:
 *   Q(1) = erfc(√(x/2)),   Q(2) = exp(-x/2),   Q(n + 2) = Q(n) + (x/2)^(n/2) exp(-x/2) / Γ(n/2 + 1)
 * and by its leading term, right to 1/x, where it leaves the double range.
 * Source  Abramowitz & Stegun 1964, 26.4.4 and 26.4.5 (closed forms), 26.4.8 (recurrence)
 */
export function logChiSquareAbove(x: number, n: number): number {
  if (n === 2) return -x / 2;
  return x < ASYMPTOTIC_FROM ? Math.log(chiSquareAbove(x, n)) : logLeadingTerm(x / 2, n);
}

/** Ends where exp(-x/2) nears the smallest double. */
const ASYMPTOTIC_FROM = 1000;

/** (x/2)^(n/2 - 1) exp(-x/2) / Γ(n/2) */
function logLeadingTerm(half: number, n: number): number {
  let log = -half + (n / 2 - 1) * Math.log(half);
  for (let k = n / 2 - 1; k > 0; k--) log -= Math.log(k);
  return n % 2 === 1 ? log - 0.5 * Math.log(Math.PI) : log;
}

function chiSquareAbove(x: number, n: number): number {
  const half = Math.max(0, x) / 2;
  const odd = n % 2 === 1;
  let degrees = odd ? 1 : 2;
  let above = odd ? erfc(Math.sqrt(half)) : Math.exp(-half);
  let term = odd ? (2 * Math.sqrt(half) * Math.exp(-half)) / Math.sqrt(Math.PI) : half * Math.exp(-half);
  for (; degrees < n; degrees += 2) {
    above += term;
    term *= half / (degrees / 2 + 1);
  }
  return above;
}
