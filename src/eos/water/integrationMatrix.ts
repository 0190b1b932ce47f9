/**
 * Weights W with: integral from the first node to node i of f(x) dx = half width * sum_j W[i][j] f(node j), exact where f
 * is a polynomial of this degree. Nodes as `chebyshevNodes`.
 * Source  Clenshaw & Curtis 1960, Numer. Math. 2, 197 (a series of Chebyshev polynomials integrated term by term)
 * Checked test/eos/water/integrationMatrix.test.ts
 */
export function integrationMatrix(degree: number): readonly Float64Array[] {
  const angle = (j: number) => Math.PI * (1 - j / degree);
  const halved = (k: number) => (k === 0 || k === degree ? 0.5 : 1);
  return Array.from({ length: degree + 1 }, (_, i) =>
    Float64Array.from({ length: degree + 1 }, (_, j) => {
      let sum = 0;
      for (let k = 0; k <= degree; k++) {
        sum += halved(k) * Math.cos(k * angle(j)) * polynomialIntegral(k, angle(i));
      }
      return (2 / degree) * halved(j) * sum;
    }),
  );
}

/** Integral of T_k from -1 to cos(angle). */
function polynomialIntegral(k: number, angle: number): number {
  if (k === 0) return Math.cos(angle) + 1;
  if (k === 1) return (Math.cos(angle) ** 2 - 1) / 2;
  const antiderivative = (a: number) => (Math.cos((k + 1) * a) / (k + 1) - Math.cos((k - 1) * a) / (k - 1)) / 2;
  return antiderivative(angle) - antiderivative(Math.PI);
}
