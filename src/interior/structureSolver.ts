import { ConvergenceError, ModelRangeError } from "../errors.ts";
import type { Composition } from "../library/composition.ts";
import { EARTH_MASS, G, GPA } from "../units/constants.ts";
import { guessCentralPressure } from "./centralPressureGuess.ts";
import type { Planet } from "./planet.ts";
import { TrialIntegration } from "./trialIntegration.ts";

/** Masses the solver is built and tested for [kg]: 1e-3 to 1e3 Earth masses. */
export const MASS_RANGE = { minimum: 1e-3 * EARTH_MASS, maximum: 1e3 * EARTH_MASS } as const;

/** Allowed relative error of one integration step; the default meets 1e-8 in radius with room to spare. */
export const DEFAULT_TOLERANCE = 3e-10;
/** Tolerance while the central pressure is still far off. */
const COARSE_TOLERANCE = 1e-6;
/** A Newton step below this in ln P_c ends the shooting; its first-order effect on the radius is applied. */
const ACCEPTED_STEP = 1e-8;
/** Below this Newton step the coarse tolerance would only waste a round. */
const NEARLY_THERE = 1e-3;
const MAX_ROUNDS = 200;
/** Derivative d ln M / d ln P_c that counts as none: the mass does not depend on the central pressure. */
const NO_RESPONSE = 1e-7;
/**
 * How far the sum of estimated local errors may be amplified on its way to the radius. Measured: the true error of
 * 400 random planets stays below the estimate (test/interior/radiusError.test.ts).
 */
const ERROR_AMPLIFICATION = 2;
const ROUND_OFF = 2e-14;

/** What the shooting knows about where the root ln P_c lies. */
interface Bracket {
  low: number;
  high: number;
  /** Largest logMassExcess seen on the falling or limiting side, for the maximum-mass message. */
  bestExcess: number;
  broken: boolean;
}

/**
 * Finds the planets of one composition by shooting in ln P_c: the trial mass inside the surface pressure must equal the
 * mass asked for. Newton's method with the integrated sensitivity, inside a bracket that keeps to the stable branch
 * (mass growing with central pressure), so that below a maximum mass the low-pressure root is the one returned.
 * Keeps work space and is not re-entrant: one solver per composition and thread.
 */
export class StructureSolver {
  readonly composition: Composition;
  private readonly trial: TrialIntegration;
  private readonly tolerance: number;

  constructor(composition: Composition, options: { tolerance?: number } = {}) {
    this.composition = composition;
    this.trial = new TrialIntegration(composition);
    this.tolerance = options.tolerance ?? DEFAULT_TOLERANCE;
  }

  /**
   * The planet of `mass` [kg]. `guess` is a central pressure [Pa], e.g. extrapolated from the last planet of a sweep.
   * Throws ModelRangeError: `mass-range`; `mass-above-maximum` (maximum = that mass) where no stable planet exists;
   *   `mass-independent-of-pressure` where every central pressure gives one and the same mass;
   *   ConvergenceError `structure-not-converged` with the best central pressure so far.
   */
  solve(mass: number, guess?: number): Planet {
    if (!(mass >= MASS_RANGE.minimum * (1 - 1e-12) && mass <= MASS_RANGE.maximum * (1 + 1e-12))) {
      throw massOutOfRange(mass);
    }
    const { trial } = this;
    const evaluationsBefore = trial.evaluations;
    const runsBefore = trial.runs;
    const { logPressure, lastStep } = this.shoot(mass, Math.log(guess ?? guessCentralPressure(this.composition, mass)), guess !== undefined);
    return this.planet(mass, logPressure, lastStep, {
      integrations: trial.runs - runsBefore,
      rightHandSides: trial.evaluations - evaluationsBefore,
    });
  }

  private shoot(mass: number, start: number, warm: boolean): { logPressure: number; lastStep: number } {
    const { trial } = this;
    const bracket: Bracket = { low: -Infinity, high: Infinity, bestExcess: -Infinity, broken: false };
    let x = start;
    let fine = warm;
    for (let round = 0; round < MAX_ROUNDS; round++) {
      trial.integrator.tolerance = fine ? this.tolerance : COARSE_TOLERANCE;
      const outcome = trial.run(mass, Math.exp(x));
      if (outcome === "stuck") break;
      const step = outcome === "surface" ? -trial.logMassExcess / trial.logMassExcessSlope : Number.NaN;
      if (outcome === "surface" && fine && Math.abs(step) <= ACCEPTED_STEP) return { logPressure: x, lastStep: step };
      this.narrow(bracket, mass, x, outcome);
      if (bracket.high - bracket.low < 1e-11 * Math.abs(x)) throw this.aboveMaximum(mass, bracket);
      fine ||= Math.abs(step) < NEARLY_THERE;
      x = nextTrial(bracket, x, step);
    }
    throw new ConvergenceError(
      "structure-not-converged",
      `No central pressure found for ${this.describe(mass)} within ${MAX_ROUNDS} trials. ` +
        "Please report the composition: this should not happen.",
      { centralPressure: Math.exp(x) },
    );
  }

