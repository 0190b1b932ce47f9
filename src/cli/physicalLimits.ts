import type { PhysicalLimits } from "../crosscheck/rule.ts";
import { radiusCurve } from "../curve/radiusCurve.ts";
import { radiusSolver } from "../curve/radiusSolver.ts";
import { MASS_RANGE } from "../interior/massErrors.ts";
import type { Composition } from "../library/composition.ts";

/** The limits that rules hold planets to, from the solver; undefined beyond the masses it can do. */
export function physicalLimits(iron: Composition): PhysicalLimits {
  const curve = radiusCurve(radiusSolver(iron), { lightest: MASS_RANGE.minimum, heaviest: MASS_RANGE.maximum });
  const isWithin = (mass: number) => mass >= curve.lightest && mass <= curve.heaviest;
  return { ironRadius: (mass) => (isWithin(mass) ? curve.radius(mass) : undefined) };
}
