import { debyeState } from "./debye.ts";
import type { GruneisenLaw } from "./gruneisenLaw.ts";

/**
 * One additive part of the Helmholtz energy F(V, T) per kilogram, as the derivatives that thermodynamics needs. SI.
 * Parts add, so an equation of state is a cold curve plus a list of these.
 */
export interface HelmholtzState {
  /** P = -∂F/∂V. */
  readonly pressure: number;
  /** S = -∂F/∂T [J kg^-1 K^-1]. */
  readonly entropy: number;
  /** Isothermal bulk modulus K_T = V ∂²F/∂V². */
  readonly bulkModulus: number;
  /** ∂P/∂T at constant volume = α K_T [Pa/K]. */
  readonly pressureSlope: number;
  /** c_V = -T ∂²F/∂T² [J kg^-1 K^-1]. */
  readonly heatCapacity: number;
}

/** A thermal part of the energy. */
export interface ThermalTerm {
  /** Density beyond which the term cannot be evaluated; Infinity for most. */
  readonly maxDensity: number;
  /** The part at a density [kg m^-3], as a function of temperature [K]: one is always compared with another. */
  at(density: number): (temperature: number) => HelmholtzState;
}

/**
 * Lattice vibrations by the Mie–Grüneisen–Debye model, without the zero-point energy (it is part of the cold curve).
 * Formula F = r T (3 ln(1 - e^-t) - D3(t)), t = θ(V)/T, r = n R / M
 * Source  Stixrude & Lithgow-Bertelloni 2005, Geophys. J. Int. 162, 610, equations 5-10 and appendix
 * Checked test/eos/thermal/isothermBasedEos.test.ts
 */
export function debyeTerm(parameters: {
  /** Density at V0 [kg m^-3]. */
  densityZero: number;
  /** n R / M with n atoms per formula unit of molar mass M [J kg^-1 K^-1]. */
  gasConstant: number;
  /** θ0 [K]. */
  debyeTemperature: number;
  law: GruneisenLaw;
}): ThermalTerm {
  const { densityZero, gasConstant, debyeTemperature, law } = parameters;
  return {
    maxDensity: densityZero * law.maxCompression,
    at(density) {
      const { debyeRatio, gamma, gammaSlope } = law.at(densityZero / density);
      const theta = debyeTemperature * debyeRatio;
      return (temperature) => {
        const debye = debyeState(theta / temperature);
        const energy = 3 * gasConstant * temperature * debye.energy;
        const heatCapacity = 3 * gasConstant * debye.heatCapacity;
        return {
          pressure: density * gamma * energy,
          entropy: 3 * gasConstant * debye.entropy,
          bulkModulus:
            density * ((gamma + gamma * gamma - gammaSlope) * energy - gamma * gamma * temperature * heatCapacity),
          pressureSlope: density * gamma * heatCapacity,
          heatCapacity,
        };
      };
    },
  };
}

/**
 * A part quadratic in temperature: conduction electrons, or the leading anharmonic correction.
 * Formula F = -β0 (V/V0)^k T²/2, so c_V = β0 (V/V0)^k T
 * Source  electrons Fei et al. 2016, Geophys. Res. Lett. 43, 6837; anharmonic and electrons Dewaele et al. 2006,
 *         Phys. Rev. Lett. 97, 215504, whose a0 and e0 give β0 = 3 R a0 / M
 * Checked test/eos/thermal/isothermBasedEos.test.ts
 */
export function quadraticTerm(parameters: {
  densityZero: number;
  /** β0 [J kg^-1 K^-2]. */
  coefficient: number;
  /** k. */
  exponent: number;
}): ThermalTerm {
  const { densityZero, coefficient, exponent } = parameters;
  return {
    maxDensity: Number.POSITIVE_INFINITY,
    at(density) {
      const perKelvin = coefficient * (densityZero / density) ** exponent;
      return (temperature) => {
        const heatCapacity = perKelvin * temperature;
        const pressureSlope = density * exponent * heatCapacity;
        const pressure = (pressureSlope * temperature) / 2;
        return {
          pressure,
          entropy: heatCapacity,
          bulkModulus: (1 - exponent) * pressure,
          pressureSlope,
          heatCapacity,
        };
      };
    },
  };
}
