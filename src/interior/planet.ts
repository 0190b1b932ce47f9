import type { EnvelopeConditions } from "../envelope/lopezFortney.ts";
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

/** The gas around a planet, by the published scaling, and whether it can last. SI. */
export interface Envelope {
  readonly massFraction: number;
  readonly conditions: EnvelopeConditions;
  /** The planet under the gas, solved as if that did not weigh on it. */
  readonly core: SolidPlanet;
  /** Where the gas ceases to convect, the atmosphere above not counted. */
  readonly convectiveRadius: number;
  /** Of the atmosphere [K]. */
  readonly temperature: number;
  readonly escapeParameter: number;
  /** Time in which the gas would be lost at the present rate. */
  readonly massLossTime: number;
}

/**
 * A planet in hydrostatic equilibrium. SI. With an envelope, mass, radius, gravity and density are those of the whole,
 * the radius as a transit shows it; pressures, boundaries and layers are those of the planet under the gas.
 */
export interface Planet {
  readonly composition: Composition;
  readonly mass: number;
  readonly radius: number;
  readonly centralPressure: number;
  readonly surfaceGravity: number;
  readonly bulkDensity: number;
  /** Moment of inertia over M R², 0.4 for a uniform sphere. Absent with gas: the scaling does not say where its mass is. */
  readonly inertiaFactor?: number;
  /** Energy needed to disperse the planet to infinity against gravity alone [J], positive. Absent with gas. */
  readonly bindingEnergy?: number;
  readonly boundaries: readonly Boundary[];
  /** Estimated relative error of `radius`, meant to bound the true one. Numerical error only. */
  readonly radiusRelativeError: number;
  /** Names of layers whose pressure went beyond the data behind their equation of state. */
  readonly extrapolatedLayers: readonly string[];
  /** What else a reader should know, e.g. that rock treated as solid would be molten. */
  readonly notes: readonly string[];
  readonly counters: SolverCounters;
  readonly envelope?: Envelope;
}

/** A planet without gas, which the structure equations describe throughout. */
export interface SolidPlanet extends Planet {
  readonly inertiaFactor: number;
  readonly bindingEnergy: number;
  readonly envelope?: never;
}
