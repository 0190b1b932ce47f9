import type { EosCurve } from "./curve.ts";
import { checkDensity, checkParameter, checkPressure } from "./range.ts";

/**
 * An incompressible substance; the coordinate is pressure [Pa] itself. For closed-form checks and rough layers.
 * Throws InputError `eos-parameter` unless density > 0 [kg m^-3].
 */
export function constantDensity(parameters: { readonly density: number }): EosCurve {
  checkParameter("constant", "density", parameters.density);
  return new ConstantCurve(parameters.density);
}

class ConstantCurve implements EosCurve {
  readonly minPressure = 0;
  readonly maxPressure = Number.POSITIVE_INFINITY;
  private readonly only: number;

  constructor(density: number) {
    this.only = density;
  }

  pressure(y: number): number {
    return y;
  }

  density(): number {
    return this.only;
  }

  slopes(_y: number, out: Float64Array): void {
    out[0] = 1;
    out[1] = 1 / this.only;
    out[2] = 0;
    out[3] = 0;
  }

  coordinate(pressure: number): number {
    checkPressure("constant", this, pressure);
    return pressure;
  }

  invert(pressure: number): number {
    return pressure;
  }

  /** Every pressure has this density; the lowest one is given. */
  coordinateAtDensity(density: number): number {
    checkDensity("constant", density, this.only, this.only);
    return 0;
  }
}
