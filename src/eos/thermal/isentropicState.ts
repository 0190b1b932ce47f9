import { ConvergenceError } from "../../errors.ts";
import { unstable } from "./helmholtzEos.ts";
import type { Member } from "./thermalState.ts";

/** State of a mixture whose members share pressure and temperature. */
export interface SharedState {
  readonly temperature: number;
  /** Coordinates of the members on their reference curves. */
  readonly coordinates: readonly number[];
  readonly density: number;
}

const MAX_ITERATIONS = 60;
/** Convergence is quadratic: relative steps this small leave errors of their square. */
const LAST_STEP = 1e-6;

/**
 * The state with a given entropy [J kg^-1 K^-1] at a pressure [Pa], from a guess: Newton's method for the temperature
 * and all densities at once, so that every round needs each member's energy just once.
 * With δ for the change of one round: δ ln ρ_i = (P - P_i - ∂P_i/∂T δT)/K_i for every member, and δT from
 *   Σ w (S_i + c_V,i δT/T - (∂P_i/∂T / ρ_i) δ ln ρ_i) = S
 * Throws  ModelRangeError `thermal-unstable`
 * Checked test/eos/thermal/temperaturePaths.test.ts
 */
export function isentropicState(
  members: readonly Member[],
  pressure: number,
  entropy: number,
  guess: { temperature: number; coordinates: readonly number[] },
): SharedState {
  let { temperature } = guess;
  const y = [...guess.coordinates];
  for (let round = 0; round < MAX_ITERATIONS; round++) {
    const states = members.map(({ phase }, i) => phase.helmholtz(y[i], temperature));
    let missing = entropy;
    let heatCapacityP = 0;
    for (let i = 0; i < members.length; i++) {
      const { phase, amount } = members[i];
      const state = states[i];
      if (!(state.bulkModulus > 0)) throw unstable(pressure, temperature);
      const perDensity = state.pressureSlope / (phase.reference.density(y[i]) * state.bulkModulus);
      missing -= amount * (state.entropy - perDensity * (pressure - state.pressure));
      heatCapacityP += amount * (state.heatCapacity + temperature * perDensity * state.pressureSlope);
    }
    const warming = missing / heatCapacityP;
    let largest = Math.abs(warming);
    for (let i = 0; i < members.length; i++) {
      const { pressure: reached, pressureSlope, bulkModulus } = states[i];
      const step = members[i].phase.step(y[i], pressure - reached - pressureSlope * temperature * warming, bulkModulus);
      y[i] += step;
      if (!(y[i] > 0)) throw unstable(pressure, temperature);
      largest = Math.max(largest, Math.abs(step / y[i]));
    }
    temperature *= Math.exp(warming);
    if (largest < LAST_STEP) return { temperature, coordinates: y, density: densityOf(members, y) };
  }
  throw new ConvergenceError("isentrope", `No state of entropy ${entropy} J/(kg K) found at ${pressure} Pa.`);
}

function densityOf(members: readonly Member[], coordinates: readonly number[]): number {
  let volume = 0;
  for (let i = 0; i < members.length; i++) {
    volume += members[i].amount / members[i].phase.reference.density(coordinates[i]);
  }
  return 1 / volume;
}
