import type { TrialIntegration } from "./trialIntegration.ts";

/** How the search for a central pressure ended; `excess` is the largest ln(mass held / mass asked) seen. */
export type Shot =
  | { readonly outcome: "found"; readonly logPressure: number; readonly lastStep: number }
  | { readonly outcome: "above-maximum"; readonly excess: number }
  | { readonly outcome: "independent"; readonly excess: number }
  | { readonly outcome: "out-of-bounds" }
  | { readonly outcome: "not-converged"; readonly logPressure: number };

/** Tolerance of an integration step while the central pressure is still far off. */
const COARSE_TOLERANCE = 1e-6;
/** Below this Newton step the coarse tolerance would only waste a round. */
const NEARLY_THERE = 1e-3;
/** A Newton step below this in ln P_c, or below the tolerance of an integration step, ends the search. */
const ACCEPTED_STEP = 1e-9;
const MAX_ROUNDS = 200;
/** A mass excess below this many times the summed error estimate has no trustworthy sign. */
const SIGN_MARGIN = 30;
/** d ln M / d ln P_c that counts as none: the mass does not depend on the central pressure. */
const NO_RESPONSE = 1e-5;
/** The bracket is closed when it is this narrow, relative. */
const CLOSED = 1e-11;
/** Bounds of ln P_c [Pa], far outside anything that could be a planet. */
const LOWEST = -25;
const HIGHEST = 60;

/** Where the stable root lies, as far as known. */
interface Bracket {
  low: number;
  high: number;
  bestExcess: number;
}

/**
 * Searches ln P_c for the planet of `mass`: Newton's method with the sensitivity that the trial integrates alongside,
 * inside a bracket that keeps to the stable branch, where mass grows with central pressure. A trial holding too little
 * mass with a rising slope lies below the root, anything else above it; so where no root exists the bracket closes on
 * the maximum. The trial is left as its last run.
 */
export function shoot(
  trial: TrialIntegration,
  mass: number,
  start: number,
  { tolerance, warm }: { tolerance: number; warm: boolean },
): Shot {
  const bracket: Bracket = { low: -Infinity, high: Infinity, bestExcess: -Infinity };
  trial.brokenPhase = undefined;
  let x = start;
  let fine = warm;
  const accepted = Math.max(ACCEPTED_STEP, tolerance);
  for (let round = 0; round < MAX_ROUNDS; round++) {
    trial.integrator.tolerance = fine ? tolerance : COARSE_TOLERANCE;
    const held = trial.run(mass, Math.exp(x)) === "surface";
    const step = held ? -trial.logMassExcess / trial.logMassExcessSlope : Number.NaN;
    if (held && fine && Math.abs(step) <= accepted) return { outcome: "found", logPressure: x, lastStep: step };
    if (held && round === 0 && Math.abs(trial.logMassExcessSlope) < NO_RESPONSE) {
      return { outcome: "independent", excess: trial.logMassExcess };
    }
    narrow(bracket, trial, x);
    const closed = bracket.high - bracket.low < CLOSED * Math.abs(x);
    if (closed && bracket.bestExcess < 0) return { outcome: "above-maximum", excess: bracket.bestExcess };
    fine ||= Math.abs(step) < NEARLY_THERE;
    x = nextTrial(bracket, x, step);
    if (!(x > LOWEST && x < HIGHEST)) return { outcome: "out-of-bounds" };
  }
  return { outcome: "not-converged", logPressure: x };
}

/** Decides on which side of the stable root the trial at x lies. */
function narrow(bracket: Bracket, trial: TrialIntegration, x: number): void {
  const { outcome, logMassExcess: excess, logMassExcessSlope: slope } = trial;
  if (outcome === "exhausted") {
    bracket.low = Math.max(bracket.low, x);
    return;
  }
  if (outcome !== "surface") {
    // Beyond what a form can describe, or so near its turn-over that the integrator gives up.
    bracket.high = Math.min(bracket.high, x);
    return;
  }
  bracket.bestExcess = Math.max(bracket.bestExcess, excess);
  // So close to the root the sign may be the integration's own error, which must not shut the root out.
  if (slope > 0 && Math.abs(excess) < SIGN_MARGIN * trial.integrator.errorSum) return;
  if (excess < 0 && slope > 0) bracket.low = Math.max(bracket.low, x);
  else bracket.high = Math.min(bracket.high, x);
}

/** Newton's step where it stays inside the bracket, otherwise bisection or a stride towards the open end. */
function nextTrial(bracket: Bracket, x: number, step: number): number {
  const newton = x + Math.max(-2, Math.min(2, step));
  if (newton > bracket.low && newton < bracket.high) return newton;
  if (bracket.low === -Infinity) return x - 2;
  if (bracket.high === Infinity) return x + 1;
  return (bracket.low + bracket.high) / 2;
}
