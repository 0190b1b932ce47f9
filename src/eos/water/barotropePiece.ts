import { ConvergenceError } from "../../errors.ts";
import { ChebyshevPolynomial, chebyshevNodes } from "../../numerics/chebyshevPolynomial.ts";
import { integrationMatrix } from "./integrationMatrix.ts";
import type { WaterState } from "./waterState.ts";

/** What a path T(P) through a phase follows: the states of the phase, and dT/dP [K Pa^-1] along the path. */
export interface BarotropePath {
  state(pressure: number, temperature: number): WaterState;
  gradient(state: WaterState, temperature: number): number;
  /** Offset [Pa] of the coordinate x = ln(P + shift) in which temperature and ln density are smooth. */
  readonly shift: number;
}

/** Temperature and ln density on a stretch of x = ln(P + shift). */
export interface BarotropePiece {
  readonly from: number;
  readonly until: number;
  /** Where the polynomials were sampled. */
  readonly nodes: Float64Array;
  readonly temperature: ChebyshevPolynomial;
  readonly logDensity: ChebyshevPolynomial;
}

const DEGREE = 16;
const MATRIX = integrationMatrix(DEGREE);
/** Size allowed to the last coefficients of ln T and ln density. */
const TOLERANCE = 1e-10;
const WIDEST = 1;
const NARROWEST = 1e-7;
const MAX_PICARD_ITERATIONS = 60;

/** The longest piece from `from` towards `until` that the polynomials resolve, starting at a temperature [K]. */
export function resolvedPiece(path: BarotropePath, from: number, until: number, temperature: number): BarotropePiece {
  const whole = until - from;
  for (let width = Math.min(WIDEST, whole); width > NARROWEST || width === whole; width /= 2) {
    const piece = solvePiece(path, from, width === whole ? until : from + width, temperature);
    if (piece !== undefined) return piece;
  }
  throw new ConvergenceError(
    "water-barotrope",
    `Water at ${Math.exp(from) - path.shift} Pa and ${temperature} K changes too fast to follow, as it does at its ` +
      "critical point (647.096 K, 22.064 MPa); choose a path that passes it farther away.",
  );
}

/**
 * Solves dT/dx = (dT/dP)(P + shift) on a piece by Picard's iteration on its nodes: insert the last T(x), integrate the
 * polynomial through the slopes, repeat. Undefined if the polynomials do not resolve the solution.
 */
function solvePiece(path: BarotropePath, from: number, until: number, temperature: number): BarotropePiece | undefined {
  const half = (until - from) / 2;
  const nodes = chebyshevNodes(from, until, DEGREE);
  const stateAt = (i: number, t: number) => path.state(Math.exp(nodes[i]) - path.shift, t);
  const slopeAt = (i: number, t: number, state: WaterState) => path.gradient(state, t) * Math.exp(nodes[i]);

  const logSlope = slopeAt(0, temperature, stateAt(0, temperature)) / temperature;
  let temperatures = Array.from(nodes, (x) => temperature * Math.exp(logSlope * (x - from)));
  for (let iteration = 0; iteration < MAX_PICARD_ITERATIONS; iteration++) {
    const states = temperatures.map((t, i) => stateAt(i, t));
    const slopes = states.map((state, i) => slopeAt(i, temperatures[i], state));
    const improved = MATRIX.map((row) => row.reduce((sum, weight, j) => sum + half * weight * slopes[j], temperature));
    const change = Math.max(...improved.map((t, i) => Math.abs(t / temperatures[i] - 1)));
    temperatures = improved;
    if (!(change < 0.5)) return undefined;
    if (change > 1e-3 * TOLERANCE) continue;

    const logTemperature = new ChebyshevPolynomial(from, until, temperatures.map(Math.log));
    const logDensity = new ChebyshevPolynomial(
      from,
      until,
      states.map((state) => Math.log(state.density)),
    );
    if (logTemperature.tail > TOLERANCE || logDensity.tail > TOLERANCE) return undefined;
    return { from, until, nodes, temperature: new ChebyshevPolynomial(from, until, temperatures), logDensity };
  }
  return undefined;
}
