/** The prior of a family's mass fractions; see `FamilyPrior` of the library, which has the same form with names. */
export interface CompositionPrior {
  readonly componentCount: number;
  readonly logUniform: readonly { readonly component: number; readonly from: number; readonly to: number }[];
  readonly normal: readonly {
    readonly component: number;
    readonly among: readonly number[];
    readonly mean: number;
    readonly sigma: number;
  }[];
  /** A further density of the fractions, e.g. of a population; ln, but for a constant. */
  readonly logWeight?: (fractions: ArrayLike<number>) => number;
}

/** Nothing preferred: all proportions alike. */
export function flatPrior(componentCount: number): CompositionPrior {
  return { componentCount, logUniform: [], normal: [] };
}

/**
 * ln of the prior density of mass fractions per unit of all of them but one (whichever), without the constant that
 * normalises it. `logUniform` components count 1/f each; the others are flat over the proportions of what those leave:
 *   p ∝ Π_logUniform 1/f_j · (1 - Σ_logUniform f_j)^-(n - 1) · Π_normal exp(-(share - mean)²/2σ²),   n other components
 * Components outside their bounds are left to the bounds of integration.
 */
export function logPrior(prior: CompositionPrior, fractions: ArrayLike<number>): number {
  let log = 0;
  if (prior.logUniform.length > 0) {
    let left = 1;
    for (const { component } of prior.logUniform) {
      log -= Math.log(fractions[component]);
      left -= fractions[component];
    }
    log -= (prior.componentCount - prior.logUniform.length - 1) * Math.log(left);
  }
  for (const { component, among, mean, sigma } of prior.normal) {
    let whole = 0;
    for (const k of among) whole += fractions[k];
    // Of nothing any share is as good as the expected one.
    if (whole > 0) log -= 0.5 * ((fractions[component] / whole - mean) / sigma) ** 2;
  }
  return log + (prior.logWeight?.(fractions) ?? 0);
}
