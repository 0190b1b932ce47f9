import { BulkwrightError } from "../errors.ts";
import type { Planet } from "../interior/planet.ts";
import { StructureSolver } from "../interior/structureSolver.ts";
import type { Composition } from "../library/composition.ts";
import { polynomialThrough } from "../numerics/extrapolate.ts";

/** One mass of a sweep [kg]: the planet, or why there is none. Exactly one of the two is there. */
export type CurvePoint =
  | { readonly mass: number; readonly planet: Planet; readonly error?: undefined }
  | { readonly mass: number; readonly planet?: undefined; readonly error: BulkwrightError };

/** Planets remembered to predict the next central pressure: enough for a cubic in ln M. */
const MEMORY = 4;
/** Beyond this step in ln M an extrapolation is no better than a fresh guess. */
const NEAR = 0.7;

/**
 * Planets of one composition at the given masses [kg], in their order. A mass that cannot be solved becomes a point
 * with its error; the sweep goes on. Neighbouring masses help each other, so sorted masses are fastest.
 */
export function* sweepMasses(
  composition: Composition,
  masses: Iterable<number>,
  options: { tolerance?: number } = {},
): Generator<CurvePoint> {
  const solver = new StructureSolver(composition, options);
  const logMasses: number[] = [];
  const logPressures: number[] = [];
  for (const mass of masses) {
    const logMass = Math.log(mass);
    try {
      const planet = solver.solve(mass, predict(logMasses, logPressures, logMass));
      remember(logMasses, logMass, logPressures, Math.log(planet.centralPressure));
      yield { mass, planet };
    } catch (error) {
      if (!(error instanceof BulkwrightError)) throw error;
      yield { mass, error };
    }
  }
}

/** Central pressure [Pa] extrapolated in ln M, or undefined where the last planets are too far off to tell. */
function predict(logMasses: readonly number[], logPressures: readonly number[], logMass: number): number | undefined {
  if (logMasses.length === 0 || !(Math.abs(logMass - logMasses[logMasses.length - 1]) < NEAR)) return undefined;
  const logPressure = polynomialThrough(logMasses, logPressures, logMass);
  // Points in a wild order can throw the polynomial far out; the central pressure never moves much faster than mass.
  const plausible = Math.abs(logPressure - logPressures[logPressures.length - 1]) < 2 * NEAR;
  return plausible ? Math.exp(logPressure) : undefined;
}

function remember(logMasses: number[], logMass: number, logPressures: number[], logPressure: number): void {
  if (logMasses.includes(logMass)) return;
  logMasses.push(logMass);
  logPressures.push(logPressure);
  if (logMasses.length <= MEMORY) return;
  logMasses.shift();
  logPressures.shift();
}
