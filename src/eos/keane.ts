import type { EosCurve } from "./curve.ts";
import { FiniteStrainCurve, type FiniteStrainParameters } from "./finiteStrain.ts";
import { checkParameter } from "./range.ts";

export interface KeaneParameters extends FiniteStrainParameters {
  /** K' at infinite pressure. */
  readonly bulkModulusPrimeInfinite: number;
}

/**
 * Keane's equation of state, K' = K∞' + (K0' - K∞') K0 / K; with L = ln(ρ/ρ0):
 *   P = K0 [ (K0'/K∞'²) (exp(K∞' L) - 1) - (K0'/K∞' - 1) L ]
 * Source  Keane 1954, Australian J. Physics 7, 322, doi:10.1071/PH540322
 * Valid   P >= 0 without upper limit
 * Throws  InputError `eos-parameter` unless ρ0, K0, K∞' > 0 and K0' > 1
 * Checked test/eos/finiteStrain.test.ts, formPoints.test.ts (50 digits), everyForm.test.ts
 */
export function keane(parameters: KeaneParameters): EosCurve {
  return new KeaneCurve(parameters);
}

class KeaneCurve extends FiniteStrainCurve {
  private readonly primeInfinite: number;
  /** K0' / K∞' */
  private readonly ratio: number;

  constructor(parameters: KeaneParameters) {
    super("keane", parameters);
    checkParameter("keane", "bulkModulusPrimeInfinite", parameters.bulkModulusPrimeInfinite);
    this.primeInfinite = parameters.bulkModulusPrimeInfinite;
    this.ratio = this.bulkModulusPrime / this.primeInfinite;
  }

  pressure(y: number): number {
    const logCompression = 3 * Math.log(y);
    const { ratio, primeInfinite } = this;
    return (
      this.bulkModulus *
      ((ratio / primeInfinite) * Math.expm1(primeInfinite * logCompression) - (ratio - 1) * logCompression)
    );
  }

  slopes(y: number, out: Float64Array): void {
    const growth = Math.exp(3 * this.primeInfinite * Math.log(y));
    const modulusRatio = 1 + this.ratio * (growth - 1);
    const slope = (3 * this.bulkModulus * modulusRatio) / y;
    out[0] = slope;
    out[1] = slope / (this.densityZero * y * y * y);
    out[2] = 3 / y;
    out[3] = ((3 * this.bulkModulusPrime * growth) / modulusRatio - 1) / y;
  }
}
