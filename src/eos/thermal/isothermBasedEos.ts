import type { EosCurve } from "../curve.ts";
import { HelmholtzEos } from "./helmholtzEos.ts";
import type { HelmholtzState, ThermalTerm } from "./thermalTerm.ts";

/**
 * A cold curve at a reference temperature plus thermal terms.
 * Formula P(V, T) = P_cold(V) + Σ [P_i(V, T) - P_i(V, T0)]
 * Checked test/eos/thermal/isothermBasedEos.test.ts
 */
export class IsothermBasedEos extends HelmholtzEos {
  readonly referenceTemperature: number;
  private readonly terms: readonly ThermalTerm[];

  constructor(cold: EosCurve, referenceTemperature: number, terms: readonly ThermalTerm[]) {
    super(cold, lowestLimit(cold, terms));
    this.referenceTemperature = referenceTemperature;
    this.terms = terms;
  }

  helmholtz(y: number, temperature: number): HelmholtzState {
    const density = this.reference.density(y);
    let pressure = this.reference.pressure(y);
    let bulkModulus = this.referenceModulus(y);
    let entropy = 0;
    let pressureSlope = 0;
    let heatCapacity = 0;
    for (const term of this.terms) {
      const part = term.at(density);
      const warm = part(temperature);
      const cold = part(this.referenceTemperature);
      pressure += warm.pressure - cold.pressure;
      bulkModulus += warm.bulkModulus - cold.bulkModulus;
      entropy += warm.entropy;
      pressureSlope += warm.pressureSlope;
      heatCapacity += warm.heatCapacity;
    }
    return { pressure, entropy, bulkModulus, pressureSlope, heatCapacity };
  }
}

/** A term that breaks at some density ends the range at the cold pressure there; heat only adds to that pressure. */
function lowestLimit(cold: EosCurve, terms: readonly ThermalTerm[]): number {
  const maxDensity = Math.min(...terms.map((term) => term.maxDensity));
  const { maxPressure } = cold;
  const reached = maxPressure === Number.POSITIVE_INFINITY ? maxPressure : cold.density(cold.coordinate(maxPressure));
  return maxDensity < reached ? cold.pressure(cold.coordinateAtDensity(maxDensity)) : maxPressure;
}
