import type { EosCurve } from "../curve.ts";
import { HelmholtzEos } from "./helmholtzEos.ts";
import type { HelmholtzState } from "./thermalTerm.ts";

/** Temperature and Grüneisen parameter along an isentrope, by density [kg m^-3]. */
export interface IsentropeHeat {
  /** [K] */
  readonly temperature: number;
  readonly gamma: number;
  /** dγ / d ln ρ along the isentrope. */
  readonly gammaSlope: number;
}

/**
 * A fluid known along one isentrope, carried to other temperatures with a constant heat capacity c_V and γ(ρ).
 * Formula P = P_S(ρ) + ρ γ c_V (T - T_S(ρ)), S = c_V ln(T/T_S(ρ)); exact thermodynamics under that assumption: every
 *         isentrope has T/T_S constant.
 * Checked test/eos/thermal/liquidMetal.test.ts
 */
export class IsentropeBasedEos extends HelmholtzEos {
  private readonly heatCapacity: number;
  private readonly heatAt: (density: number) => IsentropeHeat;

  constructor(isentrope: EosCurve, heatAt: (density: number) => IsentropeHeat, heatCapacity: number) {
    super(isentrope, isentrope.maxPressure);
    this.heatAt = heatAt;
    this.heatCapacity = heatCapacity;
  }

  helmholtz(y: number, temperature: number): HelmholtzState {
    const density = this.reference.density(y);
    const { temperature: reference, gamma, gammaSlope } = this.heatAt(density);
    const thermal = density * this.heatCapacity;
    const excess = temperature - reference;
    return {
      pressure: this.reference.pressure(y) + thermal * gamma * excess,
      entropy: this.heatCapacity * Math.log(temperature / reference),
      bulkModulus: this.referenceModulus(y) + thermal * ((gamma + gammaSlope) * excess - gamma * gamma * reference),
      pressureSlope: thermal * gamma,
      heatCapacity: this.heatCapacity,
    };
  }
}
