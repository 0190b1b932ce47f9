import type { Composition, Layer } from "../library/composition.ts";

/** Compositions by one mass fraction, 0 to 1. */
export type CompositionFamily = (fraction: number) => Composition;

/**
 * All planets with one composition's layers inside another's. The fraction is the outer part's share of the mass (`1 - f`
 * of it is the inner's); the surface is the outer part's.
 */
export function outerFractionFamily(inner: Composition, outer: Composition): CompositionFamily {
  return (fraction) => ({
    name: `${inner.name}+${outer.name}`,
    title: `${outer.title} (mass fraction ${fraction}) on ${inner.title}`,
    surface: outer.surface,
    layers: [...scaled(inner.layers, 1 - fraction), ...scaled(outer.layers, fraction)],
  });
}

/** The same family by the share of the inner part, e.g. the core mass fraction. */
export function innerFractionFamily(inner: Composition, outer: Composition): CompositionFamily {
  const byOuter = outerFractionFamily(inner, outer);
  return (fraction) => byOuter(1 - fraction);
}

function scaled(layers: readonly Layer[], share: number): Layer[] {
  return share === 0 ? [] : layers.map((layer) => ({ ...layer, massFraction: layer.massFraction * share }));
}
