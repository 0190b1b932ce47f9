import type { Composition } from "../library/composition.ts";

/** A place where material or phase changes, from the centre outwards. SI. */
export interface Boundary {
  readonly kind: "layer" | "phase" | "surface";
  /** Layer and phase just below. */
  readonly layer: string;
  readonly phase: string;
  readonly enclosedMass: number;
  readonly radius: number;
  readonly pressure: number;
  /** Just below; absent where the equation of state follows no temperature. */
  readonly temperature?: number;
}

/** Work done, for tests that count it and for benchmarks. */
export interface SolverCounters {
  readonly integrations: number;
  readonly rightHandSides: number;
}

/** A planet in hydrostatic equilibrium. SI. */
export interface Planet {
  readonly composition: Composition;
  readonly mass: number;
  readonly radius: number;
  readonly centralPressure: number;
  readonly surfaceGravity: number;
  readonly bulkDensity: number;
  /** Moment of inertia over M R², 0.4 for a uniform sphere. */
  readonly inertiaFactor: number;
  /** Energy needed to disperse the planet to infinity against gravity alone [J], positive. */
  readonly bindingEnergy: number;
  readonly boundaries: readonly Boundary[];
  /** Estimated relative error of `radius`, meant to bound the true one. Numerical error only. */
  readonly radiusRelativeError: number;
  /** Names of layers whose pressure went beyond the data behind their equation of state. */
  readonly extrapolatedLayers: readonly string[];
  /** What else a reader should know, e.g. that rock treated as solid would be molten. */
  readonly notes: readonly string[];
  readonly counters: SolverCounters;
}
