import type { EosCurve } from "./curve.ts";
import { FiniteStrainCurve, type FiniteStrainParameters } from "./finiteStrain.ts";
import { checkParameter } from "./range.ts";

export interface HolzapfelParameters extends FiniteStrainParameters {
  /** Pressure of a free electron gas at the density ρ0 [Pa]. */
  readonly fermiGasPressure: number;
}

/**
 * Holzapfel's AP2 form, which tends to the electron gas at infinite pressure; with y = (ρ/ρ0)^(1/3) and x = 1/y:
 *   P = 3 K0 x^-5 (1 - x) exp(c0 (1 - x)) (1 + c2 x (1 - x)),   c0 = -ln(3 K0 / P_FG0),   c2 = 3/2 (K0' - 3) - c0
 * Source  Holzapfel 1998, High Pressure Research 16, 81, as written by Bouchet et al. 2013, Phys. Rev. B 87, 094102
 *         (both from memory)
 * Valid   P >= 0, up to `maxPressure` where a strongly negative c2 makes it turn over
 * Throws  InputError `eos-parameter` unless ρ0, K0, P_FG0 > 0 and K0' > 1
 * Checked test/eos/finiteStrain.test.ts, formPoints.test.ts (50 digits), everyForm.test.ts
 */
export function holzapfel(parameters: HolzapfelParameters): EosCurve {
  return new HolzapfelCurve(parameters);
}

class HolzapfelCurve extends FiniteStrainCurve {
  private readonly threeK: number;
  private readonly c0: number;
  private readonly c2: number;

  constructor(parameters: HolzapfelParameters) {
    super("holzapfel", parameters);
    checkParameter("holzapfel", "fermiGasPressure", parameters.fermiGasPressure);
    this.threeK = 3 * this.bulkModulus;
    this.c0 = -Math.log(this.threeK / parameters.fermiGasPressure);
    this.c2 = 1.5 * (this.bulkModulusPrime - 3) - this.c0;
    this.endAtTurnOver();
  }

  pressure(y: number): number {
    const rise = y - 1;
    return this.threeK * Math.exp(this.c0 * (1 - 1 / y)) * y * y * rise * (y * y + this.c2 * rise);
  }

  slopes(y: number, out: Float64Array): void {
    const { c0, c2 } = this;
    const rise = y - 1;
    const y2 = y * y;
    // P = 3 K0 exp(c0 (1 - 1/y)) g(y) with a polynomial g; dP/dy has h = g' + c0 g / y² in its place.
    const h = y2 * y * (5 * y - 4) + 2 * c2 * y * rise * (2 * y - 1) + c0 * rise * (y2 + c2 * rise);
    const hSlope = y2 * (20 * y - 12) + c2 * (12 * y * rise + 2) + c0 * (y * (3 * y - 2) + 2 * c2 * rise);
    const slope = this.threeK * Math.exp(c0 * (1 - 1 / y)) * h;
    out[0] = slope;
    out[1] = slope / (this.densityZero * y2 * y);
    out[2] = 3 / y;
    out[3] = c0 / y2 + hSlope / h;
  }
}
