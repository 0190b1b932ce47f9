import type { EosCurve } from "../eos/curve.ts";
import type { RightHandSide } from "../numerics/rungeKutta8.ts";
import { G } from "../units/constants.ts";

/**
 * Hydrostatic equilibrium and mass conservation with s = m^(2/3) and v = r², in which they are regular at the centre
 * (how to leave the centre: centralBall.ts):
 *   dP/ds = -A (s/v)²,   dv/ds = (B/ρ) √(s/v),   A = 3G/8π, B = 3/4π
 * and, alongside, how the solution answers to the central pressure (′ = d/d ln P_c) and two integrals:
 *   moment of inertia  dI = (2/3) r² dm = v √s ds,   gravitational energy  dU = G m/r dm = (3/2) G s²/√v ds.
 * Two choices of independent variable, both with the state in these six slots:
 *   by mass        [v, y, I, U, v′, y′] over s: layer boundaries are exact
 *   by coordinate  [s, v, I, U, s′, v′] over y, the coordinate of the equation of state: surface and phase boundaries
 *                  are exact, and a density that goes to 0 at the surface does no harm
 * Source  hydrostatic equilibrium in mass, e.g. Kippenhahn, Weigert & Weiss 2012, Stellar Structure and Evolution,
 *         sections 1.2 and 2.1, transformed here
 * Checked test/interior/sensitivity.test.ts, invariants.test.ts
 */
export const A = (3 * G) / (8 * Math.PI);
export const B = 3 / (4 * Math.PI);
export const STATE_SIZE = 6;
/** The slots whose accuracy steers the step; sensitivities ride along. */
export const CONTROLLED = 4;

export class StructureEquations {
  /** Equation of state of the phase being integrated. */
  curve: EosCurve;
  private readonly eos = new Float64Array(4);

  constructor(curve: EosCurve) {
    this.curve = curve;
  }

  readonly byMass: RightHandSide = (s, state, out) => {
    const { eos } = this;
    const v = state[0];
    const yPrime = state[5];
    const ratio = s / v;
    const ratioSlope = -state[4] / v;
    this.curve.slopes(state[1], eos);
    const dv = (B * Math.sqrt(ratio) * eos[1]) / eos[0];
    const dy = (-A * ratio * ratio) / eos[0];
    out[0] = dv;
    out[1] = dy;
    out[2] = v * Math.sqrt(s);
    out[3] = (1.5 * G * s * s) / Math.sqrt(v);
    out[4] = dv * (0.5 * ratioSlope - eos[2] * yPrime);
    out[5] = dy * (2 * ratioSlope - eos[3] * yPrime);
  };

  readonly byCoordinate: RightHandSide = (y, state, out) => {
    const { eos } = this;
    const s = state[0];
    const v = state[1];
    const inverseRatio = v / s;
    const inverseRatioSlope = state[5] / v - state[4] / s;
    this.curve.slopes(y, eos);
    const ds = (-eos[0] / A) * inverseRatio * inverseRatio;
    const dv = (-B / A) * eos[1] * inverseRatio * Math.sqrt(inverseRatio);
    out[0] = ds;
    out[1] = dv;
    out[2] = v * Math.sqrt(s) * ds;
    out[3] = ((1.5 * G * s * s) / Math.sqrt(v)) * ds;
    out[4] = ds * 2 * inverseRatioSlope;
    out[5] = dv * 1.5 * inverseRatioSlope;
  };

  /** Rewrites a by-mass state at s as a by-coordinate one; returns its y. */
  massToCoordinate(s: number, state: Float64Array): number {
    const [v, y, , , vPrime, yPrime] = state;
    this.curve.slopes(y, this.eos);
    const ratio = s / v;
    const sPrime = (yPrime * this.eos[0]) / (A * ratio * ratio);
    state[0] = s;
    state[1] = v;
    state[4] = sPrime;
    state[5] = vPrime + ((B * Math.sqrt(ratio) * this.eos[1]) / this.eos[0]) * sPrime;
    return y;
  }

  /**
   * Carries a by-mass state at s, standing at a pressure `pressure`, from `this.curve` over to `next`.
   * At a layer boundary s is the same for every P_c; at a phase boundary the pressure is, and s moves.
   */
  enterCurve(next: EosCurve, pressure: number, s: number, state: Float64Array, kind: "layer" | "phase"): void {
    const { eos } = this;
    const ratio = s / state[0];
    this.curve.slopes(state[1], eos);
    const pressurePrime = eos[0] * state[5];
    const volumeBelow = eos[1] / eos[0];
    this.curve = next;
    state[1] = next.coordinate(pressure);
    next.slopes(state[1], eos);
    state[5] = pressurePrime / eos[0];
    if (kind === "layer") return;
    const sPrime = pressurePrime / (A * ratio * ratio);
    state[4] += B * Math.sqrt(ratio) * (volumeBelow - eos[1] / eos[0]) * sPrime;
  }
}
