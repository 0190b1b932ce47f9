/**
 * Table 1 of Salpeter & Zapolsky 1967, Phys. Rev. 158, 876, doi:10.1103/PhysRev.158.876 (from transcriptions): row n
 * holds the coefficients of ε^0, ε^(1/2), ε, ε^(3/2), ε² for β_n.
 */
const TABLE_1 = {
  2: [1.512e-2, 8.955e-2, 1.09e-1, 5.089, -5.98],
  3: [2.181e-3, -4.015e-1, 1.698, -9.566, 9.873],
  4: [-3.328e-4, 5.167e-1, -2.369, 1.349e1, -1.427e1],
  5: [-1.384e-2, -6.52e-1, 3.529, -2.095e1, 2.264e1],
} as const;

/** x0(ζ) of one element with its share of the specific volume. */
export interface ElementFit {
  /** Its specific volume in the compound is `share`·x0³ [m³ kg^-1]. */
  readonly share: number;
  /** ζ / y = Z^(-2/3) */
  readonly scale: number;
  readonly alpha: number;
  readonly phi: number;
  readonly b0: number;
  readonly b1: number;
  readonly b2: number;
  readonly b3: number;
  readonly b4: number;
  readonly b5: number;
}

/**
 * Coefficients of the fit for one element, as in eqs 43 and 45 of Salpeter & Zapolsky 1967. Copies with 4.998e-1 for
 * 4.988e-1 circulate: a misprint.
 */
export function fitElement(atomicNumber: number, share: number): ElementFit {
  const epsilon = Math.cbrt(3 / (32 * Math.PI ** 2 * atomicNumber ** 2));
  const root = Math.sqrt(epsilon);
  const phi = Math.cbrt(3) / 20 + epsilon / (4 * Math.cbrt(3));
  const alpha = 1 / (1.941e-2 - 6.277e-2 * root + 1.076 * epsilon);
  const b0 = phi / (8.884e-3 + 4.988e-1 * root + 5.2604e-1 * epsilon) - 1;
  const beta = (n: keyof typeof TABLE_1): number =>
    TABLE_1[n].reduce((sum, coefficient, power) => sum + coefficient * root ** power, 0) ** -n;
  return {
    share,
    scale: atomicNumber ** (-2 / 3),
    alpha,
    phi,
    b0,
    b1: b0 * alpha + (1 + b0) / phi,
    b2: beta(2),
    b3: beta(3),
    b4: beta(4),
    b5: beta(5),
  };
}
