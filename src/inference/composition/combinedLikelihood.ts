import type { MassRange, RadiusCurve } from "../../curve/radiusCurve.ts";
import { normalBelow } from "../normal.ts";
import { atDeviation, deviation, type SplitNormal } from "../splitNormal.ts";
import type { PlanetLikelihood } from "./likelihood.ts";
import { minimumMassLikelihood } from "./minimumMassLikelihood.ts";

/** A quantity that was measured, or one that is known to lie below or above a limit (censored). SI. */
export type Datum =
  | { readonly kind: "measured"; readonly value: SplitNormal }
  | { readonly kind: "upper-limit" | "lower-limit"; readonly limit: number };

/** The same, or a minimum mass M sin i. */
export type MassDatum = Datum | { readonly kind: "minimum"; readonly value: SplitNormal };

/** What is known of a planet, each by itself. */
export interface IndependentData {
  readonly mass?: MassDatum;
  readonly radius?: Datum;
  readonly density?: Datum;
}

/** One quantity's part of the likelihood. */
interface Term {
  log(x: number): number;
  /** Where it is negligible, or bends: as for a mass. */
  readonly lowest: number;
  readonly highest: number;
  readonly bends: readonly number[];
  readonly isMeasured: boolean;
}

const FARTHEST = 9;
/** Of a limit, relative. */
const LIMIT_WIDTH = 0.01;

/**
 * Likelihood of a planet's mass, radius and bulk density, whichever are given, independent of each other:
 *   measured  split-normal
 *   limit     probability that a measurement with an error of 1 % of the limit falls on its allowed side: nearly a step
 *   minimum   M sin i split-normal with cos i uniform (orbits in all directions alike), i integrated out
 */
export function combinedLikelihood({ mass, radius, density }: IndependentData): PlanetLikelihood {
  const massTerm = mass?.kind === "minimum" ? minimumTerm(mass.value) : termOf(mass);
  const radiusTerm = termOf(radius);
  const densityTerm = termOf(density);
  const terms = [massTerm, radiusTerm, densityTerm];
  return {
    logLikelihood: (m, r) => {
      let log = massTerm.log(m) + radiusTerm.log(r);
      if (density !== undefined) log += densityTerm.log(bulkDensity(m, r));
      return log;
    },
    logBest: (m) => massTerm.log(m),
    massWindow: ({ lightest, heaviest }: MassRange) => ({
      lightest: Math.max(lightest, massTerm.lowest),
      heaviest: Math.min(heaviest, massTerm.highest),
    }),
    kinks: (curve: RadiusCurve) => [
      ...massTerm.bends,
      ...radiusTerm.bends.map((r) => curve.massWithRadius(r)),
      ...densityTerm.bends.map((rho) => massWithDensity(curve, rho)),
    ],
    dataCount: terms.filter(({ isMeasured }) => isMeasured).length,
  };
}

const unknown: Term = {
  log: () => 0,
  lowest: 0,
  highest: Number.POSITIVE_INFINITY,
  bends: [],
  isMeasured: false,
};

function termOf(datum: Datum | undefined): Term {
  if (datum === undefined) return unknown;
  if (datum.kind === "measured") {
    const { value } = datum;
    return {
      log: (x) => -0.5 * deviation(value, x) ** 2,
      lowest: atDeviation(value, -FARTHEST),
      highest: atDeviation(value, FARTHEST),
      bends: [-4, 0, 4].map((k) => atDeviation(value, k)),
      isMeasured: true,
    };
  }
  const width = LIMIT_WIDTH * datum.limit;
  const isUpper = datum.kind === "upper-limit";
  return {
    ...unknown,
    log: (x) => logNormalBelow((isUpper ? datum.limit - x : x - datum.limit) / width),
    lowest: isUpper ? 0 : datum.limit - FARTHEST * width,
    highest: isUpper ? datum.limit + FARTHEST * width : Number.POSITIVE_INFINITY,
    bends: [-2, 0, 2].map((k) => datum.limit + k * width),
  };
}

function minimumTerm(value: SplitNormal): Term {
  const { log, bends } = minimumMassLikelihood(value);
  return { log, lowest: atDeviation(value, -FARTHEST), highest: Number.POSITIVE_INFINITY, bends, isMeasured: true };
}

/** ln of the probability that a standard normal variable lies below z, also where that leaves the double range. */
function logNormalBelow(z: number): number {
  // The asymptotic form is right to 1/z².
  return z > -30 ? Math.log(normalBelow(z)) : -0.5 * z * z - Math.log(-z * Math.sqrt(2 * Math.PI));
}

function bulkDensity(mass: number, radius: number): number {
  return mass / ((4 / 3) * Math.PI * radius ** 3);
}

/** Where a curve has that density, which rises with mass; undefined if nowhere. */
function massWithDensity(curve: RadiusCurve, density: number): number | undefined {
  const excess = (m: number): number => bulkDensity(m, curve.radius(m)) - density;
  let [low, high] = [curve.lightest, curve.heaviest];
  if (!(excess(low) < 0 && excess(high) > 0)) return undefined;
  for (let step = 0; step < 40; step++) {
    const middle = Math.sqrt(low * high);
    if (excess(middle) < 0) low = middle;
    else high = middle;
  }
  return Math.sqrt(low * high);
}
