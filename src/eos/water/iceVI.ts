import { birchMurnaghan } from "../birchMurnaghan.ts";
import { compressed } from "./compressed.ts";
import { tanhVolumes, thermalFactor } from "./icesToV.ts";
import type { WaterState } from "./waterState.ts";

/** At 300 K; Bezacier et al. 2014, J. Chem. Phys. 141, 104505, doi:10.1063/1.4894421: 14.17 cm^3/mol, 14.05 GPa, order 2 (from memory). */
const REFERENCE_TEMPERATURE = 300;
const coldCurve = birchMurnaghan({ order: 2, densityZero: 18.015268e-3 / 14.17e-6, bulkModulus: 14.05e9 });

/**
 * Ice VI at a pressure [Pa] and temperature [K]: the 300 K curve of Bezacier 2014 with the thermal factor of Choukroun
 * & Grasset 2010. The pressure factor of the latter is not used: it saturates (bulk modulus 350 GPa at 2.1 GPa), makes ice
 * VI 2.8 % denser at 0.63 GPa and 3.3 % less dense at 2.2 GPa, and there contradicts the slopes of the three boundaries
 * that meet at 355 K, which this one obeys.
 * Heat capacity: Choukroun & Grasset 2010 (from memory), at all pressures.
 * Valid   0.6 to 2.3 GPa, to the melting line; density to about 1 %
 * Checked density of the crystal cell, and the slopes at the triple point: test/eos/water/ices.test.ts
 */
export function iceVIState(pressure: number, temperature: number): WaterState {
  const cold = compressed(coldCurve, pressure);
  const reference = thermalFactor(tanhVolumes.VI, REFERENCE_TEMPERATURE);
  const actual = thermalFactor(tanhVolumes.VI, temperature);
  return {
    density: (cold.density * reference.factor) / actual.factor,
    isothermalBulkModulus: cold.bulkModulus,
    expansivity: actual.expansivity,
    heatCapacity: 940 + 5.5 * temperature,
  };
}
