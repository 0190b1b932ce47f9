import type { WaterState } from "./waterState.ts";

/** IAPWS R10-06(2009), Tables 1 and 2; the entropy constant is that of the IAPWS-95 reference state. */
const TRIPLE_TEMPERATURE = 273.16;
const TRIPLE_PRESSURE = 611.657;
const NORMAL_PRESSURE = 101325 / TRIPLE_PRESSURE;
const s0 = -3327.33756492168;
const g0 = [-632020.233335886, 0.655022213658955, -1.89369929326131e-8, 3.39746123271053e-15, -5.56464869058991e-22];

type Complex = readonly [re: number, im: number];
const t1: Complex = [0.0368017112855051, 0.0510878114959572];
const r1: Complex = [44.7050716285388, 65.6876847463481];
const t2: Complex = [0.337315741065416, 0.335449415919309];
const r2: readonly Complex[] = [
  [-72.597457432922, -78.100842711287],
  [-5.57107698030123e-5, 4.64578634580806e-5],
  [2.34801409215913e-11, -2.85651142904972e-11],
];

export interface IceIhState extends WaterState {
  readonly gibbsEnergy: number;
  readonly enthalpy: number;
  readonly entropy: number;
  readonly isentropicBulkModulus: number;
}

/**
 * Ice Ih at a pressure [Pa] and temperature [K], from its Gibbs energy g(T, p); energies count from the liquid at the
 * triple point, as in `fluidState`.
 * Source  IAPWS R10-06(2009), eq. 1 and Tables 3 and 4; Feistel & Wagner 2006, J. Phys. Chem. Ref. Data 35, 1021
 * Valid   up to 273.16 K and 208.566 MPa; smooth a little beyond, where the metastable continuation is needed
 * Checked Table 6 of the release and differences of g: test/eos/water/iceIh.test.ts
 */
export function iceIhState(pressure: number, temperature: number): IceIhState {
  const tau = temperature / TRIPLE_TEMPERATURE;
  const pi = pressure / TRIPLE_PRESSURE - NORMAL_PRESSURE;
  const [g, gP, gPP] = polynomial(g0, pi);
  const [re, reP, rePP] = polynomial(
    r2.map((c) => c[0]),
    pi,
  );
  const [im, imP, imPP] = polynomial(
    r2.map((c) => c[1]),
    pi,
  );
  const hard = vibration(t1, tau);
  const soft = vibration(t2, tau);

  const gibbsEnergy =
    g -
    s0 * TRIPLE_TEMPERATURE * tau +
    TRIPLE_TEMPERATURE * (realPart(r1, hard.value) + realPart([re, im], soft.value));
  const volume = gP + TRIPLE_TEMPERATURE * realPart([reP, imP], soft.value);
  const volumeSlope = gPP + TRIPLE_TEMPERATURE * realPart([rePP, imPP], soft.value);
  const entropy = s0 - realPart(r1, hard.first) - realPart([re, im], soft.first);
  const volumeByTemperature = realPart([reP, imP], soft.first);
  const entropySlope = -(realPart(r1, hard.second) + realPart([re, im], soft.second)) / TRIPLE_TEMPERATURE;
  return {
    gibbsEnergy,
    enthalpy: gibbsEnergy + temperature * entropy,
    entropy,
    density: 1 / volume,
    isothermalBulkModulus: -volume / volumeSlope,
    isentropicBulkModulus: -volume / (volumeSlope + volumeByTemperature ** 2 / entropySlope),
    expansivity: volumeByTemperature / volume,
    heatCapacity: temperature * entropySlope,
  };
}

/** Value and first two pressure derivatives [Pa^-1, Pa^-2] of a polynomial in pi. */
function polynomial(coefficients: readonly number[], pi: number): [number, number, number] {
  let value = 0;
  let first = 0;
  let second = 0;
  for (const c of coefficients.toReversed()) {
    second = second * pi + 2 * first;
    first = first * pi + value;
    value = value * pi + c;
  }
  return [value, first / TRIPLE_PRESSURE, second / TRIPLE_PRESSURE ** 2];
}

/** (t-tau) ln(t-tau) + (t+tau) ln(t+tau) - 2 t ln t - tau^2/t with its first two derivatives in tau. */
function vibration(t: Complex, tau: number): { value: Complex; first: Complex; second: Complex } {
  const minus: Complex = [t[0] - tau, t[1]];
  const plus: Complex = [t[0] + tau, t[1]];
  const inverse = reciprocal(t);
  const logMinus = logarithm(minus);
  const logPlus = logarithm(plus);
  const fromMinus = product(minus, logMinus);
  const fromPlus = product(plus, logPlus);
  const fromZero = product(t, logarithm(t));
  const inverseMinus = reciprocal(minus);
  const inversePlus = reciprocal(plus);
  const combine = (f: (part: 0 | 1) => number): Complex => [f(0), f(1)];
  return {
    value: combine((i) => fromMinus[i] + fromPlus[i] - 2 * fromZero[i] - tau * tau * inverse[i]),
    first: combine((i) => logPlus[i] - logMinus[i] - 2 * tau * inverse[i]),
    second: combine((i) => inverseMinus[i] + inversePlus[i] - 2 * inverse[i]),
  };
}

const realPart = (a: Complex, b: Complex): number => a[0] * b[0] - a[1] * b[1];
const product = (a: Complex, b: Complex): Complex => [realPart(a, b), a[0] * b[1] + a[1] * b[0]];
const logarithm = (a: Complex): Complex => [Math.log(Math.hypot(a[0], a[1])), Math.atan2(a[1], a[0])];
const reciprocal = (a: Complex): Complex => {
  const square = a[0] * a[0] + a[1] * a[1];
  return [a[0] / square, -a[1] / square];
};
