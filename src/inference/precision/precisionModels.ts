import { type MassRange, type RadiusSolver, radiusCurve } from "../../curve/radiusCurve.ts";
import { radiusGrid } from "../../curve/radiusGrid.ts";
import { sweepMasses } from "../../curve/sweep.ts";
import { MASS_RANGE } from "../../interior/massErrors.ts";
import type { Composition } from "../../library/composition.ts";
import type { CompositionFamily } from "../twoPartFamily.ts";
import type { PrecisionModels } from "./planetForecast.ts";
import { sharedRange } from "./separation.ts";

const WHOLE_RANGE: MassRange = { lightest: MASS_RANGE.minimum, heaviest: MASS_RANGE.maximum };

/** Solves two compositions and a family. Throws ConvergenceError `curve-empty` or `grid-empty`. */
export function buildPrecisionModels(
  compositions: { readonly a: Composition; readonly b: Composition; readonly family: CompositionFamily },
  range = WHOLE_RANGE,
): PrecisionModels {
  const a = radiusCurve(solverOf(compositions.a), range);
  const b = radiusCurve(solverOf(compositions.b), range);
  const family = radiusGrid((fraction) => solverOf(compositions.family(fraction)), range);
  return { a, b, family, range: sharedRange([a, b, family]) };
}

function solverOf(composition: Composition): RadiusSolver {
  return (masses) => Array.from(sweepMasses(composition, masses), ({ planet }) => planet?.radius);
}
