import { ConvergenceError, ModelRangeError } from "../../errors.ts";
import { residualHelmholtz } from "./iapws95.ts";
import {
  CRITICAL_DENSITY,
  CRITICAL_PRESSURE,
  CRITICAL_TEMPERATURE,
  WATER_GAS_CONSTANT,
} from "./iapws95Coefficients.ts";

export const TRIPLE_POINT_TEMPERATURE = 273.16;

export interface Saturation {
  /** [Pa] */
  readonly pressure: number;
  /** [kg m^-3] */
  readonly liquidDensity: number;
  readonly vapourDensity: number;
}

/** Near the critical point the two phases differ too little for Newton's method in double precision. */
const CRITICAL_MARGIN = 1e-6;
const MAX_ITERATIONS = 40;
/** Last relative step in density (what is left is rounding); divided by the distance to the critical temperature. */
const TOLERANCE = 1e-11;

/**
 * Liquid and vapour in equilibrium at a temperature [K]: equal pressure and Gibbs energy (Maxwell's construction).
 * With J = delta (1 + delta phi_delta) and K = delta phi_delta + phi + ln delta, both phases have the same J and K.
 * Source  IAPWS R6-95(2018), eqs. 7a-7c; Newton's method in (J, K) after Akasaka 2008, J. Therm. Sci. Tech. 3, 442
 * Valid   248.15 K (supercooled liquid) to the critical point; above T_c - 0.65 mK the critical values are returned
 * Throws  ModelRangeError `water-saturation-range` outside it
 * Checked Table 8 of the release: test/eos/water/saturation.test.ts
 */
export function saturation(temperature: number): Saturation {
  if (!(temperature >= 248.15 && temperature <= CRITICAL_TEMPERATURE)) {
    throw new ModelRangeError(
      "water-saturation-range",
      `Temperature ${temperature} K has no liquid-vapour equilibrium: between 248.15 and ${CRITICAL_TEMPERATURE} K it has.`,
      { quantity: "temperature", value: temperature, minimum: 248.15, maximum: CRITICAL_TEMPERATURE },
    );
  }
  const distance = 1 - temperature / CRITICAL_TEMPERATURE;
  if (distance < CRITICAL_MARGIN) {
    return { pressure: CRITICAL_PRESSURE, liquidDensity: CRITICAL_DENSITY, vapourDensity: CRITICAL_DENSITY };
  }
  const tau = CRITICAL_TEMPERATURE / temperature;
  let liquid = liquidGuess(distance);
  let vapour = vapourGuess(distance);
  for (let iteration = 0; iteration < MAX_ITERATIONS; iteration++) {
    const l = equilibriumTerms(liquid, tau);
    const v = equilibriumTerms(vapour, tau);
    const excessJ = v.j - l.j;
    const excessK = v.k - l.k;
    const determinant = v.jSlope * l.kSlope - l.jSlope * v.kSlope;
    const liquidStep = (excessK * v.jSlope - excessJ * v.kSlope) / determinant;
    const vapourStep = (excessK * l.jSlope - excessJ * l.kSlope) / determinant;
    liquid += liquidStep;
    vapour += vapourStep;
    if (Math.abs(liquidStep / liquid) + Math.abs(vapourStep / vapour) < TOLERANCE / distance) {
      const pressure = equilibriumTerms(vapour, tau).j * CRITICAL_DENSITY * WATER_GAS_CONSTANT * temperature;
      return { pressure, liquidDensity: liquid * CRITICAL_DENSITY, vapourDensity: vapour * CRITICAL_DENSITY };
    }
  }
  throw new ConvergenceError(
    "water-saturation",
    `Liquid and vapour of water at ${temperature} K were not balanced in ${MAX_ITERATIONS} steps; report this temperature.`,
    { liquidDensity: liquid * CRITICAL_DENSITY, vapourDensity: vapour * CRITICAL_DENSITY },
  );
}

function equilibriumTerms(delta: number, tau: number) {
  const r = residualHelmholtz(delta, tau);
  return {
    j: delta * (1 + delta * r.delta),
    k: delta * r.delta + r.phi + Math.log(delta),
    jSlope: 1 + 2 * delta * r.delta + delta * delta * r.deltaDelta,
    kSlope: 2 * r.delta + delta * r.deltaDelta + 1 / delta,
  };
}

/** First guesses, good to 1e-3. Source: IAPWS SR1-86(1992), eqs. 2 and 3, coefficients from memory. */
function liquidGuess(distance: number): number {
  const c = Math.cbrt(distance);
  return (
    1 +
    1.99274064 * c +
    1.09965342 * c ** 2 -
    0.510839303 * c ** 5 -
    1.75493479 * c ** 16 -
    45.5170352 * c ** 43 -
    674694.5 * c ** 110
  );
}

function vapourGuess(distance: number): number {
  const c = distance ** (1 / 6);
  return Math.exp(
    -2.0315024 * c ** 2 -
      2.6830294 * c ** 4 -
      5.38626492 * c ** 8 -
      17.2991605 * c ** 18 -
      44.7586581 * c ** 37 -
      63.9201063 * c ** 71,
  );
}
