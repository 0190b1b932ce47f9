import type { Composition } from "./composition.ts";

/**
 * What is thought of a family's mass fractions before the planet is measured: `logUniform` components each by
 * themselves, the others flat over the proportions of what is left (the flat Dirichlet distribution), all of it times the
 * `normal` densities, normalised.
 */
export interface FamilyPrior {
  readonly fractions: "flat";
  readonly logUniform: readonly { readonly component: string; readonly from: number; readonly to: number }[];
  /** In a component's share of the mass of some components. */
  readonly normal: readonly {
    readonly component: string;
    readonly among: readonly string[];
    readonly mean: number;
    readonly sigma: number;
  }[];
}

/** One part of a family's planets, of any mass fraction; its layers keep their shares of it. */
export interface FamilyComponent {
  readonly name: string;
  readonly composition: Composition;
}

/** All planets made of some components, centre to surface, in any proportion. */
export interface Family {
  readonly name: string;
  readonly title: string;
  readonly components: readonly FamilyComponent[];
  readonly prior: FamilyPrior;
}

/** The member with these mass fractions, one a component; the surface is that of the outermost component, present or not. */
export function familyMember({ name, title, components }: Family, fractions: ArrayLike<number>): Composition {
  const { surface } = components[components.length - 1].composition;
  const layers = components.flatMap(({ composition }, k) =>
    fractions[k] === 0
      ? []
      : composition.layers.map((layer) => ({ ...layer, massFraction: layer.massFraction * fractions[k] })),
  );
  return { name, title, surface, layers };
}
