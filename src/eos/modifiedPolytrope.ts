import { InputError } from "../errors.ts";
import type { EosCurve } from "./curve.ts";
import { checkDensity, checkParameter, checkPressure } from "./range.ts";

export interface ModifiedPolytropeParameters {
  /** ρ0 [kg m^-3]; 0 gives the classical polytrope of index n/(1 - n). */
  readonly densityZero: number;
  /** c [kg m^-3 Pa^-n] */
  readonly coefficient: number;
  /** n, between 0 and 1. */
  readonly exponent: number;
}

/**
 * Modified polytrope ρ = ρ0 + c P^n. The coordinate is y = P^(1-n): with m = n/(1-n), P^n = y^m and P = y·y^m, so
 * that for ρ0 = 0 y is the Lane–Emden function of index m, up to a factor, and specific enthalpy is linear in it.
 *
 * The last two slopes hold powers of y that diverge (or vanish) at y = 0; there the limit is written, infinite or not.
 * Source  Seager et al. 2007, ApJ 669, 1279, eq. 11, doi:10.1086/521346
 * Valid   P >= 0; the published fits are meant for P < 1e16 Pa and are good to 2–12 % in density
 * Throws  InputError `eos-parameter` unless ρ0 >= 0, c > 0 and 0 < n < 1
 * Checked test/eos/modifiedPolytrope.test.ts, everyForm.test.ts
 */
export function modifiedPolytrope(parameters: ModifiedPolytropeParameters): EosCurve {
  const { densityZero, coefficient, exponent } = parameters;
  if (densityZero !== 0) checkParameter("modified-polytrope", "densityZero", densityZero);
  checkParameter("modified-polytrope", "coefficient", coefficient);
  if (!(exponent > 0 && exponent < 1)) {
    throw new InputError("eos-parameter", `modified-polytrope: exponent is ${exponent}; it must lie between 0 and 1.`, {
      column: "exponent",
      found: String(exponent),
    });
  }
  return new ModifiedPolytropeCurve(parameters);
}

class ModifiedPolytropeCurve implements EosCurve {
  readonly minPressure = 0;
  readonly maxPressure = Number.POSITIVE_INFINITY;
  private readonly densityZero: number;
  private readonly coefficient: number;
  /** Polytropic index m = n/(1 - n); 1 + m = 1/(1 - n). */
  private readonly index: number;

  constructor({ densityZero, coefficient, exponent }: ModifiedPolytropeParameters) {
    this.densityZero = densityZero;
    this.coefficient = coefficient;
    this.index = exponent / (1 - exponent);
  }

  pressure(y: number): number {
    return y * y ** this.index;
  }

  density(y: number): number {
    return this.densityZero + this.coefficient * y ** this.index;
  }

  slopes(y: number, out: Float64Array): void {
    const { densityZero, coefficient, index } = this;
    const power = y ** index;
    const slope = (1 + index) * power;
    const density = densityZero + coefficient * power;
    out[0] = slope;
    if (densityZero === 0) {
      out[1] = (1 + index) / coefficient;
      out[2] = index / y;
    } else {
      out[1] = slope / density;
      out[2] = (coefficient * index * (y > 0 ? power / y : y ** (index - 1))) / density;
    }
    out[3] = index / y;
  }

  coordinate(pressure: number): number {
    checkPressure("modified-polytrope", this, pressure);
    return this.invert(pressure);
  }

  invert(pressure: number): number {
    return pressure ** (1 / (1 + this.index));
  }

  coordinateAtDensity(density: number): number {
    checkDensity("modified-polytrope", density, this.densityZero, Number.POSITIVE_INFINITY);
    return ((density - this.densityZero) / this.coefficient) ** (1 / this.index);
  }
}
