import { InputError } from "../errors.ts";

export interface Element {
  readonly symbol: string;
  readonly atomicNumber: number;
  /** Standard atomic weight, abridged to five digits. */
  readonly atomicWeight: number;
}

/** Hydrogen to nickel, in order of atomic number. Source: IUPAC 2021 abridged standard atomic weights (from memory). */
const weights: readonly (readonly [string, number])[] = [
  ["H", 1.008],
  ["He", 4.0026],
  ["Li", 6.94],
  ["Be", 9.0122],
  ["B", 10.81],
  ["C", 12.011],
  ["N", 14.007],
  ["O", 15.999],
  ["F", 18.998],
  ["Ne", 20.18],
  ["Na", 22.99],
  ["Mg", 24.305],
  ["Al", 26.982],
  ["Si", 28.085],
  ["P", 30.974],
  ["S", 32.06],
  ["Cl", 35.45],
  ["Ar", 39.95],
  ["K", 39.098],
  ["Ca", 40.078],
  ["Sc", 44.956],
  ["Ti", 47.867],
  ["V", 50.942],
  ["Cr", 51.996],
  ["Mn", 54.938],
  ["Fe", 55.845],
  ["Co", 58.933],
  ["Ni", 58.693],
];

const elements: ReadonlyMap<string, Element> = new Map(
  weights.map(([symbol, atomicWeight], i) => [symbol, { symbol, atomicNumber: i + 1, atomicWeight }]),
);

export interface FormulaPart {
  readonly element: Element;
  readonly count: number;
}

/**
 * Reads a chemical formula without brackets, such as `MgSiO3` or `Mg0.9Fe0.1SiO3`.
 * Throws InputError `formula` for anything else, and for elements beyond nickel.
 */
export function parseFormula(formula: string): FormulaPart[] {
  const parts: FormulaPart[] = [];
  const token = /([A-Z][a-z]?)(\d+(?:\.\d+)?)?/y;
  while (token.lastIndex < formula.length || formula === "") {
    const at = token.lastIndex;
    const match = token.exec(formula);
    const element = match && elements.get(match[1]);
    const count = Number(match?.[2] ?? 1);
    if (!element || !(count > 0)) {
      throw new InputError(
        "formula",
        `formula "${formula}": "${formula.slice(at)}" is not an element from H to Ni with a count; ` +
          'write it without brackets or charges, like "MgSiO3" or "Mg0.9Fe0.1SiO3".',
        { column: "formula", found: formula },
      );
    }
    parts.push({ element, count });
  }
  return parts;
}
