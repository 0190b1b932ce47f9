import type { PlanetRow } from "../planets/quantity.ts";
import type { AmbiguousMatch, MatchedPair, MatchMethod, StepResult } from "./listMatch.ts";

/** Sorts candidates into pairs, each the only candidate of the other, and ambiguous rows. */
export function pairUp(candidates: ReadonlyMap<PlanetRow, readonly PlanetRow[]>, method: MatchMethod): StepResult {
  const claims = new Map<PlanetRow, number>();
  for (const others of candidates.values()) {
    for (const other of others) claims.set(other, (claims.get(other) ?? 0) + 1);
  }
  const pairs: MatchedPair[] = [];
  const ambiguous: AmbiguousMatch[] = [];
  for (const [row, others] of candidates) {
    const [only] = others;
    if (!only) continue;
    if (others.length === 1 && claims.get(only) === 1) pairs.push({ row, other: only, method });
    else ambiguous.push({ row, candidates: others, method });
  }
  return { pairs, ambiguous };
}