  /** Decides on which side of the stable root the trial at x lies. */
  private narrow(bracket: Bracket, mass: number, x: number, outcome: string): void {
    const { logMassExcess: excess, logMassExcessSlope: slope } = this.trial;
    if (outcome === "exhausted") {
      bracket.low = Math.max(bracket.low, x);
      return;
    }
    if (outcome === "beyond-form") {
      bracket.broken = true;
      bracket.high = Math.min(bracket.high, x);
      return;
    }
    if (Math.abs(slope) < NO_RESPONSE) throw this.massIndependent(mass, excess);
    bracket.bestExcess = Math.max(bracket.bestExcess, excess);
    if (excess < 0 && slope > 0) bracket.low = Math.max(bracket.low, x);
    else bracket.high = Math.min(bracket.high, x);
  }

  private planet(mass: number, logPressure: number, lastStep: number, counters: Planet["counters"]): Planet {
    const { trial, composition } = this;
    // The last Newton step is not integrated again: its first-order effect is enough at this size.
    const radiusSquared = trial.radiusSquared + trial.radiusSquaredSlope * lastStep;
    const radius = Math.sqrt(radiusSquared);
    const response = Math.abs(trial.radiusSquaredSlope / radiusSquared / trial.logMassExcessSlope);
    return {
      composition,
      mass,
      radius,
      centralPressure: Math.exp(logPressure + lastStep),
      surfaceGravity: (G * mass) / radiusSquared,
      bulkDensity: mass / ((4 / 3) * Math.PI * radius ** 3),
      inertiaFactor: trial.inertia / (mass * radiusSquared),
      bindingEnergy: trial.bindingEnergy,
      boundaries: trial.boundaries,
      radiusRelativeError:
        ERROR_AMPLIFICATION * (1 + response) * trial.integrator.errorSum + lastStep * lastStep + ROUND_OFF,
      extrapolatedLayers: trial.extrapolated,
      counters,
    };
  }

  private describe(mass: number): string {
    return `${this.composition.name} at ${earthMasses(mass)}`;
  }

  private massIndependent(mass: number, excess: number): ModelRangeError {
    const only = mass * Math.exp(excess);
    return new ModelRangeError(
      "mass-independent-of-pressure",
      `${this.describe(mass)}: every central pressure of this composition gives the same mass, ${earthMasses(only)}. ` +
        "Give a central pressure instead of a mass.",
      { quantity: "mass", value: mass, minimum: only, maximum: only },
    );
  }

  private aboveMaximum(mass: number, bracket: Bracket): ModelRangeError {
    const maximum = mass * Math.exp(bracket.bestExcess);
    const why = bracket.broken
      ? `the equation of state of ${this.brokenForm()} ends there`
      : "beyond it a higher central pressure holds less mass, so no stable planet exists";
    return new ModelRangeError(
      "mass-above-maximum",
      `${this.describe(mass)} is above the largest mass this composition can have, ${earthMasses(maximum)}: ${why}. ` +
        "Ask for a smaller mass, or use materials that are continued to higher pressure.",
      { quantity: "mass", value: mass, maximum },
    );
  }

  private brokenForm(): string {
    const broken = this.trial.brokenPhase;
    if (broken === undefined) return "a layer";
    const { layer, phase } = broken;
    return `${layer.name}, phase ${phase.name}, at ${(phase.curve.maxPressure / GPA).toPrecision(4)} GPa`;
  }
}

/** Newton's step where it stays inside the bracket, otherwise bisection or a growing stride towards the open end. */
function nextTrial(bracket: Bracket, x: number, step: number): number {
  const newton = x + Math.max(-2, Math.min(2, step));
  if (newton > bracket.low && newton < bracket.high) return newton;
  if (bracket.low === -Infinity) return x - 2;
  if (bracket.high === Infinity) return x + 1;
  return (bracket.low + bracket.high) / 2;
}

function earthMasses(mass: number): string {
  return `${(mass / EARTH_MASS).toPrecision(5)} Earth masses`;
}

function massOutOfRange(mass: number): ModelRangeError {
  return new ModelRangeError(
    "mass-range",
    `A mass of ${earthMasses(mass)} is outside the range the solver is made for, 0.001 to 1000 Earth masses.`,
    { quantity: "mass", value: mass, minimum: MASS_RANGE.minimum, maximum: MASS_RANGE.maximum },
  );
}
