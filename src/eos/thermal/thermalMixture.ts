import type { ThermalEos, ThermalState } from "./thermalState.ts";

export interface MixturePart {
  readonly eos: ThermalEos;
  readonly massFraction: number;
}

/**
 * Intimate mixture at common pressure and temperature: volumes and entropies add.
 * Formula v = Σ w v_i, s = Σ w s_i, and with them their derivatives α v, v/K_T and c_P; the entropy of mixing is left
 *         out (it is constant along an isentrope of fixed composition).
 * Checked test/eos/thermal/thermalMixture.test.ts
 */
export function thermalMixture(parts: readonly MixturePart[]): ThermalEos {
  if (parts.length === 1) return parts[0].eos;
  return {
    maxPressure: Math.min(...parts.map((part) => part.eos.maxPressure)),
    at(pressure, temperature) {
      let volume = 0;
      let entropy = 0;
      let expansion = 0;
      let compliance = 0;
      let heatCapacityP = 0;
      for (const { eos, massFraction } of parts) {
        const state = eos.at(pressure, temperature);
        const partVolume = massFraction / state.density;
        volume += partVolume;
        entropy += massFraction * state.entropy;
        expansion += partVolume * state.expansivity;
        compliance += partVolume / state.bulkModulusT;
        heatCapacityP += massFraction * state.heatCapacityP;
      }
      return stateFromGibbs({ volume, entropy, expansion, compliance, heatCapacityP }, temperature);
    },
  };
}

/** From derivatives of the Gibbs energy: `expansion` = ∂v/∂T, `compliance` = -∂v/∂P. */
function stateFromGibbs(
  gibbs: { volume: number; entropy: number; expansion: number; compliance: number; heatCapacityP: number },
  temperature: number,
): ThermalState {
  const { volume, entropy, expansion, compliance, heatCapacityP } = gibbs;
  const heatCapacityV = heatCapacityP - (temperature * expansion * expansion) / compliance;
  const bulkModulusT = volume / compliance;
  return {
    density: 1 / volume,
    entropy,
    heatCapacityV,
    heatCapacityP,
    expansivity: expansion / volume,
    bulkModulusT,
    bulkModulusS: (bulkModulusT * heatCapacityP) / heatCapacityV,
    gruneisen: (expansion * bulkModulusT) / heatCapacityV,
    adiabaticGradient: (temperature * expansion) / heatCapacityP,
  };
}
