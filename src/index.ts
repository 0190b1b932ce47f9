export { type ChosenRow, choosePublications, type PublicationRule } from "./crosscheck/choosePublication.ts";
export { compareLists, type ListComparison } from "./crosscheck/compareLists.ts";
export type { Finding, Severity } from "./crosscheck/finding.ts";
export { type FindingRecord, findingRecord } from "./crosscheck/findingRecord.ts";
export type { AmbiguousMatch, ListMatch, MatchedPair, MatchMethod } from "./crosscheck/listMatch.ts";
export { type MatchOptions, matchLists } from "./crosscheck/matchLists.ts";
export type { PhysicalLimits, Rule } from "./crosscheck/rule.ts";
export { rules } from "./crosscheck/rules.ts";
export { countFindings, runRules } from "./crosscheck/runRules.ts";
export { type CurvePoint, sweepMasses } from "./curve/sweep.ts";
export { type CoreRadius, envelopeFraction, gasPlanetRadius, type RadiusReading } from "./envelope/gasPlanet.ts";
export type { EnvelopeConditions } from "./envelope/lopezFortney.ts";
export { radiusAtPressure, TRANSIT_PRESSURE, transitPressure } from "./envelope/transit.ts";
export type { EosCurve } from "./eos/curve.ts";
export { densityAt, type Material, type Phase, phaseAt, type Source } from "./eos/material.ts";
export {
  BulkwrightError,
  ConvergenceError,
  InputError,
  ModelRangeError,
  type Place,
} from "./errors.ts";
export type { FigureSpec } from "./figures/figureSpec.ts";
export { massRadiusFigure } from "./figures/massRadiusFigure.ts";
export type { MassRadiusInput } from "./figures/massRadiusInput.ts";
export { plotlyHtml } from "./figures/plotlyHtml.ts";
export {
  type Classification,
  type Classified,
  type Classifier,
  type ClassifierModels,
  classifier,
  type Refused,
} from "./inference/classifier.ts";
export { type DensityTable, type DensityTableProfile, integrateDensityTable } from "./interior/densityTable.ts";
export { type SynchronousFigure, synchronousFigure } from "./interior/distortion.ts";
export { fluidLoveNumber } from "./interior/loveNumber.ts";
export { coreRadiusFraction, escapeSpeed, planetLoveNumber } from "./interior/observables.ts";
export type { Boundary, Envelope, Planet, SolidPlanet, SolverCounters } from "./interior/planet.ts";
export { type ProfilePoint, profileOf, solveProfile } from "./interior/profile.ts";
export { solvePlanet } from "./interior/solvePlanet.ts";
export { type AlternativeComposition, alternativeCompositions } from "./library/alternatives.ts";
export { checkLibrary } from "./library/checkLibrary.ts";
export type { Composition, GasEnvelope, Layer } from "./library/composition.ts";
export { type Library, loadLibrary, type Substitutes } from "./library/library.ts";
export type { Entry, LibraryFile } from "./library/libraryFiles.ts";
export { shippedFiles } from "./library/shipped.generated.ts";
export { sourcesOf, type UsedSource } from "./library/sources.ts";
export { starPlanetFiles } from "./library/starPlanetFiles.ts";
export { type Abundances, parseAbundances } from "./mineralogy/abundances.ts";
export { type Interval, planetFromStar, type StarPlanet } from "./mineralogy/planetFromStar.ts";
export type { SolarScaleName } from "./mineralogy/solarScales.ts";
export type {
  LimitCoding,
  MeasuredQuantity,
  Origin,
  PlanetRow,
  QuantityKind,
  QuantityName,
  RowIssue,
  TextName,
} from "./planets/quantity.ts";
export { type ListOptions, type PlanetList, readPlanetList } from "./planets/readPlanetList.ts";
export {
  type Constant,
  constants,
  EARTH_MASS,
  EARTH_RADIUS,
  G,
  JUPITER_MASS,
  JUPITER_RADIUS,
  SUN_MASS,
  SUN_RADIUS,
} from "./units/constants.ts";
