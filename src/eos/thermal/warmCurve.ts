import { BulkwrightError } from "../../errors.ts";
import type { EosCurve } from "../curve.ts";
import { invertIncreasing } from "../invert.ts";
import { checkDensity, checkPressure } from "../range.ts";
import { type PathPiece, PathPieces, type PathPoint } from "./pathPieces.ts";

/** An equation of state along a temperature that depends on pressure alone. */
export interface WarmCurve extends EosCurve {
  /** Temperature [K]. */
  temperature(y: number): number;
}

/** The path at a pressure; `near` is a point close by, where a search may start. */
export type Path = (pressure: number, near?: PathPoint) => PathPoint;

/** y = (1 + P/P*)^(1/12) grows like the cube root of density where the bulk modulus grows as 4 (P + P*). */
const EXPONENT = 12;

/**
 * Turns a path (pressure → density, temperature) into a curve the structure equations can be integrated along:
 * pressure is explicit in y, density and temperature are piecewise polynomials.
 * Range   relative error of density below 1e-10 and of its slope below 5e-9 (measured by the test)
 * Checked test/eos/thermal/temperaturePaths.test.ts
 */
export class PathCurve implements WarmCurve {
  readonly minPressure: number;
  readonly maxPressure: number;
  /** P* [Pa]. */
  private readonly scale: number;
  private readonly pieces: PathPieces;
  private readonly logDensity = {
    value: (y: number): number => this.pieces.at(y).logDensity.value(y),
    slope: (y: number): number => this.pieces.at(y).logDensity.slope(y),
  };

  constructor(
    path: Path,
    options: {
      minPressure: number;
      maxPressure: number;
      /** P* [Pa]. */
      scale: number;
      /** Pressure from which the path will mostly be followed upwards [Pa]. */
      startPressure: number;
      /** Pressures where the path is not smooth, ascending [Pa]. */
      kinks?: readonly number[];
    },
  ) {
    const { minPressure, maxPressure, scale, startPressure, kinks = [] } = options;
    this.minPressure = minPressure;
    this.maxPressure = maxPressure;
    this.scale = scale;
    // Rounding in y must not take a sample out of the range.
    const pressureInRange = (y: number): number => Math.min(Math.max(this.pressure(y), minPressure), maxPressure);
    this.pieces = new PathPieces((y, near) => path(pressureInRange(y), near), {
      lowest: this.invert(minPressure),
      highest: this.invert(maxPressure),
      start: this.invert(startPressure),
      kinks: kinks.map((pressure) => this.invert(pressure)),
    });
  }

  pressure(y: number): number {
    return this.scale * (y ** EXPONENT - 1);
  }

  density(y: number): number {
    return Math.exp(this.logDensity.value(y));
  }

  temperature(y: number): number {
    return this.pieces.at(y).temperature.value(y);
  }

  slopes(y: number, out: Float64Array): void {
    const piece = this.pieceOrNone(y);
    if (piece === undefined) {
      out.fill(Number.NaN);
      return;
    }
    const y2 = y * y;
    const y4 = y2 * y2;
    out[0] = EXPONENT * this.scale * y4 * y4 * y2 * y;
    out[1] = out[0] / Math.exp(piece.logDensity.value(y));
    out[2] = piece.logDensity.slope(y);
    out[3] = (EXPONENT - 1) / y;
  }

  /** None at a trial state beyond what the material can do: NaN then makes the integrator take a shorter step. */
  private pieceOrNone(y: number): PathPiece | undefined {
    try {
      return this.pieces.at(y);
    } catch (error) {
      if (error instanceof BulkwrightError) return undefined;
      throw error;
    }
  }

  coordinate(pressure: number): number {
    checkPressure("warm", this, pressure);
    return this.invert(pressure);
  }

  invert(pressure: number): number {
    return (1 + pressure / this.scale) ** (1 / EXPONENT);
  }

  coordinateAtDensity(density: number): number {
    const [low, high] = [this.invert(this.minPressure), this.invert(this.maxPressure)];
    const lowest = this.density(low);
    checkDensity("warm", density, lowest, high === Number.POSITIVE_INFINITY ? high : this.density(high));
    const guess = Math.min(low * Math.cbrt(density / lowest), high);
    return invertIncreasing(this.logDensity, Math.log(density), { low, high, guess });
  }
}
