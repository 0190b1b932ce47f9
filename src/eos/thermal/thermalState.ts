import type { EosCurve } from "../curve.ts";
import type { HelmholtzState } from "./thermalTerm.ts";

/** Everything a planet model asks of a substance at one pressure and temperature. SI, per kilogram. */
export interface ThermalState {
  readonly density: number;
  readonly entropy: number;
  readonly heatCapacityV: number;
  readonly heatCapacityP: number;
  /** α = (1/V) ∂V/∂T at constant pressure [1/K]. */
  readonly expansivity: number;
  readonly bulkModulusT: number;
  readonly bulkModulusS: number;
  /** Thermodynamic Grüneisen parameter α K_T V / c_V. */
  readonly gruneisen: number;
  /** ∂T/∂P at constant entropy [K/Pa]. */
  readonly adiabaticGradient: number;
}

/** A substance with temperature: one phase, or several whose volumes and entropies add. */
export interface ThermalEos {
  readonly members: readonly Member[];
  /** Pressure beyond which the form breaks, at the reference temperature and so at any higher one [Pa]. */
  readonly maxPressure: number;
  /**
   * Throws ModelRangeError `thermal-unstable` where no state with positive bulk modulus exists,
   * `eos-pressure-range` beyond the cold curve, `temperature-range` unless the temperature is positive.
   */
  at(pressure: number, temperature: number): ThermalState;
}

/** A single phase, explicit in the coordinate y of a reference curve and temperature. */
export interface ThermalPhase extends ThermalEos {
  /** The curve the phase follows at its reference: an isotherm or an isentrope. */
  readonly reference: EosCurve;
  /** Derivatives of the Helmholtz energy at y and a temperature [K]. */
  helmholtz(y: number, temperature: number): HelmholtzState;
  /** Change of y that raises the pressure by `excess` [Pa] where the bulk modulus is K, at constant temperature. */
  step(y: number, excess: number, bulkModulus: number): number;
}

/** A phase and how much of it makes up one kilogram of the substance. */
export interface Member {
  readonly phase: ThermalPhase;
  /** [kg/kg]; the amounts need not sum to 1 where one substance stands in for atoms of another mass. */
  readonly amount: number;
}

/**
 * From derivatives of the Helmholtz energy at a density and temperature.
 * Source  Poirier 2000, Introduction to the Physics of the Earth's Interior, section 2.2
 */
export function stateFromHelmholtz(density: number, temperature: number, helmholtz: HelmholtzState): ThermalState {
  const { entropy, bulkModulus, pressureSlope, heatCapacity } = helmholtz;
  const expansivity = pressureSlope / bulkModulus;
  const gruneisen = pressureSlope / (density * heatCapacity);
  const stiffening = 1 + expansivity * gruneisen * temperature;
  const bulkModulusS = bulkModulus * stiffening;
  return {
    density,
    entropy,
    heatCapacityV: heatCapacity,
    heatCapacityP: heatCapacity * stiffening,
    expansivity,
    bulkModulusT: bulkModulus,
    bulkModulusS,
    gruneisen,
    adiabaticGradient: (gruneisen * temperature) / bulkModulusS,
  };
}
