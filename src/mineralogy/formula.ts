import { parseFormula } from "../eos/elements.ts";

/** Atoms of each element in a chemical formula, by symbol. */
export function atomCounts(formula: string): ReadonlyMap<string, number> {
  const counts = new Map<string, number>();
  for (const { element, count } of parseFormula(formula)) {
    counts.set(element.symbol, (counts.get(element.symbol) ?? 0) + count);
  }
  return counts;
}

/** Number of atoms in a formula unit. */
export function atomTotal(formula: string): number {
  return parseFormula(formula).reduce((sum, { count }) => sum + count, 0);
}

/** Molar mass of a formula unit [kg/mol]. */
export function molarMass(formula: string): number {
  return parseFormula(formula).reduce((sum, { element, count }) => sum + count * element.atomicWeight, 0) / 1000;
}
