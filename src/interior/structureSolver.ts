import { ConvergenceError, InputError } from "../errors.ts";
import type { Composition } from "../library/composition.ts";
import { G } from "../units/constants.ts";
import { guessCentralPressure } from "./centralPressureGuess.ts";
import {
  MASS_RANGE,
  massAboveMaximum,
  massIndependentOfPressure,
  massOutOfRange,
  noCentralPressure,
} from "./massErrors.ts";
import type { Planet, SolidPlanet } from "./planet.ts";
import { type Shot, shoot } from "./shooting.ts";
import { type Stretch, TrialIntegration } from "./trialIntegration.ts";

/** Allowed relative error of one integration step; the default meets 1e-8 in radius with room to spare. */
export const DEFAULT_TOLERANCE = 1e-9;
const ROUND_OFF = 2e-14;
/** How closely a maximum mass is pinned down, relative. */
const MAXIMUM_MASS_PRECISION = 1e-6;
const ROUNDS = 100;

/**
 * Planets of one composition. Keeps work space and what it learned of a maximum mass, and is not re-entrant: one
 * solver per composition and thread.
 */
export class StructureSolver {
  readonly composition: Composition;
  private readonly trial: TrialIntegration;
  private readonly tolerance: number;
  /** The largest mass that can be solved [kg] and the phase that sets it, known once a mass beyond was asked for. */
  private maximum: { readonly mass: number; readonly broken: Stretch | undefined } | undefined;

  /** Throws InputError `composition-empty` for a composition without layers. */
  constructor(composition: Composition, options: { tolerance?: number } = {}) {
    if (composition.layers.length === 0) {
      throw new InputError("composition-empty", `Composition ${composition.name} has no layer with mass in it.`);
    }
    this.composition = composition;
    this.trial = new TrialIntegration(composition);
    this.tolerance = options.tolerance ?? DEFAULT_TOLERANCE;
  }

  /**
   * The planet of `mass` [kg]. `guess` is a central pressure [Pa] close to the right one, e.g. extrapolated along a
   * sweep. Below a maximum mass the stable planet (mass growing with central pressure) is the one returned.
   * Throws  ModelRangeError `mass-range`; `mass-above-maximum` (with that mass); `mass-independent-of-pressure`, e.g.
   *         for a polytrope of index 3; `no-central-pressure`. ConvergenceError `structure-not-converged`.
   * Checked test/interior/structureReference.test.ts, polytropes.test.ts, maximumMass.test.ts
   */
  solve(mass: number, guess?: number): SolidPlanet {
    const { trial } = this;
    if (!(mass >= MASS_RANGE.minimum * (1 - 1e-12) && mass <= MASS_RANGE.maximum * (1 + 1e-12))) {
      throw massOutOfRange(mass);
    }
    if (this.maximum !== undefined && mass > this.maximum.mass) {
      throw massAboveMaximum(this.composition.name, mass, this.maximum.mass, this.maximum.broken);
    }
    const before = { integrations: trial.runs, rightHandSides: trial.evaluations };
    const shot = this.shoot(mass, guess);
    if (shot.outcome !== "found") throw this.failure(mass, shot);
    return this.planet(mass, shot.logPressure, shot.lastStep, before);
  }

  /**
   * The planet that a central pressure [Pa] holds up; the only way to ask for a body whose mass does not depend on it.
   * Throws  ConvergenceError `structure-not-converged` where that pressure makes no planet of this composition.
   */
  fromCentralPressure(centralPressure: number): SolidPlanet {
    const { trial } = this;
    const before = { integrations: trial.runs, rightHandSides: trial.evaluations };
    trial.integrator.tolerance = this.tolerance;
    // Layers are shares of the total mass, so that mass must be known to place them: iterate to a fixed point.
    let mass = MASS_RANGE.maximum;
    for (let round = 0; round < ROUNDS; round++) {
      const outcome = trial.run(mass, centralPressure);
      if (outcome !== "surface") mass /= 2;
      else if (Math.abs(trial.logMassExcess) < 1e-13) return this.planet(mass, Math.log(centralPressure), 0, before);
      else mass *= Math.exp(trial.logMassExcess);
    }
    throw new ConvergenceError(
      "structure-not-converged",
      `A central pressure of ${centralPressure} Pa makes no planet of ${this.composition.name}.`,
    );
  }

