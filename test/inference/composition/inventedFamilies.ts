import type { CompositionTable } from "../../../src/curve/familyTable.ts";
import type { RadiusCurve } from "../../../src/curve/radiusCurve.ts";
import { type FamilyModel, logPriorIntegral } from "../../../src/inference/composition/compositionPosterior.ts";
import { type CompositionPrior, flatPrior } from "../../../src/inference/composition/compositionPrior.ts";

export const range = { lightest: 1e-3, heaviest: 1e3 };

/** A family whose radii are a formula; masses and radii in any units. */
export function familyOf(
  radius: (mass: number, fractions: ArrayLike<number>) => number,
  components: readonly string[],
  prior: CompositionPrior = flatPrior(components.length),
): FamilyModel {
  const member = (fractions: ArrayLike<number>): RadiusCurve => {
    const kept = Array.from(fractions);
    return { ...range, radius: (mass) => radius(mass, kept), massWithRadius: () => undefined };
  };
  const table: CompositionTable = { ...range, componentCount: components.length, member };
  return { name: components.join("-"), components, table, prior, logPriorIntegral: logPriorIntegral(prior) };
}
