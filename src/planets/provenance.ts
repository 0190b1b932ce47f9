import type { QuantityKind } from "./quantity.ts";

/** What provenance columns say about a value, the first that fits; a text that fits none says it was measured. */
const meanings: readonly (readonly [RegExp, QuantityKind | "measured"])[] = [
  [/theor|model/i, "theoretical"],
  [/\bm\s*[-–/]?\s*r\b|relation|forecast|estimat|predict/i, "from-relation"],
  // M sin i divided by a known sin i is the mass itself.
  [/sin\s*\(?\s*i\s*\)?\s*\/\s*sin/i, "measured"],
  [/sin\s*\(?\s*i(?![a-z])|minimum/i, "minimum"],
];

const remembered = new Map<string, QuantityKind>();

/** The kind a provenance text stands for: `M-R relationship`, `Msini`, `Msin(i)/sin(i)`, `Theoretical`, … */
export function kindOfProvenance(text: string): QuantityKind {
  let kind = remembered.get(text);
  if (kind === undefined) {
    kind = meanings.find(([pattern]) => pattern.test(text))?.[1] ?? "measured";
    if (remembered.size < 1000) remembered.set(text, kind);
  }
  return kind;
}
