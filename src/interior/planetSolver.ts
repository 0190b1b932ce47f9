import type { Composition } from "../library/composition.ts";
import { EnvelopeSolver, type SolidSolver } from "./envelopeSolver.ts";
import type { Planet } from "./planet.ts";
import { StructureSolver } from "./structureSolver.ts";
import { WarmSolver } from "./warmSolver.ts";

/** Solves planets of one composition; see StructureSolver.solve for what it gives and throws. */
export interface PlanetSolver {
  solve(mass: number, guess?: number): Planet;
}

export interface SolverOptions {
  /** Allowed relative error of one integration step; by default good for 1e-8 in radius. */
  readonly tolerance?: number;
}

/**
 * The solver a composition needs: a cold planet pays nothing for the physics of warm ones.
 * Throws  InputError `envelope-conditions`
 */
export function planetSolver(composition: Composition, options: SolverOptions = {}): PlanetSolver {
  const { envelope } = composition;
  const solid = solidSolver(composition, options);
  return envelope === undefined ? solid : new EnvelopeSolver({ ...composition, envelope }, solid);
}

function solidSolver(composition: Composition, options: SolverOptions): SolidSolver {
  const warm = composition.temperature !== undefined && composition.layers.some(({ material }) => material.warmed);
  return warm ? new WarmSolver(composition, options) : new StructureSolver(composition, options);
}
