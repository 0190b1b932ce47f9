import { ModelRangeError } from "../../errors.ts";
import { ChebyshevPolynomial, chebyshevNodes } from "../../numerics/chebyshevPolynomial.ts";
import type { EosCurve } from "../curve.ts";
import { checkPressure } from "../range.ts";

/** An equation of state along a temperature that depends on pressure alone. */
export interface WarmCurve extends EosCurve {
  /** Temperature [K]. */
  temperature(y: number): number;
}

/** One point of the path a warm curve follows. */
export interface PathPoint {
  readonly pressure: number;
  readonly density: number;
  readonly temperature: number;
  /** Where a search for a neighbour may start, if the path keeps such a thing. */
  readonly coordinates?: readonly number[];
}

/** y = (1 + P/P*)^(1/12) grows like the cube root of density where the bulk modulus grows as 4 (P + P*). */
const EXPONENT = 12;
/**
 * Paths are the less smooth the nearer they are to y = 0.9 or so, where a hot phase would fly apart: cells grow in
 * proportion to the distance from there.
 */
const WALL = 0.9;
const CELL_GROWTH = 0.2;
const DEGREE = 8;
/** Allowed size of the last coefficients of ln ρ; a piece that has larger ones is halved, this often at most. */
const TOLERANCE = 1e-9;
const MAX_HALVINGS = 8;

/** The path at a pressure; `near` is a point close by, where a search may start. */
export type Path = (pressure: number, near?: PathPoint) => PathPoint;

interface Polynomials {
  readonly logDensity: ChebyshevPolynomial;
  readonly temperature: ChebyshevPolynomial;
}

interface Halves {
  readonly middle: number;
  readonly low: Piece;
  readonly high: Piece;
}

type Piece = Polynomials | Halves;

/**
 * Turns a path (pressure → density, temperature) into a curve the structure equations can be integrated along.
 * Pressure is explicit in y; density and temperature are piecewise polynomials in y, each piece made when first
 * asked for, so no upper pressure has to be known beforehand; a piece does not depend on what was asked before.
 * Range   relative error of density below 1e-10 and of its slope below 5e-9 (measured by the test)
 * Checked test/eos/thermal/temperaturePaths.test.ts
 */
export class PathCurve implements WarmCurve {
  readonly minPressure: number;
  readonly maxPressure: number;
  private readonly path: Path;
  private readonly scale: number;
  private readonly lowest: number;
  private readonly highest: number;
  /** Left edge of cell 0, in cells from y = WALL + 1. */
  private readonly origin: number;
  private readonly kinks: readonly number[];
  private readonly pieces: Piece[] = [];

  constructor(
    path: Path,
    options: {
      minPressure: number;
      maxPressure: number;
      /** P* [Pa]. */
      scale: number;
      /** Pressure from which the path will be followed upwards [Pa]: the pieces are laid out from there. */
      startPressure: number;
      /** Pressures where the path is not smooth, ascending [Pa]. */
      kinks?: readonly number[];
    },
  ) {
    this.path = path;
    this.scale = options.scale;
    this.minPressure = options.minPressure;
    this.maxPressure = options.maxPressure;
    this.lowest = this.invert(options.minPressure);
    this.highest = this.invert(options.maxPressure);
    // A quarter of a cell to spare, for trial steps that fall short of the start; whole cells down to the lowest y.
    const first = inCells(this.invert(options.startPressure)) - 0.25;
    this.origin = first - Math.max(Math.ceil(first - inCells(this.lowest)), 0);
    this.kinks = (options.kinks ?? []).map((pressure) => this.invert(pressure));
  }

  pressure(y: number): number {
    return this.scale * (y ** EXPONENT - 1);
  }

  density(y: number): number {
    return Math.exp(this.pieceAt(y).logDensity.value(y));
  }

  temperature(y: number): number {
    return this.pieceAt(y).temperature.value(y);
  }

  slopes(y: number, out: Float64Array): void {
    let piece: Polynomials;
    try {
      piece = this.pieceAt(y);
    } catch {
      // A trial state beyond what the material can do: NaN makes the integrator take a shorter step.
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

  coordinate(pressure: number): number {
    checkPressure("warm", this, pressure);
    return this.invert(pressure);
  }

  invert(pressure: number): number {
    return (1 + pressure / this.scale) ** (1 / EXPONENT);
  }

  coordinateAtDensity(density: number): number {
    const target = Math.log(density);
    let y = this.lowest;
    for (let i = 0; i < 100; i++) {
      const { logDensity } = this.pieceAt(y);
      const step = (target - logDensity.value(y)) / logDensity.slope(y);
      const next = Math.min(y + step, this.highest);
      if (!(next >= this.lowest - 1e-12)) break;
      if (Math.abs(next - y) <= 1e-14 * y) {
        if (y + step > this.highest * (1 + 1e-12)) break;
        return next;
      }
      y = next;
    }
    const minimum = this.density(this.lowest);
    throw new ModelRangeError(
      "eos-density-range",
      `Density ${density} kg/m³ is not one this phase has at its temperature; its lowest is ${minimum} kg/m³.`,
      { quantity: "density", value: density, minimum },
    );
  }

  /** Pressure at a node, kept from leaving the range by rounding. */
  private pressureInRange(y: number): number {
    return Math.min(Math.max(this.pressure(y), this.minPressure), this.maxPressure);
  }

  /** Cells are further divided at kinks; cell number plus kinks passed numbers the pieces uniquely. */
  private pieceAt(y: number): Polynomials {
    // Steps that overshoot the lowest pressure see the lowest piece continued.
    const inside = Math.max(y, this.lowest);
    const cell = Math.floor(inCells(inside) - this.origin);
    let passed = 0;
    while (passed < this.kinks.length && this.kinks[passed] <= inside) passed++;
    const index = cell + passed;
    this.pieces[index] ??= this.makePiece(
      Math.max(fromCells(this.origin + cell), this.kinks[passed - 1] ?? 0, this.lowest),
      Math.min(fromCells(this.origin + cell + 1), this.kinks[passed] ?? Number.POSITIVE_INFINITY, this.highest),
      MAX_HALVINGS,
    );
    let piece = this.pieces[index];
    while ("middle" in piece) piece = inside < piece.middle ? piece.low : piece.high;
    return piece;
  }

  private makePiece(from: number, to: number, halvingsLeft: number): Piece {
    const points: PathPoint[] = [];
    for (const y of chebyshevNodes(from, to, DEGREE)) points.push(this.path(this.pressureInRange(y), points.at(-1)));
    const through = (values: number[]) => new ChebyshevPolynomial(from, to, values);
    const logDensity = through(points.map((point) => Math.log(point.density)));
    if (logDensity.tail > TOLERANCE && halvingsLeft > 0) {
      const middle = (from + to) / 2;
      return {
        middle,
        low: this.makePiece(from, middle, halvingsLeft - 1),
        high: this.makePiece(middle, to, halvingsLeft - 1),
      };
    }
    return { logDensity, temperature: through(points.map((point) => point.temperature)) };
  }
}

function inCells(y: number): number {
  return Math.log(y - WALL) / CELL_GROWTH;
}

function fromCells(cells: number): number {
  return WALL + Math.exp(cells * CELL_GROWTH);
}
