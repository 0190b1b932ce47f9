import { EARTH_RADIUS } from "../units/constants.ts";
import type { ListComparison } from "./compareLists.ts";
import { displayName, inDisplayUnit } from "./displayUnits.ts";
import type { Finding } from "./finding.ts";
import type { ListMatch, MatchedPair } from "./listMatch.ts";

/** First columns of the two outputs, in order; version 1 of both. Later versions only add columns at the end. */
export const findingColumns = [
  "row",
  "name",
  "rule",
  "severity",
  "quantity",
  "value",
  "expected",
  "significance_sigma",
  "explanation",
  "remedy",
] as const;

export const pairColumns = [
  "name",
  "name_other",
  "match",
  "quantity",
  "value",
  "value_other",
  "tension_sigma",
  "verdict",
  "verdict_other",
] as const;

type Cell = string | number | undefined;
export type FindingRecord = Readonly<Record<(typeof findingColumns)[number], Cell>>;
export type PairRecord = Readonly<Record<(typeof pairColumns)[number], Cell>>;

/** A finding as plain cells, in the unit that the `quantity` cell names; `earthRadius` [m] where the user chose another. */
export function findingRecord(finding: Finding, earthRadius = EARTH_RADIUS): FindingRecord {
  const { row, quantity, value, expected } = finding;
  const shown = (x: number | undefined) => (x === undefined ? undefined : inDisplayUnit(quantity, x, earthRadius));
  return {
    row: row.row,
    name: row.name,
    rule: finding.rule,
    severity: finding.severity,
    quantity: displayName(quantity),
    value: typeof value === "string" ? value : shown(value),
    expected: shown(expected),
    significance_sigma: finding.significanceSigma,
    explanation: finding.explanation,
    remedy: finding.remedy,
  };
}

/** Two lists as plain cells: a line for every quantity of every pair, then the rows that found no partner, or several. */
export function pairRecords(match: ListMatch, comparison: ListComparison, earthRadius = EARTH_RADIUS): PairRecord[] {
  const verdicts = new Map(comparison.verdicts.map((change) => [change.pair, change]));
  const pairLine = (pair: MatchedPair) => ({
    ...emptyPair,
    name: pair.row.name,
    name_other: pair.other.name,
    match: pair.method,
    verdict: verdicts.get(pair)?.verdict,
    verdict_other: verdicts.get(pair)?.verdictOther,
  });
  const compared = new Set(comparison.tensions.map(({ pair }) => pair));
  return [
    ...comparison.tensions.map(({ pair, quantity, value, other, tensionSigma }) => ({
      ...pairLine(pair),
      quantity: displayName(quantity),
      value: inDisplayUnit(quantity, value.value, earthRadius),
      value_other: inDisplayUnit(quantity, other.value, earthRadius),
      tension_sigma: tensionSigma,
    })),
    ...match.pairs.filter((pair) => !compared.has(pair)).map(pairLine),
    ...match.ambiguous.flatMap(({ row, candidates }) =>
      candidates.map((other) => ({ ...emptyPair, name: row.name, name_other: other.name, match: "ambiguous" })),
    ),
    ...match.unmatched.map(({ name }) => ({ ...emptyPair, name, match: "only-first" })),
    ...match.unmatchedOther.map(({ name }) => ({ ...emptyPair, name_other: name, match: "only-second" })),
  ];
}

const emptyPair: PairRecord = {
  name: undefined,
  name_other: undefined,
  match: undefined,
  quantity: undefined,
  value: undefined,
  value_other: undefined,
  tension_sigma: undefined,
  verdict: undefined,
  verdict_other: undefined,
};
