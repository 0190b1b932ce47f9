import { ModelRangeError } from "../../errors.ts";

/** Energy, heat capacity and entropy of one vibration's three directions, each over its classical scale. */
export interface DebyeState {
  /** E / (3 R T) = D3(t), without the zero-point energy. */
  readonly energy: number;
  /** c_V / 3R = 4 D3(t) - 3t / (e^t - 1). */
  readonly heatCapacity: number;
  /** S / 3R = (4/3) D3(t) - ln(1 - e^-t). */
  readonly entropy: number;
}

/** Below this argument the power series (radius of convergence 2π) is the shorter sum, above it the exponential one. */
const SERIES_LIMIT = 2;
const PI4_OVER_15 = Math.PI ** 4 / 15;

/** Bernoulli numbers B2, B4, … B30. */
const BERNOULLI = [
  1 / 6,
  -1 / 30,
  1 / 42,
  -1 / 30,
  5 / 66,
  -691 / 2730,
  7 / 6,
  -3617 / 510,
  43867 / 798,
  -174611 / 330,
  854513 / 138,
  -236364091 / 2730,
  8553103 / 6,
  -23749461029 / 870,
  8615841276005 / 14322,
];

/** Coefficients of t², t⁴, … : 3 B_2k / ((2k + 3) (2k)!). */
const SERIES = BERNOULLI.map((bernoulli, i) => {
  const order = 2 * (i + 1);
  let factorial = 1;
  for (let n = 2; n <= order; n++) factorial *= n;
  return (3 * bernoulli) / ((order + 3) * factorial);
});

/**
 * Third Debye function.
 * Formula D3(t) = (3/t³) ∫0^t x³ / (e^x - 1) dx
 * Range   0 <= t <= Infinity; relative error below 1e-14
 * Source  Debye 1912, Ann. Phys. 344, 789; series as in Abramowitz & Stegun 1972, 27.1.1 and 27.1.2
 * Throws  ModelRangeError `debye-argument`
 * Checked test/eos/thermal/debye.test.ts
 */
export function debyeFunction(t: number): number {
  if (!(t >= 0)) {
    throw new ModelRangeError("debye-argument", `Debye temperature over temperature is ${t}; it must be 0 or more.`, {
      quantity: "debye temperature / temperature",
      value: t,
      minimum: 0,
    });
  }
  return t < SERIES_LIMIT ? powerSeries(t) : exponentialSeries(t);
}

function powerSeries(t: number): number {
  const t2 = t * t;
  let sum = 0;
  for (let k = SERIES.length - 1; k >= 0; k--) sum = t2 * (sum + SERIES[k]);
  return 1 - (3 / 8) * t + sum;
}

function exponentialSeries(t: number): number {
  const ratio = Math.exp(-t);
  let tail = 0;
  let power = ratio;
  for (let k = 1; power > 1e-18; k++) {
    const inverse = 1 / k;
    tail += power * inverse * (t * t * t + 3 * inverse * (t * t + 2 * inverse * (t + inverse)));
    power *= ratio;
  }
  return (3 / (t * t * t)) * (PI4_OVER_15 - tail);
}

/**
 * The thermodynamic functions of a Debye solid at t = Debye temperature / temperature.
 * Source  e.g. Poirier 2000, Introduction to the Physics of the Earth's Interior, section 3.2
 * Checked test/eos/thermal/debye.test.ts
 */
export function debyeState(t: number): DebyeState {
  const energy = debyeFunction(t);
  const bose = t === 0 ? 1 : t === Number.POSITIVE_INFINITY ? 0 : t / Math.expm1(t);
  return { energy, heatCapacity: 4 * energy - 3 * bose, entropy: (4 / 3) * energy - Math.log(-Math.expm1(-t)) };
}
