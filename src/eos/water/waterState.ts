/** What a structure calculation needs to know of any phase of water at one pressure and temperature. */
export interface WaterState {
  /** [kg m^-3] */
  readonly density: number;
  /** Isothermal bulk modulus -V (dP/dV)_T [Pa]. */
  readonly isothermalBulkModulus: number;
  /** Volume expansivity (1/V) (dV/dT)_P [K^-1]; may be negative. */
  readonly expansivity: number;
  /** Isobaric specific heat capacity [J kg^-1 K^-1]. */
  readonly heatCapacity: number;
}

/**
 * Isentropic temperature gradient (dT/dP)_S = alpha T / (rho c_p) [K Pa^-1].
 * Checked against the entropy of IAPWS-95 and of ice Ih: test/eos/water/barotrope.test.ts
 */
export function isentropicGradient(state: WaterState, temperature: number): number {
  return (state.expansivity * temperature) / (state.density * state.heatCapacity);
}
