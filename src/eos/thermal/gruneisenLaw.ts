/** What a volume law of the Debye temperature says at one volume. */
export interface GruneisenState {
  /** Debye temperature over its value at V0. */
  readonly debyeRatio: number;
  /** Grüneisen parameter γ = -d ln θ / d ln V. */
  readonly gamma: number;
  /** dγ / d ln V; γ q where q is defined. */
  readonly gammaSlope: number;
}

/** Debye temperature and Grüneisen parameter as functions of volume. */
export interface GruneisenLaw {
  /** Compression V0/V where the law itself breaks; Infinity if never. */
  readonly maxCompression: number;
  /** At V/V0. */
  at(volumeRatio: number): GruneisenState;
}

/**
 * Finite-strain law.
 * Formula θ² = θ0² (1 + a1 f + a2 f²/2), f = ((V/V0)^(-2/3) - 1)/2, a1 = 6γ0, a2 = -12γ0 + 36γ0² - 18 q0 γ0
 * Source  Stixrude & Lithgow-Bertelloni 2005, Geophys. J. Int. 162, 610, equations 24-28
 * Range   until γ falls to 0, which it does where a2 < 0; beyond, heating would contract
 * Checked test/eos/thermal/gruneisenLaw.test.ts
 */
export function finiteStrainGruneisen(gammaZero: number, qZero: number): GruneisenLaw {
  const a1 = 6 * gammaZero;
  const a2 = -12 * gammaZero + 36 * gammaZero ** 2 - 18 * qZero * gammaZero;
  return {
    maxCompression: a1 > 0 && a2 < 0 ? (1 - (2 * a1) / a2) ** 1.5 : Number.POSITIVE_INFINITY,
    at(volumeRatio) {
      const stretch = volumeRatio ** (-2 / 3);
      const strain = (stretch - 1) / 2;
      const squared = 1 + strain * (a1 + (a2 / 2) * strain);
      const gamma = (stretch * (a1 + a2 * strain)) / (6 * squared);
      return {
        debyeRatio: Math.sqrt(squared),
        gamma,
        gammaSlope: -(2 / 3) * gamma - (stretch * stretch * a2) / (18 * squared) + 2 * gamma * gamma,
      };
    },
  };
}

/**
 * Power law.
 * Formula γ = γ0 (V/V0)^q, θ = θ0 exp((γ0 - γ)/q)
 * Source  e.g. Fei et al. 2016, Geophys. Res. Lett. 43, 6837
 * Checked test/eos/thermal/gruneisenLaw.test.ts
 */
export function powerLawGruneisen(gammaZero: number, q: number): GruneisenLaw {
  return {
    maxCompression: Number.POSITIVE_INFINITY,
    at(volumeRatio) {
      const gamma = gammaZero * volumeRatio ** q;
      const debyeRatio = q === 0 ? volumeRatio ** -gammaZero : Math.exp((gammaZero - gamma) / q);
      return { debyeRatio, gamma, gammaSlope: q * gamma };
    },
  };
}

/**
 * Law with a finite limit at infinite compression.
 * Formula γ = γ∞ + (γ0 - γ∞)(V/V0)^β, θ = θ0 (V/V0)^-γ∞ exp((γ0 - γ∞)(1 - (V/V0)^β)/β)
 * Source  Al'tshuler et al. 1987, J. Appl. Mech. Tech. Phys. 28, 129; as used by Dewaele et al. 2006
 * Checked test/eos/thermal/gruneisenLaw.test.ts
 */
export function altshulerGruneisen(gammaZero: number, gammaInfinite: number, beta: number): GruneisenLaw {
  return {
    maxCompression: Number.POSITIVE_INFINITY,
    at(volumeRatio) {
      const fading = (gammaZero - gammaInfinite) * volumeRatio ** beta;
      return {
        debyeRatio: volumeRatio ** -gammaInfinite * Math.exp((gammaZero - gammaInfinite - fading) / beta),
        gamma: gammaInfinite + fading,
        gammaSlope: beta * fading,
      };
    },
  };
}
