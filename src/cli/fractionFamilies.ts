import { type CompositionFamily, innerFractionFamily, outerFractionFamily } from "../inference/twoPartFamily.ts";
import type { Composition } from "../library/composition.ts";
import type { Library } from "../library/library.ts";

/** A family of planets by one mass fraction, as outputs call it. */
export interface FractionFamily {
  readonly title: string;
  /** Of the fraction; a column's name starts with it. */
  readonly column: string;
  readonly parts: readonly Composition[];
  readonly family: CompositionFamily;
}

const families = {
  "iron-silicate": {
    title: "core mass fraction, if iron and silicate",
    column: "core_mass_fraction",
    parts: ["iron", "silicate"],
    make: innerFractionFamily,
  },
  "earth-like-water": {
    title: "water mass fraction, if on an Earth-like interior",
    column: "water_mass_fraction",
    parts: ["earth-like", "water"],
    make: outerFractionFamily,
  },
} as const;

export type FamilyName = keyof typeof families;

export const familyNames = Object.keys(families) as FamilyName[];

export function fractionFamily(name: FamilyName, library: Library): FractionFamily {
  const { parts, make, ...names } = families[name];
  const [inner, outer] = parts.map((part) => library.composition(part));
  return { ...names, parts: [inner, outer], family: make(inner, outer) };
}