  private shoot(mass: number, guess?: number): Shot {
    const start = Math.log(guess ?? guessCentralPressure(this.composition, mass));
    return shoot(this.trial, mass, start, { tolerance: this.tolerance, warm: guess !== undefined });
  }

  private planet(mass: number, logPressure: number, lastStep: number, before: Planet["counters"]): SolidPlanet {
    const { trial, composition } = this;
    // The last Newton step is not integrated again: its first-order effect is enough at this size.
    const radiusSquared = trial.radiusSquared + trial.radiusSquaredSlope * lastStep;
    const radius = Math.sqrt(radiusSquared);
    // An error in mass is made up for by central pressure, which moves the radius.
    const response = lastStep === 0 ? 0 : Math.abs(trial.radiusSquaredSlope / radiusSquared / trial.logMassExcessSlope);
    // The estimated local errors add up to more than the true error of the radius: test/interior/invariants.test.ts
    const integrationError = (1 + response) * trial.integrator.errorSum;
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
      radiusRelativeError: integrationError + ROUND_OFF,
      extrapolatedLayers: trial.extrapolated,
      notes: [],
      counters: {
        integrations: trial.runs - before.integrations,
        rightHandSides: trial.evaluations - before.rightHandSides,
      },
    };
  }

  private failure(mass: number, shot: Exclude<Shot, { outcome: "found" }>): Error {
    const { name } = this.composition;
    switch (shot.outcome) {
      case "independent":
        return massIndependentOfPressure(name, mass, mass * Math.exp(shot.excess));
      case "out-of-bounds":
        return noCentralPressure(name, mass);
      case "above-maximum":
        this.maximum = { broken: this.trial.brokenPhase, mass: this.findMaximum(mass, shot.excess) };
        return massAboveMaximum(name, mass, this.maximum.mass, this.maximum.broken);
      case "not-converged":
        return new ConvergenceError(
          "structure-not-converged",
          `No central pressure found for ${name} at ${mass} kg. This should not happen: please report the composition.`,
          { centralPressure: Math.exp(shot.logPressure) },
        );
    }
  }

  /**
   * The largest mass that can be solved, from one that cannot and by how much it failed (ln of mass held over mass
   * asked). For one layer that settles it; with more, layers grow with the mass asked, so it is approached.
   */
  private findMaximum(unsolvable: number, excess: number): number {
    let solvable = 0;
    let above = unsolvable;
    let candidate = unsolvable * held(excess);
    for (let round = 0; round < ROUNDS && above > solvable * (1 + 2 * MAXIMUM_MASS_PRECISION); round++) {
      const shot = this.shoot(candidate);
      if (shot.outcome === "found") {
        // The first one found is often the maximum itself: look just above it before halving the gap.
        const justAbove = solvable === 0;
        solvable = candidate;
        candidate = justAbove ? solvable * (1 + MAXIMUM_MASS_PRECISION) : Math.sqrt(solvable * above);
      } else {
        above = candidate;
        const share = shot.outcome === "above-maximum" ? held(shot.excess) : 0.5;
        candidate = solvable > 0 ? Math.sqrt(solvable * above) : candidate * share;
      }
    }
    return solvable;
  }
}

/** Share of the mass asked for that the best trial held; half where no trial reached a surface at all. */
function held(excess: number): number {
  return excess === -Infinity ? 0.5 : Math.min(Math.exp(excess), 1 - MAXIMUM_MASS_PRECISION);
}
