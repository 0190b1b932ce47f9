import { idealHelmholtz, residualHelmholtz } from "./iapws95.ts";
import { CRITICAL_DENSITY, CRITICAL_TEMPERATURE, WATER_GAS_CONSTANT } from "./iapws95Coefficients.ts";
import type { WaterState } from "./waterState.ts";

/** A state of fluid water; energies and entropies count from the liquid at the triple point. */
export interface FluidState extends WaterState {
  readonly pressure: number;
  /** Specific internal energy and enthalpy [J kg^-1]. */
  readonly internalEnergy: number;
  readonly enthalpy: number;
  /** Specific entropy [J kg^-1 K^-1]. */
  readonly entropy: number;
  /** Isochoric heat capacity [J kg^-1 K^-1]. */
  readonly isochoricHeatCapacity: number;
  /** Isentropic bulk modulus [Pa]. */
  readonly isentropicBulkModulus: number;
  /** Speed of sound [m s^-1]. */
  readonly soundSpeed: number;
}

/**
 * Liquid, vapour or supercritical water at a density [kg m^-3] and temperature [K], stable or not.
 * Source  IAPWS R6-95(2018), Table 3
 * Valid   from the melting line to 1273 K and 1 GPa; beyond, see fluidLimits.ts
 * Checked Tables 6 and 7 of the release: test/eos/water/fluidState.test.ts
 */
export function fluidState(density: number, temperature: number): FluidState {
  const delta = density / CRITICAL_DENSITY;
  const tau = CRITICAL_TEMPERATURE / temperature;
  const ideal = idealHelmholtz(delta, tau);
  const residual = residualHelmholtz(delta, tau);
  const gasPressure = density * WATER_GAS_CONSTANT * temperature;

  const compressibilityFactor = 1 + delta * residual.delta;
  const stiffness = 1 + 2 * delta * residual.delta + delta * delta * residual.deltaDelta;
  const thermal = 1 + delta * residual.delta - delta * tau * residual.deltaTau;
  const isochoric = -tau * tau * (ideal.tauTau + residual.tauTau);
  const isobaric = isochoric + (thermal * thermal) / stiffness;
  const energy = tau * (ideal.tau + residual.tau);
  const isothermalBulkModulus = gasPressure * stiffness;
  const isentropicBulkModulus = (isothermalBulkModulus * isobaric) / isochoric;
  return {
    density,
    pressure: gasPressure * compressibilityFactor,
    internalEnergy: WATER_GAS_CONSTANT * temperature * energy,
    enthalpy: WATER_GAS_CONSTANT * temperature * (energy + compressibilityFactor),
    entropy: WATER_GAS_CONSTANT * (energy - ideal.phi - residual.phi),
    isochoricHeatCapacity: WATER_GAS_CONSTANT * isochoric,
    heatCapacity: WATER_GAS_CONSTANT * isobaric,
    expansivity: thermal / (stiffness * temperature),
    isothermalBulkModulus,
    isentropicBulkModulus,
    soundSpeed: Math.sqrt(isentropicBulkModulus / density),
  };
}
