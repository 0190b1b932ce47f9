import { distance } from "fastest-levenshtein";

/** The known name closest in spelling, if it is close enough to be what was meant. */
export function nearest(name: string, known: readonly string[]): string | undefined {
  const [best] = known
    .map((candidate) => ({ candidate, edits: distance(name.toLowerCase(), candidate.toLowerCase()) }))
    .sort((a, b) => a.edits - b.edits);
  return best !== undefined && best.edits <= Math.max(2, best.candidate.length / 3) ? best.candidate : undefined;
}

/** ` Did you mean "…"?`, or nothing. */
export function suggestion(name: string, known: readonly string[]): string {
  const candidate = nearest(name, known);
  return candidate === undefined ? "" : ` Did you mean "${candidate}"?`;
}
