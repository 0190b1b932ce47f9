import type { PlanetRow } from "../planets/quantity.ts";
import type { AmbiguousMatch, ListMatch, MatchedPair, StepResult } from "./listMatch.ts";
import { matchByName } from "./matchByName.ts";
import { matchByOrbit } from "./matchByOrbit.ts";

export interface MatchOptions {
  /** Other name → name, beyond the aliases that the rows carry themselves. */
  readonly aliases?: ReadonlyMap<string, string>;
  /** Largest distance of two positions of one star [rad]; one arc minute covers decades of proper motion. */
  readonly separation?: number;
  /** Largest relative difference of two periods of one planet. */
  readonly periodTolerance?: number;
}

const ARC_MINUTE = Math.PI / 180 / 60;

/**
 * Pairs the rows of two lists: by name, by alias, by name without case, by host where one of the names lacks the
 * planet's letter, and last by position on the sky and period. Each step sees only what the earlier ones left, and
 * takes only what is unambiguous. One row a planet is expected: choose publications first.
 * Checked by test/crosscheck/matchLists.test.ts
 */
export function matchLists(
  rows: readonly PlanetRow[],
  others: readonly PlanetRow[],
  options: MatchOptions = {},
): ListMatch {
  const { aliases = new Map(), separation = ARC_MINUTE, periodTolerance = 0.01 } = options;
  const steps: ((left: readonly PlanetRow[], leftOther: readonly PlanetRow[]) => StepResult)[] = [
    ...matchByName(aliases),
    (left, leftOther) => matchByOrbit(left, leftOther, separation, periodTolerance),
  ];
  let unmatched = rows;
  let unmatchedOther = others;
  const pairs: MatchedPair[] = [];
  const ambiguous: AmbiguousMatch[] = [];
  for (const step of steps) {
    const found = step(unmatched, unmatchedOther);
    pairs.push(...found.pairs);
    ambiguous.push(...found.ambiguous);
    const taken = new Set([...found.pairs.map(({ row }) => row), ...found.ambiguous.map(({ row }) => row)]);
    const takenOther = new Set([
      ...found.pairs.map(({ other }) => other),
      ...found.ambiguous.flatMap(({ candidates }) => candidates),
    ]);
    unmatched = unmatched.filter((row) => !taken.has(row));
    unmatchedOther = unmatchedOther.filter((row) => !takenOther.has(row));
  }
  pairs.sort((a, b) => a.row.row - b.row.row);
  return { pairs, ambiguous, unmatched, unmatchedOther };
}
