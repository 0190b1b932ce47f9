import type { MeasuredQuantity, QuantityName } from "../planets/quantity.ts";
import type { MatchedPair } from "./listMatch.ts";
import { type PullSummary, summarisePulls } from "./pulls.ts";
import { quantitiesOf } from "./quantitiesOf.ts";
import { tensionSigma } from "./significance.ts";
import type { QuantityTension } from "./tension.ts";

/** What a verdict function says of both rows, at least one of which has a verdict; `moved` where two verdicts differ. */
export interface VerdictChange {
  readonly pair: MatchedPair;
  readonly verdict?: string;
  readonly verdictOther?: string;
  readonly moved: boolean;
}

export interface ListComparison {
  readonly tensions: readonly QuantityTension[];
  /** Are the quoted errors believable? By quantity. */
  readonly pulls: readonly PullSummary[];
  readonly verdicts: readonly VerdictChange[];
}

/** Gives a row's verdict, or undefined where there is none. */
export type ClassifyRow = (row: MatchedPair["row"]) => string | undefined;

/** Places are used for matching; they have no errors. */
const notCompared: readonly QuantityName[] = ["rightAscension", "declination"];

/**
 * Tension of every quantity of every pair, pulls of each quantity over the whole list, and, if `classify` is given,
 * the planets whose verdict depends on the source. Errors in common are ignored.
 * Checked by test/crosscheck/compareLists.test.ts
 */
export function compareLists(pairs: readonly MatchedPair[], classify?: ClassifyRow): ListComparison {
  const tensions = pairs.flatMap(tensionsOf);
  const verdicts = classify ? pairs.flatMap((pair) => verdictChange(pair, classify)) : [];
  return { tensions, pulls: summarisePulls(tensions), verdicts };
}

function tensionsOf(pair: MatchedPair): QuantityTension[] {
  return quantitiesOf(pair.row).flatMap(([quantity, value]) => {
    const other = pair.other.quantities[quantity];
    if (!other || notCompared.includes(quantity)) return [];
    const measured = value.kind === other.kind && (value.kind === "measured" || value.kind === "minimum");
    const sigma = measured ? tensionSigma(value, other) : undefined;
    return [{ pair, quantity, value, other, tensionSigma: sigma, identical: isQuotedTwice(value, other, sigma) }];
  });
}

/** Equal but for the rounding of unit conversions: in value against its error, and in the error against itself. */
function isQuotedTwice(a: MeasuredQuantity, b: MeasuredQuantity, sigma: number | undefined): boolean {
  if (sigma === undefined) return Math.abs(a.value - b.value) <= 1e-9 * Math.abs(a.value);
  const alike = (x = 0, y = 0) => Math.abs(x - y) <= 0.05 * x;
  return Math.abs(sigma) < 0.01 && alike(a.minus, b.minus) && alike(a.plus, b.plus);
}

function verdictChange(pair: MatchedPair, classify: ClassifyRow): VerdictChange[] {
  const verdict = classify(pair.row);
  const verdictOther = classify(pair.other);
  const known = [verdict, verdictOther].filter((one) => one !== undefined);
  return known.length === 0 ? [] : [{ pair, verdict, verdictOther, moved: new Set(known).size === 2 }];
}
