import { ModelRangeError } from "../../errors.ts";
import { invertIncreasing } from "../invert.ts";
import { type FluidState, fluidState } from "./fluidState.ts";
import { CRITICAL_DENSITY, CRITICAL_TEMPERATURE, WATER_GAS_CONSTANT } from "./iapws95Coefficients.ts";
import { saturation, TRIPLE_POINT_TEMPERATURE } from "./saturation.ts";

/**
 * How far the fluid is carried [Pa, K]. IAPWS-95 is calibrated to 1 GPa and 1273 K; beyond, its extrapolation stays smooth
 * and monotone. On the shock Hugoniot its density differs from the fit of Steinberg 1987 (UCRL-MA-106439, water;
 * coefficients from memory) by +1.4 % at 1.7 GPa, which is mostly the fit's, +0.4 % at 5.5 GPa, -0.6 % at 13 GPa, -1.4 %
 * at 26 GPa, -2.9 % at 49 GPa (3400 K) and -6.3 % at 84 GPa (6000 K): test/eos/water/extrapolation.test.ts. Dissociation
 * (above about 2000 K at low pressure) and superionic water (above about 2000 K at 50 GPa) are not in it.
 */
export const fluidLimits = {
  calibratedPressure: 1e9,
  calibratedTemperature: 1273,
  maxPressure: 100e9,
  maxTemperature: 5000,
} as const;

/** Below the critical temperature a pressure may belong to two densities; `dense` is the liquid one. */
export type FluidBranch = "vapour" | "dense";

const LOWEST_LIQUID_DENSITY = 900;
const HIGHEST_DENSITY = 4000;
/** A state this little beyond saturation is still found, so that saturation itself always is. */
const BEYOND_SATURATION = 1e-3;

/**
 * Density [kg m^-3] of fluid water at a pressure [Pa] and temperature [K]. Above the critical temperature both
 * branches are the same; below it each ends at saturation.
 * Valid   see `fluidLimits`, which the callers enforce; supercooled liquid only at pressures where IAPWS-95 stays monotone (used down to 251 K)
 * Throws  ModelRangeError `water-pressure-range` without pressure, `water-fluid-range` past saturation
 * Checked inverse of the pressure, on both branches: test/eos/water/fluidDensity.test.ts
 */
export function fluidDensity(pressure: number, temperature: number, branch: FluidBranch): number {
  if (!(pressure > 0)) {
    throw new ModelRangeError(
      "water-pressure-range",
      `Fluid water at ${pressure} Pa has no density; it needs more than 0 Pa.`,
      {
        quantity: "pressure",
        value: pressure,
        minimum: 0,
      },
    );
  }
  const idealGas = pressure / (WATER_GAS_CONSTANT * temperature);
  let lowest = 0.5 * idealGas;
  let highest = HIGHEST_DENSITY;
  if (temperature < TRIPLE_POINT_TEMPERATURE) {
    if (branch === "dense") lowest = LOWEST_LIQUID_DENSITY;
    else highest = 2 * idealGas;
  } else if (temperature < CRITICAL_TEMPERATURE) {
    const { liquidDensity, vapourDensity } = saturation(temperature);
    if (branch === "dense") lowest = liquidDensity * (1 - BEYOND_SATURATION);
    else highest = vapourDensity * (1 + BEYOND_SATURATION);
  } else {
    lowest = Math.min(lowest, CRITICAL_DENSITY);
  }
  const likeMurnaghan = 1000 * (1 + pressure / 3e8) ** (1 / 7);
  const start = branch === "dense" ? Math.min(likeMurnaghan, idealGas) : idealGas;
  let state: FluidState;
  const pressureOf = {
    value(trial: number): number {
      state = fluidState(trial, temperature);
      return state.pressure;
    },
    // Asked for where the value has just been.
    slope: (): number => state.isothermalBulkModulus / state.density,
  };
  const guess = Math.min(Math.max(start, lowest), highest);
  const density = invertIncreasing(pressureOf, pressure, { low: lowest, high: highest, guess });
  if (!(density > lowest && density < highest)) throw noSuchState(pressure, temperature, branch);
  return density;
}

function noSuchState(pressure: number, temperature: number, branch: FluidBranch): ModelRangeError {
  const message =
    `Fluid water has no ${branch} state at ${pressure} Pa and ${temperature} K: ` +
    "the pressure is past saturation, or far above 100 GPa.";
  return new ModelRangeError("water-fluid-range", message, { quantity: "pressure", value: pressure });
}
