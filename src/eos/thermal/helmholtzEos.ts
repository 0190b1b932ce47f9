import { ConvergenceError, ModelRangeError } from "../../errors.ts";
import type { EosCurve } from "../curve.ts";
import { checkPressure } from "../range.ts";
import { type Member, stateFromHelmholtz, type ThermalPhase, type ThermalState } from "./thermalState.ts";
import type { HelmholtzState } from "./thermalTerm.ts";

const MAX_ITERATIONS = 60;
/** The iteration converges quadratically: a step this small leaves an error near rounding level. */
const LAST_STEP = 1e-7;

/**
 * A single phase: its pressure and entropy are explicit in the coordinate y of a reference curve and temperature, so
 * only density at a given pressure has to be found.
 * Checked test/eos/thermal/isothermBasedEos.test.ts
 */
export abstract class HelmholtzEos implements ThermalPhase {
  readonly reference: EosCurve;
  readonly members: readonly Member[] = [{ phase: this, amount: 1 }];
  readonly minPressure: number;
  readonly maxPressure: number;
  private readonly slopes = new Float64Array(4);

  constructor(reference: EosCurve, maxPressure: number) {
    this.reference = reference;
    this.minPressure = reference.minPressure;
    this.maxPressure = maxPressure;
  }

  abstract helmholtz(y: number, temperature: number): HelmholtzState;

  at(pressure: number, temperature: number): ThermalState {
    if (!(temperature > 0)) {
      throw new ModelRangeError("temperature-range", `Temperature is ${temperature} K; it must be above 0 K.`, {
        quantity: "temperature",
        value: temperature,
        minimum: 0,
      });
    }
    checkPressure("warm", this, pressure);
    let y = this.reference.invert(pressure);
    for (let i = 0; i < MAX_ITERATIONS; i++) {
      const state = this.helmholtz(y, temperature);
      if (!(state.bulkModulus > 0)) throw unstable(pressure, temperature);
      const step = this.step(y, pressure - state.pressure, state.bulkModulus);
      y += step;
      if (!(y > 0)) throw unstable(pressure, temperature);
      if (Math.abs(step) <= LAST_STEP * y) {
        return stateFromHelmholtz(this.reference.density(y), temperature, this.helmholtz(y, temperature));
      }
    }
    throw new ConvergenceError("thermal-density", `No density found at ${pressure} Pa and ${temperature} K.`);
  }

  step(y: number, excess: number, bulkModulus: number): number {
    this.reference.slopes(y, this.slopes);
    return murnaghanStep(excess / bulkModulus) / this.slopes[2];
  }

  /** Bulk modulus dP / d ln ρ along the reference curve [Pa]. */
  protected referenceModulus(y: number): number {
    this.reference.slopes(y, this.slopes);
    return this.slopes[0] / this.slopes[2];
  }
}

/** dK/dP of a typical solid, so that a step follows K = K0 + 4 P (Murnaghan) and not a straight line. */
const STIFFENING = 4;

/** Change of ln ρ that raises the pressure by `excess` bulk moduli; linear where Murnaghan's curve has no such pressure. */
function murnaghanStep(excess: number): number {
  return excess > -1 / (2 * STIFFENING) ? Math.log1p(STIFFENING * excess) / STIFFENING : excess;
}

/** The error for a pressure and temperature at which a phase cannot hold together. */
export function unstable(pressure: number, temperature: number): ModelRangeError {
  return new ModelRangeError(
    "thermal-unstable",
    `At ${pressure} Pa and ${temperature} K the phase has no state with a positive bulk modulus: it would expand without limit. Lower the temperature or use another phase there.`,
    { quantity: "temperature", value: temperature, minimum: 0 },
  );
}
