import type { Member, ThermalEos, ThermalPhase, ThermalState } from "./thermalState.ts";

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
  if (parts.length === 1 && parts[0].massFraction === 1) return parts[0].eos;
  return sumOf(mergeMembers(parts.map(({ eos, massFraction }) => ({ eos, amount: massFraction }))));
}

/**
 * The same crystal or liquid with other atoms on the same sites: density times `factor` at every pressure and
 * temperature, properties per atom unchanged. Bulk modulus, expansivity, γ and the adiabatic gradient stay; entropy and
 * heat capacity per kilogram go down with the mass of the atoms.
 * Checked test/mineralogy/coreAlloy.test.ts
 */
export function scaledEos(eos: ThermalEos, factor: number): ThermalEos {
  return sumOf(mergeMembers([{ eos, amount: 1 / factor }]));
}

/** Each phase once, however often it occurs among the parts. */
function mergeMembers(parts: readonly { eos: ThermalEos; amount: number }[]): Member[] {
  const amounts = new Map<ThermalPhase, number>();
  for (const { eos, amount: share } of parts) {
    for (const { phase, amount } of eos.members) amounts.set(phase, (amounts.get(phase) ?? 0) + share * amount);
  }
  return Array.from(amounts, ([phase, amount]) => ({ phase, amount }));
}

function sumOf(members: readonly Member[]): ThermalEos {
  return {
    members,
    maxPressure: Math.min(...members.map(({ phase }) => phase.maxPressure)),
    at(pressure, temperature) {
      let volume = 0;
      let entropy = 0;
      let expansion = 0;
      let compliance = 0;
      let heatCapacityP = 0;
      for (const { phase, amount } of members) {
        const state = phase.at(pressure, temperature);
        const partVolume = amount / state.density;
        volume += partVolume;
        entropy += amount * state.entropy;
        expansion += partVolume * state.expansivity;
        compliance += partVolume / state.bulkModulusT;
        heatCapacityP += amount * state.heatCapacityP;
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
