import type { EosCurve } from "../eos/curve.ts";
import { powerCollocation } from "../numerics/powerCollocation.ts";
import { G } from "../units/constants.ts";
import { A, B } from "./structureEquations.ts";

/** Degree of the polynomials in s, and the share of the central pressure that the ball may shed: error about 1e-12. */
const NODES = 8;
const PRESSURE_SHARE = 0.08;
const ROUNDS = 12;
const SETTLED = 1e-13;
/** The sensitivity steers Newton's method; it need not be as good as the solution. */
const SENSITIVITY_SETTLED = 1e-9;
/** Where a form is about to turn over, dP/dy is small and only a smaller ball converges. */
const ATTEMPTS = 12;
const SHRINK = 0.25;

const { nodes, integral, ballMean } = powerCollocation(NODES);

/**
 * The innermost part of a planet. There s/v is a quotient of two vanishing numbers, so explicit steps would have to
 * shrink towards the centre; the solution itself is analytic in s and a polynomial gets it at once. With w = v/s:
 *   w^(3/2) = (3B/2) s^(-3/2) ∫₀^s √s'/ρ ds',     y = y_c - ∫₀^s A / (w² dP/dy) ds'
 * iterated on the values at the nodes (Picard: each round gains more than a digit), then the same two equations,
 * linearised, for the answer to ln P_c.
 * Checked against the integrator started ever closer to the centre: test/interior/centralBall.test.ts
 */
export class CentralBall {
  private readonly w = new Float64Array(NODES);
  private readonly y = new Float64Array(NODES);
  private readonly slopes = nodes.map(() => new Float64Array(4));
  private readonly work = new Float64Array(NODES);
  private readonly wLogPrime = new Float64Array(NODES);
  private readonly yPrime = new Float64Array(NODES);
  evaluations = 0;

  /**
   * Writes the by-mass state at the ball's edge (see structureEquations.ts) into `state` and returns its s.
   * The edge is where the pressure has fallen by a fixed share, but not beyond `largestS` and only half way to
   * `floor`, the pressure where the phase ends. Returns NaN where no ball converges, however small.
   */
  fill(curve: EosCurve, centralPressure: number, floor: number, largestS: number, state: Float64Array): number {
    const centre = curve.coordinate(centralPressure);
    const [atCentre] = this.slopes;
    curve.slopes(centre, atCentre);
    const w0 = (B * (atCentre[1] / atCentre[0])) ** (2 / 3);
    const drop = Math.min(PRESSURE_SHARE * centralPressure, 0.5 * (centralPressure - floor));
    const centrePrime = centralPressure / atCentre[0];
    let s = Math.min((drop * w0 * w0) / A, largestS);
    for (let attempt = 0; attempt < ATTEMPTS; attempt++) {
      if (this.iterate(curve, centre, w0, s) && this.linearise(centrePrime, s)) {
        this.write(s, state);
        return s;
      }
      s *= SHRINK;
    }
    return Number.NaN;
  }

  private iterate(curve: EosCurve, centre: number, w0: number, s: number): boolean {
    const { w, y, slopes, work } = this;
    y.fill(centre);
    w.fill(w0);
    for (let round = 0; round < ROUNDS; round++) {
      for (let i = 0; i < NODES; i++) {
        curve.slopes(y[i], slopes[i]);
        work[i] = slopes[i][1] / slopes[i][0];
      }
      this.evaluations += NODES;
      for (let i = 0; i < NODES; i++) w[i] = (1.5 * B * dot(ballMean[i], work)) ** (2 / 3);
      for (let i = 0; i < NODES; i++) work[i] = (-A * s) / (w[i] * w[i] * slopes[i][0]);
      let change = 0;
      for (let i = 0; i < NODES; i++) {
        const next = centre + dot(integral[i], work);
        change = Math.max(change, Math.abs(next - y[i]));
        y[i] = next;
      }
      if (change <= SETTLED * centre) return true;
    }
    return false;
  }

  private linearise(centrePrime: number, s: number): boolean {
    const { w, slopes, work, wLogPrime, yPrime } = this;
    yPrime.fill(centrePrime);
    for (let round = 0; round < ROUNDS; round++) {
      for (let i = 0; i < NODES; i++) work[i] = -(slopes[i][1] / slopes[i][0]) * slopes[i][2] * yPrime[i];
      for (let i = 0; i < NODES; i++) wLogPrime[i] = (B * dot(ballMean[i], work)) / w[i] ** 1.5;
      for (let i = 0; i < NODES; i++) {
        const fall = (-A * s) / (w[i] * w[i] * slopes[i][0]);
        work[i] = fall * (-2 * wLogPrime[i] - slopes[i][3] * yPrime[i]);
      }
      let change = 0;
      for (let i = 0; i < NODES; i++) {
        const next = centrePrime + dot(integral[i], work);
        change = Math.max(change, Math.abs(next - yPrime[i]));
        yPrime[i] = next;
      }
      if (change <= SENSITIVITY_SETTLED * centrePrime) return true;
    }
    return false;
  }

  private write(s: number, state: Float64Array): void {
    const { w, y, yPrime, wLogPrime, work } = this;
    const edge = NODES - 1;
    const v = w[edge] * s;
    state[0] = v;
    state[1] = y[edge];
    state[4] = v * wLogPrime[edge];
    state[5] = yPrime[edge];
    // I = ∫ v √s ds and U = ∫ (3/2) G s²/√v ds = ∫ (3/2) G √s (s/√w) ds.
    for (let i = 0; i < NODES; i++) work[i] = w[i] * nodes[i];
    state[2] = s ** 2.5 * dot(ballMean[edge], work);
    for (let i = 0; i < NODES; i++) work[i] = nodes[i] / Math.sqrt(w[i]);
    state[3] = 1.5 * G * s ** 2.5 * dot(ballMean[edge], work);
  }
}

function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < NODES; i++) sum += a[i] * b[i];
  return sum;
}
