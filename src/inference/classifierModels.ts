import { type MassRange, type MeasuredCurve, radiusCurve } from "../curve/radiusCurve.ts";
import { type RadiusGrid, radiusGrid } from "../curve/radiusGrid.ts";
import { radiusSolver } from "../curve/radiusSolver.ts";
import { MASS_RANGE } from "../interior/massErrors.ts";
import type { Composition } from "../library/composition.ts";
import type { ClassifierModels } from "./classifier.ts";
import { type CompositionFamily, innerFractionFamily, outerFractionFamily } from "./twoPartFamily.ts";
import type { BoundaryLabels } from "./verdict.ts";

/** What planets are compared with. */
export interface ClassifierCompositions {
  /** Boundary compositions, the densest in the place of iron, the least dense in that of water. */
  readonly iron: Composition;
  readonly silicate: Composition;
  readonly water: Composition;
  /** By core mass fraction. */
  readonly ironSilicateFamily: CompositionFamily;
  /** By water mass fraction. */
  readonly waterOnEarthLikeFamily: CompositionFamily;
  /** What statements call the boundaries; by default iron, silicate, water. */
  readonly labels?: BoundaryLabels;
}

/** Models made from compositions, each with its measured interpolation error. */
export interface SolvedModels extends ClassifierModels {
  readonly iron: MeasuredCurve;
  readonly silicate: MeasuredCurve;
  readonly water: MeasuredCurve;
  readonly ironSilicate: RadiusGrid;
  readonly waterOnEarthLike: RadiusGrid;
}

const WHOLE_RANGE: MassRange = { lightest: MASS_RANGE.minimum, heaviest: MASS_RANGE.maximum };

/**
 * Solves the curves and families that a classifier needs, some 20 000 planets over the whole mass range.
 * Throws ConvergenceError `curve-empty` or `grid-empty` where a composition has no planet at the light end.
 */
export function buildClassifierModels(compositions: ClassifierCompositions, range = WHOLE_RANGE): SolvedModels {
  const { iron, silicate, water, ironSilicateFamily, waterOnEarthLikeFamily } = compositions;
  return {
    labels: compositions.labels ?? ["iron", "silicate", "water"],
    iron: radiusCurve(radiusSolver(iron), range),
    silicate: radiusCurve(radiusSolver(silicate), range),
    water: radiusCurve(radiusSolver(water), range),
    ironSilicate: radiusGrid((fraction) => radiusSolver(ironSilicateFamily(fraction)), range),
    waterOnEarthLike: radiusGrid((fraction) => radiusSolver(waterOnEarthLikeFamily(fraction)), range),
  };
}

/** The two families of mixed planets from the four compositions they are made of. */
export function standardFamilies(parts: {
  readonly iron: Composition;
  readonly silicate: Composition;
  readonly water: Composition;
  readonly earthLike: Composition;
}): Pick<ClassifierCompositions, "ironSilicateFamily" | "waterOnEarthLikeFamily"> {
  return {
    ironSilicateFamily: innerFractionFamily(parts.iron, parts.silicate),
    waterOnEarthLikeFamily: outerFractionFamily(parts.earthLike, parts.water),
  };
}
