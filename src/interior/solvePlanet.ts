import type { Composition } from "../library/composition.ts";
import type { Planet } from "./planet.ts";
import { planetSolver } from "./planetSolver.ts";

/**
 * One planet of `mass` [kg] in hydrostatic equilibrium; for many of one composition see sweepMasses.
 * Throws  as StructureSolver.solve
 */
export function solvePlanet(composition: Composition, mass: number): Planet {
  return planetSolver(composition).solve(mass);
}
