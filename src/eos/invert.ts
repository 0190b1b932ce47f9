/** An increasing function of y, its slope, and where to look for a solution. */
export interface IncreasingFunction {
  value(y: number): number;
  slope(y: number): number;
}

/**
 * The y in [low, high] at which an increasing function takes the value `target`: Newton's method, replaced by
 * bisection (or doubling while `high` is Infinity) whenever a step would leave the bracket or does not halve.
 *
 * The caller makes sure that a solution exists; if there is none an end of the bracket, or NaN, comes back. A step
 * below 1e-10 ends the iteration: convergence is quadratic, so the error left is rounding, except at a turning point,
 * where the step itself bounds it.
 */
export function invertIncreasing(
  f: IncreasingFunction,
  target: number,
  bracket: { low: number; high: number; guess: number },
): number {
  let { low, high, guess: y } = bracket;
  let lastStep = Number.POSITIVE_INFINITY;
  for (;;) {
    const excess = f.value(y) - target;
    if (!(excess > 0 || excess < 0)) return y;
    if (excess > 0) high = y;
    else low = y;
    const newton = y - excess / f.slope(y);
    if (Math.abs(newton - y) <= 1e-10 * y) return newton;
    const trusted = newton > low && newton < high && Math.abs(newton - y) <= 0.5 * lastStep;
    const next = trusted ? newton : high === Number.POSITIVE_INFINITY ? 2 * y : 0.5 * (low + high);
    if (next === low || next === high || next === y) return y;
    lastStep = Math.abs(next - y);
    y = next;
  }
}
