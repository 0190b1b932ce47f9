import { birchMurnaghan } from "../birchMurnaghan.ts";
import { IsentropeBasedEos, type IsentropeHeat } from "./isentropeBasedEos.ts";

/** Values at zero pressure on the isentrope, SI; γ = γ0 + γ' (ρ/ρ0)^n (E - E0). */
export interface LiquidMetalParameters {
  readonly densityZero: number;
  readonly temperatureZero: number;
  /** K_S, dK_S/dP and d²K_S/dP². */
  readonly bulkModulus: number;
  readonly bulkModulusPrime: number;
  readonly bulkModulusSecond: number;
  readonly gammaZero: number;
  /** γ' [kg/J]. */
  readonly gammaPerEnergy: number;
  readonly gammaExponent: number;
  /** c_V, taken as constant [J kg^-1 K^-1]. */
  readonly heatCapacity: number;
}

/**
 * A liquid metal from its fourth-order Birch–Murnaghan isentrope, with γ as a function of density and energy.
 * Formula T_S = T0 exp ∫ γ d ln ρ along the isentrope. E - E0 is a polynomial in u = (ρ/ρ0)^(2/3), so the integral is
 *         a sum of powers of u.
 * Source  Anderson & Ahrens 1994, J. Geophys. Res. 99, 4273, doi:10.1029/93JB03158
 * Checked with their liquid iron: test/eos/thermal/liquidMetal.test.ts
 */
export function liquidMetal(parameters: LiquidMetalParameters): IsentropeBasedEos {
  const { densityZero, temperatureZero, gammaZero, gammaPerEnergy, gammaExponent } = parameters;
  const energy = energyPolynomial(parameters);
  // (ρ/ρ0)^n d ln ρ = (3/2) u^(3n/2 - 1) du
  const shift = 1.5 * gammaExponent;
  const heatAt = (density: number): IsentropeHeat => {
    const u = (density / densityZero) ** (2 / 3);
    const shifted = u ** shift;
    const thinning = gammaPerEnergy * shifted;
    let [excess, slope, integral] = [0, 0, 0];
    let power = 1;
    for (let j = 0; j < energy.length; j++) {
      excess += energy[j] * power;
      slope += (2 / 3) * j * energy[j] * power;
      integral += (1.5 * energy[j] * (shifted * power - 1)) / (j + shift);
      power *= u;
    }
    return {
      temperature: temperatureZero * Math.exp(1.5 * gammaZero * Math.log(u) + gammaPerEnergy * integral),
      gamma: gammaZero + thinning * excess,
      gammaSlope: thinning * (gammaExponent * excess + slope),
    };
  };
  return new IsentropeBasedEos(birchMurnaghan({ order: 4, ...parameters }), heatAt, parameters.heatCapacity);
}

/**
 * Coefficients of E - E0 = (9/2)(K0/ρ0)(f² + a f³ + b f⁴) [J/kg] in powers of u, with f = (u - 1)/2.
 * Source  integral of the pressure of Birch 1978, J. Geophys. Res. 83, 1257
 */
function energyPolynomial(parameters: LiquidMetalParameters): number[] {
  const { densityZero, bulkModulus, bulkModulusPrime: prime, bulkModulusSecond } = parameters;
  const a = (prime - 4) / 8;
  const b = (0.75 * (bulkModulus * bulkModulusSecond + (prime - 4) * (prime - 3) + 35 / 9)) / 16;
  const scale = (4.5 * bulkModulus) / densityZero;
  // (u-1)²/4, a (u-1)³, b (u-1)⁴ with the powers of two in a and b.
  return [0.25 - a + b, -0.5 + 3 * a - 4 * b, 0.25 - 3 * a + 6 * b, a - 4 * b, b].map((c) => scale * c);
}
