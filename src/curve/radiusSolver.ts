import type { Composition } from "../library/composition.ts";
import type { RadiusSolver } from "./radiusCurve.ts";
import { sweepMasses } from "./sweep.ts";

/** Solves planets of one composition for their radii. */
export function radiusSolver(composition: Composition): RadiusSolver {
  return (masses) => Array.from(sweepMasses(composition, masses), ({ planet }) => planet?.radius);
}
