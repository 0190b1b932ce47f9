import type { Composition } from "../library/composition.ts";
import type { Planet } from "./planet.ts";
import { StructureSolver } from "./structureSolver.ts";
import { WarmSolver } from "./warmSolver.ts";

/** Solves planets of one composition; see StructureSolver.solve for what it gives and throws. */
export interface PlanetSolver {
  solve(mass: number, guess?: number): Planet;
}

/** The solver a composition needs: a cold planet pays nothing for the physics of warm ones. */
export function planetSolver(composition: Composition): PlanetSolver {
  const warm = composition.temperature !== undefined && composition.layers.some(({ material }) => material.warmed);
  return warm ? new WarmSolver(composition) : new StructureSolver(composition);
}
