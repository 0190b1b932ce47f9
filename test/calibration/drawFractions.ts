import type { CompositionPrior } from "../../src/inference/composition/compositionPrior.ts";
import type { RandomNumbers } from "../support/randomNumbers.ts";

/**
 * Mass fractions drawn from a prior, by its description in words instead of its density: log-uniform components by their
 * logarithm, the others sharing what is left in any proportion (a flat Dirichlet: exponential variables over their sum);
 * a draw is kept with the chance that the normal shares leave it.
 */
export function drawFractions(prior: CompositionPrior, random: RandomNumbers): number[] {
  for (;;) {
    const fractions = new Array<number>(prior.componentCount).fill(Number.NaN);
    let left = 1;
    for (const { component, from, to } of prior.logUniform) {
      fractions[component] = from * (to / from) ** random.uniform();
      left -= fractions[component];
    }
    if (left < 0) continue;
    const shares = fractions.map(() => -Math.log(random.uniform()));
    const whole = shares.reduce((sum, share, k) => (Number.isNaN(fractions[k]) ? sum + share : sum), 0);
    const drawn = fractions.map((f, k) => (Number.isNaN(f) ? (left * shares[k]) / whole : f));
    if (random.uniform() < chanceOfShares(prior, drawn)) return drawn;
  }
}

function chanceOfShares({ normal }: CompositionPrior, fractions: readonly number[]): number {
  return normal.reduce((chance, { component, among, mean, sigma }) => {
    const share = fractions[component] / among.reduce((sum, k) => sum + fractions[k], 0);
    return chance * Math.exp(-0.5 * ((share - mean) / sigma) ** 2);
  }, 1);
}
