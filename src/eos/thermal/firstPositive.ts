import { ConvergenceError } from "../../errors.ts";

/** No planet's centre exceeds this pressure [Pa]: the search ends here. */
const HIGHEST_PRESSURE = 1e15;
const MARGIN = 1.05;
const GROWTH = 1.5;
const MAX_ITERATIONS = 100;

/**
 * The pressure at which a function that rises through zero once does so, at or above `from`; undefined if not below
 * `top`. `guess` is where to look first.
 * Source  regula falsi in its Illinois variant, Dowell & Jarratt 1971, BIT 11, 168
 * Checked test/eos/thermal/warmStack.test.ts
 */
export function firstPositive(
  excess: (pressure: number) => number,
  from: number,
  guess: number,
  top: number,
): number | undefined {
  const limit = Math.min(top, HIGHEST_PRESSURE);
  let low = from;
  let below = excess(low);
  if (below >= 0) return low;
  let high = Math.min(guess * MARGIN, limit);
  let above = excess(high);
  while (above < 0) {
    if (high === limit) return undefined;
    [low, below] = [high, above];
    high = Math.min(high * GROWTH, limit);
    above = excess(high);
  }
  let lastSide = 0;
  for (let i = 0; i < MAX_ITERATIONS; i++) {
    const middle = high - (above * (high - low)) / (above - below);
    const value = excess(middle);
    if (Math.abs(value) <= 1e-13 * middle || high - low <= 1e-14 * high) return middle;
    const side = Math.sign(value);
    // Halving the value kept on the other side stops one end of the bracket from sticking.
    if (value > 0) {
      [high, above] = [middle, value];
      if (side === lastSide) below /= 2;
    } else {
      [low, below] = [middle, value];
      if (side === lastSide) above /= 2;
    }
    lastSide = side;
  }
  throw new ConvergenceError("phase-boundary", `No phase boundary found between ${low} and ${high} Pa.`, high);
}
