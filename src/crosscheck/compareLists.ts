import type { QuantityName } from "../planets/quantity.ts";
import type { MatchedPair } from "./listMatch.ts";
import { type PullSummary, summarisePulls } from "./pulls.ts";
import { tensionSigma } from "./significance.ts";
import type { QuantityTension } from "./tension.ts";

/** What a verdict function says of both rows; `moved` where they differ. */
export interface VerdictChange {
  readonly pair: MatchedPair;
  readonly verdict: string;
  readonly verdictOther: string;
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
const notCompared: readonly string[] = ["rightAscension", "declination"];

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
  return Object.entries(pair.row.quantities).flatMap(([name, value]) => {
    const quantity = name as QuantityName;
    const other = pair.other.quantities[quantity];
    if (!other || notCompared.includes(name)) return [];
    const measured = value.kind === other.kind && (value.kind === "measured" || value.kind === "minimum");
    const sigma = measured ? tensionSigma(value, other) : undefined;
    return [{ pair, quantity, value, other, tensionSigma: sigma, identical: sameNumber(value.value, other.value) }];
  });
}

/** Equal but for the rounding of two unit conversions. */
const sameNumber = (a: number, b: number) => Math.abs(a - b) <= 1e-9 * Math.abs(a);

function verdictChange(pair: MatchedPair, classify: ClassifyRow): VerdictChange[] {
  const verdict = classify(pair.row);
  const verdictOther = classify(pair.other);
  if (verdict === undefined || verdictOther === undefined) return [];
  return [{ pair, verdict, verdictOther, moved: verdict !== verdictOther }];
}
