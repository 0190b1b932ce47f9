import { birchMurnaghan } from "../birchMurnaghan.ts";
import { compressed } from "./compressed.ts";
import { WATER_GAS_CONSTANT } from "./iapws95Coefficients.ts";
import type { WaterState } from "./waterState.ts";

/** At 300 K, 2.3-128 GPa; Hemley et al. 1987, Nature 330, 737, doi:10.1038/330737a0, order 3. */
const REFERENCE_TEMPERATURE = 300;
const coldCurve = birchMurnaghan({ order: 3, densityZero: 1460, bulkModulus: 23.7e9, bulkModulusPrime: 4.15 });

/**
 * alpha = (a + b T) (1 + P / p)^-eta, 300-850 K and 3-60 GPa; Frank, Fei & Hu 2004, Geochim. Cosmochim. Acta 68, 2781,
 * doi:10.1016/j.gca.2003.12.007 (from memory; p = K0/K0' of their own fit, 21.1 GPa / 4.4).
 */
const EXPANSIVITY_CONSTANT = -4.2e-4;
const EXPANSIVITY_SLOPE = 1.56e-6;
const EXPANSIVITY_PRESSURE = 21.1e9 / 4.4;
const EXPANSIVITY_EXPONENT = 1.1;
const EXPANSIVITY_WARMEST = 850;

/**
 * Ice VII at a pressure [Pa] and temperature [K]. It stands also for its ordered form VIII below about 278 K and for
 * ice X, into which it turns gradually near 60 GPa with no jump in density; the cold curve spans both.
 * The expansivity of Frank 2004 turns negative below 269 K, outside its data; below 300 K it falls linearly to 0 at 0 K
 * instead (0.7 % in volume at 2 GPa, where ice VIII at 10 K is 1.0 % smaller: J. Chem. Phys. 156, 064504, 2022). Above
 * 850 K, where its data end, it is held, as expansivities are once all vibrations are excited.
 * Valid   2.1-128 GPa; density to about 1 % at 300 K, 3 % at 1500 K
 * Checked densities at 300 K, differences, ice VIII: test/eos/water/ices.test.ts
 */
export function iceVIIState(pressure: number, temperature: number): WaterState {
  const cold = compressed(coldCurve, pressure);
  const expansion = zeroPressureExpansion(temperature);
  const softening = 1 + pressure / EXPANSIVITY_PRESSURE;
  const damping = softening ** -EXPANSIVITY_EXPONENT;
  const dampingSlope = (-EXPANSIVITY_EXPONENT * damping) / (softening * EXPANSIVITY_PRESSURE);
  return {
    density: cold.density * Math.exp(-expansion.logVolume * damping),
    isothermalBulkModulus: 1 / (1 / cold.bulkModulus - expansion.logVolume * dampingSlope),
    expansivity: expansion.expansivity * damping,
    heatCapacity: latticeHeatCapacity(temperature),
  };
}

/** The integral of alpha from 300 K at P = 0, and alpha. */
function zeroPressureExpansion(temperature: number): { logVolume: number; expansivity: number } {
  const at = (t: number) => EXPANSIVITY_CONSTANT + EXPANSIVITY_SLOPE * t;
  const toward = (t: number, expansivity: number) => {
    const mean = 0.5 * (at(REFERENCE_TEMPERATURE) + expansivity);
    return { logVolume: mean * (t - REFERENCE_TEMPERATURE), expansivity };
  };
  if (temperature < REFERENCE_TEMPERATURE) {
    return toward(temperature, (at(REFERENCE_TEMPERATURE) * temperature) / REFERENCE_TEMPERATURE);
  }
  if (temperature <= EXPANSIVITY_WARMEST) return toward(temperature, at(temperature));
  const held = toward(EXPANSIVITY_WARMEST, at(EXPANSIVITY_WARMEST));
  return { ...held, logVolume: held.logVolume + held.expansivity * (temperature - EXPANSIVITY_WARMEST) };
}

/**
 * Vibrations of a molecule in the lattice, as Einstein oscillators [K]: translations, librations, bend, two stretches
 * (band positions from memory, each to about 15 %). Along the melting curve of Frank 2004 the entropy of the liquid
 * less that of fusion asks for 2800 J/kg/K at 600 K and 3300 at 700 K; this gives 2730 and 2870. It sets the adiabat only.
 */
const VIBRATIONS = [
  { count: 3, temperature: 270 },
  { count: 3, temperature: 800 },
  { count: 1, temperature: 2300 },
  { count: 2, temperature: 4700 },
];

function latticeHeatCapacity(temperature: number): number {
  let sum = 0;
  for (const { count, temperature: quantum } of VIBRATIONS) {
    const half = quantum / (2 * temperature);
    sum += count * (half / Math.sinh(half)) ** 2;
  }
  return WATER_GAS_CONSTANT * sum;
}
