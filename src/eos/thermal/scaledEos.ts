import type { ThermalEos } from "./thermalState.ts";

/**
 * The same crystal or liquid with other atoms on the same sites: density times `factor` at every pressure and
 * temperature, properties per atom unchanged. Bulk modulus, expansivity, γ and the adiabatic gradient stay; entropy and
 * heat capacity per kilogram go down with the mass of the atoms.
 * Checked test/mineralogy/coreAlloy.test.ts
 */
export function scaledEos(eos: ThermalEos, factor: number): ThermalEos {
  return {
    maxPressure: eos.maxPressure,
    at(pressure, temperature) {
      const state = eos.at(pressure, temperature);
      return {
        ...state,
        density: state.density * factor,
        entropy: state.entropy / factor,
        heatCapacityV: state.heatCapacityV / factor,
        heatCapacityP: state.heatCapacityP / factor,
      };
    },
  };
}
