import type { Composition } from "./composition.ts";
import type { FamilyPrior } from "./familySchema.ts";

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
