import { FamilyTable } from "../../curve/familyTable.ts";
import type { SolvedFamily } from "../../curve/solveFamily.ts";
import type { Family } from "../../library/family.ts";
import { type FamilyModel, logPriorIntegral } from "./compositionPosterior.ts";
import type { CompositionPrior } from "./compositionPrior.ts";

/** A family with its solved radii, ready for inference. */
export function familyModel(family: Family, { lattice }: SolvedFamily): FamilyModel {
  const prior = priorOf(family);
  return {
    name: family.name,
    components: family.components.map(({ name }) => name),
    table: new FamilyTable(lattice),
    prior,
    logPriorIntegral: logPriorIntegral(prior),
  };
}

/** A family's prior with places instead of names. */
export function priorOf({ components, prior }: Family): CompositionPrior {
  const place = (wanted: string): number => components.findIndex(({ name }) => name === wanted);
  return {
    componentCount: components.length,
    logUniform: prior.logUniform.map(({ component, from, to }) => ({ component: place(component), from, to })),
    normal: prior.normal.map(({ component, among, mean, sigma }) => ({
      component: place(component),
      among: among.map(place),
      mean,
      sigma,
    })),
  };
}
