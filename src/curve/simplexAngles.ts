/**
 * Coordinates of the simplex of mass fractions f_1…f_K (centre to surface, sum 1) in which thin layers and small cores
 * have room, K - 1 angles from 0 to 1, outermost component first:
 *   s_k = f_k / (f_1 + … + f_k) = sin²(πφ_k/2),   k = K, K - 1, … 2
 * R is even in each angle about 0 and about 1, as far as it is smooth in the fractions.
 */
export function fractionsAt(angles: ArrayLike<number>): number[] {
  const fractions = new Array<number>(angles.length + 1);
  let left = 1;
  for (let d = 0; d < angles.length; d++) {
    const share = Math.sin((Math.PI / 2) * angles[d]) ** 2;
    fractions[angles.length - d] = left * share;
    // cos² instead of 1 - share: nothing is lost where the share is nearly all.
    left *= Math.cos((Math.PI / 2) * angles[d]) ** 2;
  }
  fractions[0] = left;
  return fractions;
}

/** Writes the angles of mass fractions into `angles`; 0 for a share of nothing. */
export function anglesOf(fractions: ArrayLike<number>, angles: Float64Array): void {
  let within = fractions[0];
  for (let k = 1; k < fractions.length; k++) {
    const inner = within;
    within += fractions[k];
    angles[fractions.length - 1 - k] = (2 / Math.PI) * Math.atan2(Math.sqrt(fractions[k]), Math.sqrt(inner));
  }
}
