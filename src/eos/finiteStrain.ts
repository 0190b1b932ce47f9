import type { EosCurve } from "./curve.ts";
import { invertIncreasing } from "./invert.ts";
import { checkDensity, checkParameter, checkPressure } from "./range.ts";

/** What every finite-strain form is built from: values at zero pressure, SI. */
export interface FiniteStrainParameters {
  /** [kg m^-3] */
  readonly densityZero: number;
  /** Isothermal bulk modulus K0 [Pa]. */
  readonly bulkModulus: number;
  /** K0' = dK/dP at zero pressure. */
  readonly bulkModulusPrime: number;
}

/**
 * What the finite-strain forms share. The coordinate is the linear compression y = (ρ/ρ0)^(1/3), 1 at zero pressure;
 * expansion (y < 1) is outside their range.
 */
export abstract class FiniteStrainCurve implements EosCurve {
  readonly form: string;
  readonly densityZero: number;
  readonly bulkModulus: number;
  readonly bulkModulusPrime: number;
  readonly minPressure = 0;
  /** Coordinate beyond which pressure would fall with compression; Infinity if it never does. */
  turnOver = Number.POSITIVE_INFINITY;
  maxPressure = Number.POSITIVE_INFINITY;

  private readonly scratch = new Float64Array(4);
  private readonly pressureFunction = {
    value: (y: number): number => this.pressure(y),
    slope: (y: number): number => {
      this.slopes(y, this.scratch);
      return this.scratch[0];
    },
  };

  constructor(form: string, parameters: FiniteStrainParameters) {
    checkParameter(form, "densityZero", parameters.densityZero);
    checkParameter(form, "bulkModulus", parameters.bulkModulus);
    checkParameter(form, "bulkModulusPrime", parameters.bulkModulusPrime, 1);
    this.form = form;
    this.densityZero = parameters.densityZero;
    this.bulkModulus = parameters.bulkModulus;
    this.bulkModulusPrime = parameters.bulkModulusPrime;
  }

  abstract pressure(y: number): number;
  abstract slopes(y: number, out: Float64Array): void;

  density(y: number): number {
    return this.densityZero * y * y * y;
  }

  coordinate(pressure: number): number {
    checkPressure(this.form, this, pressure);
    return this.invert(pressure);
  }

  invert(pressure: number): number {
    // Murnaghan's form, K = K0 + K0' P, has a closed inverse and starts Newton within a few percent.
    const { bulkModulus, bulkModulusPrime } = this;
    const guess = (1 + (bulkModulusPrime * pressure) / bulkModulus) ** (1 / (3 * bulkModulusPrime));
    return invertIncreasing(this.pressureFunction, pressure, {
      low: LEAST_COMPRESSION,
      high: this.turnOver,
      guess: Math.min(guess, this.turnOver),
    });
  }

  coordinateAtDensity(density: number): number {
    checkDensity(this.form, density, this.densityZero, this.density(this.turnOver));
    return Math.cbrt(density / this.densityZero);
  }

  /** For the constructors of forms that can turn over: finds where, and ends the pressure range there. */
  protected endAtTurnOver(): void {
    this.turnOver = firstFallingPoint(this.pressureFunction.slope);
    if (this.turnOver < Number.POSITIVE_INFINITY) this.maxPressure = this.pressure(this.turnOver);
  }
}

/** Well outside the range (y >= 1), so that pressures a little below zero still find their y. */
const LEAST_COMPRESSION = 0.8;

/** Far beyond any planet: a linear compression of 30 is a density of 27 000 ρ0. */
const LARGEST_COMPRESSION = 30;

/** The first y > 1 at which dP/dy stops being positive, by scan and bisection; Infinity if there is none. */
function firstFallingPoint(slope: (y: number) => number): number {
  let low = 1;
  let high = 1;
  while (slope(high) > 0) {
    low = high;
    high *= 1.002;
    if (high > LARGEST_COMPRESSION) return Number.POSITIVE_INFINITY;
  }
  while (high - low > 1e-15 * high) {
    const middle = 0.5 * (low + high);
    if (middle === low || middle === high) break;
    if (slope(middle) > 0) low = middle;
    else high = middle;
  }
  return low;
}
