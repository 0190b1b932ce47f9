/**
 * Coefficients of the Helmholtz energy of water, as published.
 * Source  IAPWS R6-95(2018), Tables 1 and 2; Wagner & Pruss 2002, J. Phys. Chem. Ref. Data 31, 387, doi:10.1063/1.1461829
 */

/** Critical point and specific gas constant [J kg^-1 K^-1], Section 2. */
export const CRITICAL_TEMPERATURE = 647.096;
export const CRITICAL_DENSITY = 322;
export const CRITICAL_PRESSURE = 22.064e6;
export const WATER_GAS_CONSTANT = 461.51805;

/** Ideal part: ln delta + constant + tauFactor tau + logFactor ln tau + sum n ln(1 - exp(-gamma tau)). */
export const idealPart = {
  constant: -8.3204464837497,
  tauFactor: 6.6832105275932,
  logFactor: 3.00632,
  vibrations: [
    { n: 0.012436, gamma: 1.28728967 },
    { n: 0.97315, gamma: 3.53734222 },
    { n: 1.2795, gamma: 7.74073708 },
    { n: 0.96956, gamma: 9.24437796 },
    { n: 0.24873, gamma: 27.5075105 },
  ],
} as const;

/** n delta^d tau^t exp(-delta^c - alpha (delta - epsilon)^2 - beta (tau - gamma)^2); absent keys leave out their factor. */
export interface RegularTerm {
  readonly n: number;
  readonly d: number;
  readonly t: number;
  readonly c?: number;
  readonly gauss?: { readonly alpha: number; readonly epsilon: number; readonly beta: number; readonly gamma: number };
}

export const regularTerms: readonly RegularTerm[] = [
  { n: 0.012533547935523, d: 1, t: -0.5 },
  { n: 7.8957634722828, d: 1, t: 0.875 },
  { n: -8.7803203303561, d: 1, t: 1 },
  { n: 0.31802509345418, d: 2, t: 0.5 },
  { n: -0.26145533859358, d: 2, t: 0.75 },
  { n: -0.0078199751687981, d: 3, t: 0.375 },
  { n: 0.0088089493102134, d: 4, t: 1 },
  { n: -0.66856572307965, d: 1, t: 4, c: 1 },
  { n: 0.20433810950965, d: 1, t: 6, c: 1 },
  { n: -6.6212605039687e-5, d: 1, t: 12, c: 1 },
  { n: -0.19232721156002, d: 2, t: 1, c: 1 },
  { n: -0.25709043003438, d: 2, t: 5, c: 1 },
  { n: 0.16074868486251, d: 3, t: 4, c: 1 },
  { n: -0.04009282892587, d: 4, t: 2, c: 1 },
  { n: 3.9343422603254e-7, d: 4, t: 13, c: 1 },
  { n: -7.5941377088144e-6, d: 5, t: 9, c: 1 },
  { n: 0.00056250979351888, d: 7, t: 3, c: 1 },
  { n: -1.5608652257135e-5, d: 9, t: 4, c: 1 },
  { n: 1.1537996422951e-9, d: 10, t: 11, c: 1 },
  { n: 3.6582165144204e-7, d: 11, t: 4, c: 1 },
  { n: -1.3251180074668e-12, d: 13, t: 13, c: 1 },
  { n: -6.2639586912454e-10, d: 15, t: 1, c: 1 },
  { n: -0.10793600908932, d: 1, t: 7, c: 2 },
  { n: 0.017611491008752, d: 2, t: 1, c: 2 },
  { n: 0.22132295167546, d: 2, t: 9, c: 2 },
  { n: -0.40247669763528, d: 2, t: 10, c: 2 },
  { n: 0.58083399985759, d: 3, t: 10, c: 2 },
  { n: 0.0049969146990806, d: 4, t: 3, c: 2 },
  { n: -0.031358700712549, d: 4, t: 7, c: 2 },
  { n: -0.74315929710341, d: 4, t: 10, c: 2 },
  { n: 0.4780732991548, d: 5, t: 10, c: 2 },
  { n: 0.020527940895948, d: 6, t: 6, c: 2 },
  { n: -0.13636435110343, d: 6, t: 10, c: 2 },
  { n: 0.014180634400617, d: 7, t: 10, c: 2 },
  { n: 0.0083326504880713, d: 9, t: 1, c: 2 },
  { n: -0.029052336009585, d: 9, t: 2, c: 2 },
  { n: 0.038615085574206, d: 9, t: 3, c: 2 },
  { n: -0.020393486513704, d: 9, t: 4, c: 2 },
  { n: -0.0016554050063734, d: 9, t: 8, c: 2 },
  { n: 0.0019955571979541, d: 10, t: 6, c: 2 },
  { n: 0.00015870308324157, d: 10, t: 9, c: 2 },
  { n: -1.638856834253e-5, d: 12, t: 8, c: 2 },
  { n: 0.043613615723811, d: 3, t: 16, c: 3 },
  { n: 0.034994005463765, d: 4, t: 22, c: 3 },
  { n: -0.076788197844621, d: 4, t: 23, c: 3 },
  { n: 0.022446277332006, d: 5, t: 23, c: 3 },
  { n: -6.2689710414685e-5, d: 14, t: 10, c: 4 },
  { n: -5.5711118565645e-10, d: 3, t: 50, c: 6 },
  { n: -0.19905718354408, d: 6, t: 44, c: 6 },
  { n: 0.31777497330738, d: 6, t: 46, c: 6 },
  { n: -0.11841182425981, d: 6, t: 50, c: 6 },
  { n: -31.306260323435, d: 3, t: 0, gauss: { alpha: 20, epsilon: 1, beta: 150, gamma: 1.21 } },
  { n: 31.546140237781, d: 3, t: 1, gauss: { alpha: 20, epsilon: 1, beta: 150, gamma: 1.21 } },
  { n: -2521.3154341695, d: 3, t: 4, gauss: { alpha: 20, epsilon: 1, beta: 250, gamma: 1.25 } },
];

/** n Delta^b delta exp(-C (delta-1)^2 - D (tau-1)^2), Delta = theta^2 + B q^a, theta = 1 - tau + A q^(1/(2 beta)), q = (delta-1)^2. */
export const criticalTerms = [
  { n: -0.14874640856724, a: 3.5, b: 0.85, B: 0.2, C: 28, D: 700, A: 0.32, beta: 0.3 },
  { n: 0.31806110878444, a: 3.5, b: 0.95, B: 0.2, C: 32, D: 800, A: 0.32, beta: 0.3 },
] as const;
