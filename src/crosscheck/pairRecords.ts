import type { MeasuredQuantity, PlanetRow } from "../planets/quantity.ts";
import { EARTH_RADIUS } from "../units/constants.ts";
import type { ListComparison } from "./compareLists.ts";
import { displayName, inDisplayUnit } from "./displayUnits.ts";
import type { ListMatch, MatchedPair } from "./listMatch.ts";
import type { QuantityTension } from "./tension.ts";

/** Columns of two lists compared, in order; version 1. Later versions only add columns at the end. */
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
  "minus",
  "plus",
  "kind",
  "minus_other",
  "plus_other",
  "kind_other",
  "row",
  "row_other",
  "choice",
  "choice_other",
] as const;

type Cell = string | number | undefined;
export type PairRecord = Readonly<Partial<Record<(typeof pairColumns)[number], Cell>>>;

export interface PairRecordOptions {
  /** [m], where the user chose another. */
  readonly earthRadius?: number;
  /** How a row was come by, where a planet had several. */
  readonly choiceOf?: (row: PlanetRow) => string | undefined;
}

/** Two lists as plain cells: a line for every quantity of every pair, then the rows that found no partner, or several. */
export function pairRecords(
  match: ListMatch,
  comparison: ListComparison,
  { earthRadius = EARTH_RADIUS, choiceOf = () => undefined }: PairRecordOptions = {},
): PairRecord[] {
  const verdicts = new Map(comparison.verdicts.map((change) => [change.pair, change]));
  const own = (row: PlanetRow) => ({ name: row.name, row: row.row, choice: choiceOf(row) });
  const others = (row: PlanetRow) => ({ name_other: row.name, row_other: row.row, choice_other: choiceOf(row) });
  const pairLine = (pair: MatchedPair): PairRecord => ({
    ...own(pair.row),
    ...others(pair.other),
    match: pair.method,
    verdict: verdicts.get(pair)?.verdict,
    verdict_other: verdicts.get(pair)?.verdictOther,
  });
  const compared = new Set(comparison.tensions.map(({ pair }) => pair));
  return [
    ...comparison.tensions.map((tension) => ({ ...pairLine(tension.pair), ...tensionCells(tension, earthRadius) })),
    ...match.pairs.filter((pair) => !compared.has(pair)).map(pairLine),
    ...match.ambiguous.flatMap(({ row, candidates }) =>
      candidates.map((other) => ({ ...own(row), ...others(other), match: "ambiguous" })),
    ),
    ...match.unmatched.map((row) => ({ ...own(row), match: "only-first" })),
    ...match.unmatchedOther.map((row) => ({ ...others(row), match: "only-second" })),
  ];
}

function tensionCells({ quantity, value, other, tensionSigma }: QuantityTension, earthRadius: number): PairRecord {
  const shown = (x: number | undefined) => (x === undefined ? undefined : inDisplayUnit(quantity, x, earthRadius));
  const sides = ({ minus, plus }: MeasuredQuantity) => [shown(minus), shown(plus)];
  const [minus, plus] = sides(value);
  const [minusOther, plusOther] = sides(other);
  return {
    quantity: displayName(quantity),
    value: shown(value.value),
    value_other: shown(other.value),
    tension_sigma: tensionSigma,
    minus,
    plus,
    kind: value.kind,
    minus_other: minusOther,
    plus_other: plusOther,
    kind_other: other.kind,
  };
}
