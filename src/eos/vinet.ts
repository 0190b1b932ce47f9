import type { EosCurve } from "./curve.ts";
import { FiniteStrainCurve, type FiniteStrainParameters } from "./finiteStrain.ts";

/**
 * Isothermal equation of state of Vinet et al., with y = (ρ/ρ0)^(1/3):
 *   P = 3 K0 y (y - 1) exp(η (1 - 1/y)),   η = 1.5 (K0' - 1)
 * Source  Vinet, Rose, Ferrante & Smith 1989, J. Phys.: Condens. Matter 1, 1941, doi:10.1088/0953-8984/1/11/002
 * Valid   P >= 0; pressure always grows, but only as ρ^(2/3), so planets of one such phase have a maximum mass
 * Throws  InputError `eos-parameter` unless ρ0 > 0, K0 > 0 and K0' > 1
 * Checked test/eos/finiteStrain.test.ts, formPoints.test.ts (50 digits), everyForm.test.ts
 */
export function vinet(parameters: FiniteStrainParameters): EosCurve {
  return new VinetCurve(parameters);
}

class VinetCurve extends FiniteStrainCurve {
  private readonly threeK: number;
  private readonly eta: number;

  constructor(parameters: FiniteStrainParameters) {
    super("vinet", parameters);
    this.threeK = 3 * this.bulkModulus;
    this.eta = 1.5 * (this.bulkModulusPrime - 1);
  }

  pressure(y: number): number {
    return this.threeK * y * (y - 1) * Math.exp(this.eta * (1 - 1 / y));
  }

  slopes(y: number, out: Float64Array): void {
    const eta = this.eta;
    const stretch = 1 / y;
    const bracket = 2 * y - 1 + eta * (1 - stretch);
    const slope = this.threeK * Math.exp(eta * (1 - stretch)) * bracket;
    const etaOverY2 = eta * stretch * stretch;
    out[0] = slope;
    out[1] = slope / (this.densityZero * y * y * y);
    out[2] = 3 * stretch;
    out[3] = etaOverY2 + (2 + etaOverY2) / bracket;
  }
}
