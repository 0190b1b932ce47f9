import type { EosCurve } from "./curve.ts";
import { FiniteStrainCurve, type FiniteStrainParameters } from "./finiteStrain.ts";

/** Order 2 fixes K0' at 4; order 4 needs K0''. */
export type BirchMurnaghanParameters = Omit<FiniteStrainParameters, "bulkModulusPrime"> &
  (
    | { readonly order: 2 }
    | { readonly order: 3; readonly bulkModulusPrime: number }
    | {
        readonly order: 4;
        readonly bulkModulusPrime: number;
        /** K0'' = d²K/dP² at zero pressure [Pa^-1]. */
        readonly bulkModulusSecond: number;
      }
  );

/**
 * Birch–Murnaghan equation of state of order 2, 3 or 4 in the Eulerian strain f = (y² - 1)/2, y = (ρ/ρ0)^(1/3):
 *   P = 3 K0 f (1 + 2f)^(5/2) (1 + a f + b f²)
 *   a = 3/2 (K0' - 4);  b = 3/2 (K0 K0'' + (K0' - 4)(K0' - 3) + 35/9) in order 4, else 0;  a = 0 in order 2
 * Source  Birch 1947, Phys. Rev. 71, 809, doi:10.1103/PhysRev.71.809; order 4 as in Birch 1978, J. Geophys. Res. 83,
 *         1257, doi:10.1029/JB083iB03p01257
 * Valid   P >= 0, up to the pressure where a negative a or b makes it turn over (`maxPressure`)
 * Throws  InputError `eos-parameter` unless ρ0 > 0, K0 > 0 and K0' > 1
 * Checked test/eos/finiteStrain.test.ts, formPoints.test.ts (50 digits), everyForm.test.ts
 */
export function birchMurnaghan(parameters: BirchMurnaghanParameters): EosCurve {
  return new BirchMurnaghanCurve(parameters);
}

class BirchMurnaghanCurve extends FiniteStrainCurve {
  private readonly threeK: number;
  private readonly threeKOverDensity: number;
  private readonly a: number;
  private readonly b: number;

  constructor(parameters: BirchMurnaghanParameters) {
    super("birch-murnaghan", { bulkModulusPrime: 4, ...parameters });
    const prime = this.bulkModulusPrime;
    this.threeK = 3 * this.bulkModulus;
    this.threeKOverDensity = this.threeK / this.densityZero;
    this.a = 1.5 * (prime - 4);
    this.b =
      parameters.order === 4
        ? 1.5 * (this.bulkModulus * parameters.bulkModulusSecond + (prime - 4) * (prime - 3) + 35 / 9)
        : 0;
    this.endAtTurnOver();
  }

  pressure(y: number): number {
    const y2 = y * y;
    // (y - 1)(y + 1) keeps the strain exact to rounding near zero pressure, where y² - 1 would cancel.
    const f = 0.5 * (y - 1) * (y + 1);
    return this.threeK * f * y2 * y2 * y * (1 + f * (this.a + f * this.b));
  }

  slopes(y: number, out: Float64Array): void {
    const a = this.a;
    const b = this.b;
    const y2 = y * y;
    const f = 0.5 * (y - 1) * (y + 1);
    // dP/dy = 3 K0 y⁴ q(f), from df/dy = y and y² = 1 + 2f.
    const q = 1 + f * (7 + 2 * a + f * (9 * a + 3 * b + 11 * f * b));
    const qSlope = 7 + 2 * a + f * (18 * a + 6 * b + 33 * f * b);
    const inverse = 1 / y;
    out[0] = this.threeK * q * y2 * y2;
    out[1] = this.threeKOverDensity * q * y;
    out[2] = 3 * inverse;
    out[3] = 4 * inverse + (y * qSlope) / q;
  }
}
