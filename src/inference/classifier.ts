import type { MassRange, RadiusCurve } from "../curve/radiusCurve.ts";
import { InputError } from "../errors.ts";
import type { PlanetRow } from "../planets/quantity.ts";
import { EARTH_MASS } from "../units/constants.ts";
import { classProbabilities } from "./classProbabilities.ts";
import { type FractionEstimate, fractionEstimate, fractionPosterior, type PlanetFamily } from "./fractionPosterior.ts";
import type { Measurement } from "./measurement.ts";
import { isMeasuredValue } from "./refusal.ts";
import { rowMeasurement } from "./rowMeasurement.ts";
import { type BoundaryLabels, type Verdict, verdictFor } from "./verdict.ts";

/** Everything a planet is compared with. Curves densest first; no curve may cross another. */
export interface ClassifierModels {
  readonly labels: BoundaryLabels;
  readonly iron: RadiusCurve;
  readonly silicate: RadiusCurve;
  readonly water: RadiusCurve;
  /** By core mass fraction. */
  readonly ironSilicate: PlanetFamily;
  /** By water mass fraction on an Earth-like interior. */
  readonly waterOnEarthLike: PlanetFamily;
}

/** A planet with measured mass and radius. The four probabilities sum to 1. */
export interface Classified {
  readonly verdict: Verdict;
  readonly reasons?: undefined;
  readonly pDenserThanIron: number;
  readonly pIronSilicate: number;
  readonly pSilicateWater: number;
  readonly pLighterThanWater: number;
  readonly coreMassFraction: FractionEstimate;
  readonly waterMassFraction: FractionEstimate;
}

/** A planet without them, with the codes of all reasons, and what its one known quantity allows. SI. */
export interface Refused {
  readonly verdict?: undefined;
  readonly reasons: readonly string[];
  /** For a radius alone. */
  readonly massIfSilicate?: number;
  readonly massIfIron?: number;
  /** For a mass alone. */
  readonly radiusIfSilicate?: number;
  readonly radiusIfIron?: number;
  readonly radiusIfWater?: number;
}

export type Classification = Classified | Refused;

/** Intervals in ln M at whose ends the order of the boundary curves is checked. */
const ORDER_CHECKS = 200;

/** Says of planets what they can be made of. Deterministic; rows do not influence each other. */
export interface Classifier {
  /** Masses that all curves and families describe. */
  readonly range: MassRange;
  classify(row: PlanetRow): Classification;
}

/**
 * A classifier with these models: the probabilities of `classProbabilities` and, for each family, the posterior of
 * `fractionPosterior`, whose doc comments state priors and likelihood.
 * Throws InputError `boundaries-cross` if the boundary curves are not in the order iron, silicate, water everywhere.
 * Checked test/inference/classifier.test.ts
 */
export function classifier(models: ClassifierModels): Classifier {
  const range = commonRange(models);
  const boundaries = [models.iron, models.silicate, models.water];
  checkOrder(boundaries, models.labels, range);

  const infer = (measurement: Measurement): Classified => {
    const probabilities = classProbabilities(measurement, boundaries, range);
    const [pDenserThanIron, pIronSilicate, pSilicateWater, pLighterThanWater] = probabilities;
    return {
      verdict: verdictFor(probabilities, models.labels),
      pDenserThanIron,
      pIronSilicate,
      pSilicateWater,
      pLighterThanWater,
      coreMassFraction: fractionEstimate(fractionPosterior(measurement, models.ironSilicate, range)),
      waterMassFraction: fractionEstimate(fractionPosterior(measurement, models.waterOnEarthLike, range)),
    };
  };

  const classify = (row: PlanetRow): Classification => {
    const { measurement, reasons } = rowMeasurement(row, range);
    return measurement ? infer(measurement) : { reasons, ...allowedByOneQuantity(row, models) };
  };

  return { range, classify };
}

/** What the curves allow a planet to be of which only radius or only mass is known. */
function allowedByOneQuantity(
  { quantities }: PlanetRow,
  { iron, silicate, water }: ClassifierModels,
): Partial<Refused> {
  const mass = isMeasuredValue(quantities.mass) ? quantities.mass.value : undefined;
  const radius = isMeasuredValue(quantities.radius) ? quantities.radius.value : undefined;
  if (radius !== undefined && mass === undefined) {
    return { massIfSilicate: silicate.massWithRadius(radius), massIfIron: iron.massWithRadius(radius) };
  }
  if (mass !== undefined && radius === undefined) {
    const radiusOn = (curve: RadiusCurve) =>
      mass >= curve.lightest && mass <= curve.heaviest ? curve.radius(mass) : undefined;
    return { radiusIfSilicate: radiusOn(silicate), radiusIfIron: radiusOn(iron), radiusIfWater: radiusOn(water) };
  }
  return {};
}

function commonRange({ iron, silicate, water, ironSilicate, waterOnEarthLike }: ClassifierModels): MassRange {
  const parts = [iron, silicate, water, ironSilicate, waterOnEarthLike];
  return {
    lightest: Math.max(...parts.map(({ lightest }) => lightest)),
    heaviest: Math.min(...parts.map(({ heaviest }) => heaviest)),
  };
}

function checkOrder(boundaries: readonly RadiusCurve[], labels: readonly string[], range: MassRange): void {
  const ratio = range.heaviest / range.lightest;
  for (let i = 0; i <= ORDER_CHECKS; i++) {
    const mass = Math.min(range.lightest * ratio ** (i / ORDER_CHECKS), range.heaviest);
    const radii = boundaries.map((curve) => curve.radius(mass));
    const wrong = radii.findIndex((radius, b) => b > 0 && !(radius > radii[b - 1]));
    if (wrong < 0) continue;
    throw new InputError(
      "boundaries-cross",
      `At ${(mass / EARTH_MASS).toPrecision(3)} Earth masses ${labels[wrong]} is not larger than ${labels[wrong - 1]}, ` +
        "so they are no boundaries between classes. Name the boundary compositions from the densest to the least dense.",
    );
  }
}
