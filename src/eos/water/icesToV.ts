import type { WaterState } from "./waterState.ts";

/** V(p, T) = V0 f(T) g(p), f = 1 + a0 tanh(a1 (T - Tref)), g = b0 + b1 (1 - tanh(b2 p)); V0 [m^3 kg^-1], b2 [Pa^-1]. */
export interface TanhVolume {
  readonly referenceTemperature: number;
  readonly V0: number;
  readonly a0: number;
  readonly a1: number;
  readonly b0: number;
  readonly b1: number;
  readonly b2: number;
}

/**
 * Volumes of ices II, III, V and VI.
 * Source  Choukroun & Grasset 2010, J. Chem. Phys. 133, 144502, doi:10.1063/1.3487520, parameters at second hand
 * Valid   to 2.2 GPa, from about 180 K to the melting line. Ice VI is used for its f(T) only, see iceVI.ts
 */
export const tanhVolumes = {
  II: { referenceTemperature: 238.45, V0: 0.8425e-3, a0: 0.06, a1: 0.007, b0: 0.976, b1: 0.0425, b2: 0.0022e-6 },
  III: { referenceTemperature: 256.43, V0: 0.855e-3, a0: 0.0375, a1: 0.0203, b0: 0.951, b1: 0.097, b2: 0.002e-6 },
  V: { referenceTemperature: 273.31, V0: 0.783e-3, a0: 0.005, a1: 0.01, b0: 0.977, b1: 0.12, b2: 0.0016e-6 },
  VI: { referenceTemperature: 356.15, V0: 0.743e-3, a0: 0.024, a1: 0.002, b0: 0.969, b1: 0.05, b2: 0.00102e-6 },
} as const satisfies Record<string, TanhVolume>;

/** The temperature factor f and its logarithmic slope f'/f, the expansivity [K^-1]. */
export function thermalFactor(volume: TanhVolume, temperature: number): { factor: number; expansivity: number } {
  const t = Math.tanh(volume.a1 * (temperature - volume.referenceTemperature));
  const factor = 1 + volume.a0 * t;
  return { factor, expansivity: (volume.a0 * volume.a1 * (1 - t * t)) / factor };
}

/**
 * Ice II, III or V at a pressure [Pa] and temperature [K].
 * Heat capacities: Choukroun & Grasset 2010 (from memory), taken at all pressures; they set the adiabat only.
 * Checked differences, and densities from crystal cells: test/eos/water/ices.test.ts
 */
export const iceIIState = (pressure: number, temperature: number): WaterState =>
  tanhState(tanhVolumes.II, pressure, temperature, 2200);
export const iceIIIState = (pressure: number, temperature: number): WaterState =>
  tanhState(tanhVolumes.III, pressure, temperature, 820 + 7 * temperature);
export const iceVState = (pressure: number, temperature: number): WaterState =>
  tanhState(tanhVolumes.V, pressure, temperature, 700 + 7.56 * temperature);

export function tanhState(volume: TanhVolume, pressure: number, temperature: number, heatCapacity: number): WaterState {
  const { factor, expansivity } = thermalFactor(volume, temperature);
  const t = Math.tanh(volume.b2 * pressure);
  const squeeze = volume.b0 + volume.b1 * (1 - t);
  return {
    density: 1 / (volume.V0 * factor * squeeze),
    isothermalBulkModulus: squeeze / (volume.b1 * volume.b2 * (1 - t * t)),
    expansivity,
    heatCapacity,
  };
}
