/**
 * Value at `x` of the polynomial through the points (xs[i], ys[i]), by Neville's scheme; the abscissae must differ.
 * Source  Press et al. 2007, Numerical Recipes, 3rd ed., section 3.2
 * Checked polynomials are reproduced: test/numerics/extrapolate.test.ts
 */
export function polynomialThrough(xs: readonly number[], ys: readonly number[], x: number): number {
  const column = [...ys];
  for (let width = 1; width < xs.length; width++) {
    for (let i = 0; i + width < xs.length; i++) {
      const left = xs[i];
      const right = xs[i + width];
      column[i] = ((x - right) * column[i] + (left - x) * column[i + 1]) / (left - right);
    }
  }
  return column[0];
}
