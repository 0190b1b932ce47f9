import type { Composition } from "../library/composition.ts";
import { EnvelopeSolver, type SolidSolver } from "./envelopeSolver.ts";
import type { Planet } from "./planet.ts";
import { StructureSolver } from "./structureSolver.ts";
import { WarmSolver } from "./warmSolver.ts";

/** Solves planets of one composition; see StructureSolver.solve for what it gives and throws. */
export interface PlanetSolver {
  solve(mass: number, guess?: number): Planet;
}

/**
 * The solver a composition needs: a cold planet pays nothing for the physics of warm ones.
 * Throws  InputError `envelope-conditions`
 */
export function planetSolver(composition: Composition): PlanetSolver {
  const { envelope } = composition;
  const solid = solidSolver(composition);
  return envelope === undefined ? solid : new EnvelopeSolver({ ...composition, envelope }, solid);
}

function solidSolver(composition: Composition): SolidSolver {
  const warm = composition.temperature !== undefined && composition.layers.some(({ material }) => material.warmed);
  return warm ? new WarmSolver(composition) : new StructureSolver(composition);
}
