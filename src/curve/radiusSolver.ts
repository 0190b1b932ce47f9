import type { Composition } from "../library/composition.ts";
import type { RadiusSolver } from "./radiusCurve.ts";
import { sweepMasses } from "./sweep.ts";

/** Radii good to about 1e-8, a hundred times better than curves and grids interpolate them, at half the work. */
const TOLERANCE = 1e-7;

/** Solves planets of one composition for their radii. */
export function radiusSolver(composition: Composition): RadiusSolver {
  return (masses) =>
    Array.from(sweepMasses(composition, masses, { tolerance: TOLERANCE }), ({ planet }) => planet?.radius);
}
