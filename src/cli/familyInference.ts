import type { ByteCache } from "../curve/cachedFamily.ts";
import { solvedFamily } from "../curve/cachedFamily.ts";
import type { MassRange } from "../curve/radiusCurve.ts";
import type { SolvedFamily } from "../curve/solveFamily.ts";
import { BulkwrightError } from "../errors.ts";
import {
  type CompositionPosterior,
  compositionPosterior,
  type FamilyModel,
} from "../inference/composition/compositionPosterior.ts";
import { familyModel } from "../inference/composition/familyModel.ts";
import type { MassPrior, PlanetLikelihood } from "../inference/composition/likelihood.ts";
import type { RowLikelihood } from "../inference/composition/planetData.ts";
import { MASS_RANGE } from "../interior/massErrors.ts";
import type { Family } from "../library/family.ts";
import { EARTH_MASS } from "../units/constants.ts";

/** A family's posterior for a planet, or why there is none. */
export type FamilyResult =
  | { readonly family: FamilyModel; readonly posterior: CompositionPosterior; readonly reasons?: undefined }
  | { readonly family: FamilyModel; readonly posterior?: undefined; readonly reasons: readonly string[] };

export interface FamilyInference {
  readonly families: readonly FamilyModel[];
  /** What a reader should know of the interpolation. */
  readonly notes: readonly string[];
  infer(row: RowLikelihood): FamilyResult[];
}

export interface FamilyInferenceOptions {
  readonly massPrior: MassPrior;
  readonly cache?: ByteCache;
  readonly note: (text: string) => void;
}

/** Solves families over the masses that these planets need, once and for all. */
export async function familyInference(
  families: readonly Family[],
  planets: readonly RowLikelihood[],
  { massPrior, cache, note }: FamilyInferenceOptions,
): Promise<FamilyInference> {
  const wanted = neededRange(planets.flatMap(({ likelihood }) => likelihood ?? []));
  const solved: SolvedFamily[] = [];
  for (const family of families) solved.push(await solvedFamily(family, wanted, { cache, note }));
  const models = families.map((family, i) => familyModel(family, solved[i]));
  // Evidences of different families compare only over the same masses.
  const range = {
    lightest: Math.max(...models.map(({ table }) => table.lightest)),
    heaviest: Math.min(...models.map(({ table }) => table.heaviest)),
  };
  return {
    families: models,
    notes: solved.map((result, i) => errorNote(families[i], result)),
    infer: ({ likelihood, reasons }) =>
      models.map((family) => (likelihood ? attempt(likelihood, family, range, massPrior) : { family, reasons })),
  };
}

function attempt(data: PlanetLikelihood, family: FamilyModel, range: MassRange, massPrior: MassPrior): FamilyResult {
  try {
    const posterior = compositionPosterior(data, family, range, { massPrior });
    return posterior ? { family, posterior } : { family, reasons: ["mass-beyond-models"] };
  } catch (error) {
    if (!(error instanceof BulkwrightError)) throw error;
    return { family, reasons: [error.code] };
  }
}

/** In powers of 2 of the Earth's mass, so that similar lists share what is kept. */
function neededRange(likelihoods: readonly PlanetLikelihood[]): MassRange {
  const all = { lightest: MASS_RANGE.minimum, heaviest: MASS_RANGE.maximum };
  const windows = likelihoods.map((data) => data.massWindow(all)).filter((w) => w.lightest < w.heaviest);
  if (windows.length === 0) return { lightest: EARTH_MASS, heaviest: 2 * EARTH_MASS };
  const lightest = windows.reduce((least, window) => Math.min(least, window.lightest), Number.POSITIVE_INFINITY);
  const heaviest = windows.reduce((most, window) => Math.max(most, window.heaviest), 0);
  return {
    lightest: Math.max(all.lightest, EARTH_MASS * 2 ** Math.floor(Math.log2(lightest / EARTH_MASS))),
    heaviest: Math.min(all.heaviest, EARTH_MASS * 2 ** Math.ceil(Math.log2(heaviest / EARTH_MASS))),
  };
}

function errorNote({ name, components }: Family, { error, lattice }: SolvedFamily): string {
  const { mass, fractions } = error.worst;
  const where = components.map((component, k) => `${percent(fractions[k])} ${component.name}`).join(", ");
  return (
    `family "${name}": radii are interpolated between ${lattice.logRadii.length} solved planets; at ${error.tested} others ` +
    `the relative error is ${small(error.median)} (median), ${small(error.rootMeanSquare)} (root mean square), ` +
    `${small(error.largest)} at most, found at ${(mass / EARTH_MASS).toPrecision(3)} Earth masses with ${where}`
  );
}

const small = (value: number): string => value.toExponential(1);
const percent = (fraction: number): string => `${(100 * fraction).toPrecision(2)} %`;
