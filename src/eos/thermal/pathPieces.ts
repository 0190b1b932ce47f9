import { ChebyshevPolynomial, chebyshevNodes } from "../../numerics/chebyshevPolynomial.ts";

/** One point of a path: what a substance is like at one pressure. */
export interface PathPoint {
  readonly pressure: number;
  readonly density: number;
  readonly temperature: number;
  /** Where a search for a neighbour may start, if the path keeps such a thing. */
  readonly coordinates?: readonly number[];
}

/** The path between two neighbouring y. */
export interface PathPiece {
  readonly logDensity: ChebyshevPolynomial;
  readonly temperature: ChebyshevPolynomial;
}

interface Halves {
  readonly middle: number;
  readonly low: PathPiece | Halves;
  readonly high: PathPiece | Halves;
}

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

/**
 * A path over y >= 1 as polynomial pieces, each made when first asked for, so no highest y has to be known beforehand.
 * A piece does not depend on what was asked before.
 * Checked test/eos/thermal/temperaturePaths.test.ts
 */
export class PathPieces {
  private readonly sample: (y: number, near?: PathPoint) => PathPoint;
  private readonly lowest: number;
  private readonly highest: number;
  private readonly kinks: readonly number[];
  /** Left edge of cell 0, in cells from y = WALL + 1. */
  private readonly origin: number;
  private readonly pieces: (PathPiece | Halves)[] = [];

  /**
   * `sample` gives the path at y, with a point close by where a search may start; `start` is where most of the use
   * begins, `kinks` are the y where the path is not smooth, ascending.
   */
  constructor(
    sample: (y: number, near?: PathPoint) => PathPoint,
    range: { lowest: number; highest: number; start: number; kinks: readonly number[] },
  ) {
    this.sample = sample;
    this.lowest = range.lowest;
    this.highest = range.highest;
    this.kinks = range.kinks;
    // A quarter of a cell to spare, for trial steps that fall short of the start; whole cells down to the lowest y.
    const first = inCells(range.start) - 0.25;
    this.origin = first - Math.max(Math.ceil(first - inCells(range.lowest)), 0);
  }

  /** Cells are further divided at kinks; cell number plus kinks passed numbers the pieces uniquely. */
  at(y: number): PathPiece {
    // Steps that overshoot the lowest y see the lowest piece continued.
    const inside = Math.max(y, this.lowest);
    const cell = Math.floor(inCells(inside) - this.origin);
    let passed = 0;
    while (passed < this.kinks.length && this.kinks[passed] <= inside) passed++;
    const index = cell + passed;
    this.pieces[index] ??= this.make(
      Math.max(fromCells(this.origin + cell), this.kinks[passed - 1] ?? 0, this.lowest),
      Math.min(fromCells(this.origin + cell + 1), this.kinks[passed] ?? Number.POSITIVE_INFINITY, this.highest),
      MAX_HALVINGS,
    );
    let piece = this.pieces[index];
    while ("middle" in piece) piece = inside < piece.middle ? piece.low : piece.high;
    return piece;
  }

  private make(from: number, to: number, halvingsLeft: number): PathPiece | Halves {
    const points: PathPoint[] = [];
    for (const y of chebyshevNodes(from, to, DEGREE)) points.push(this.sample(y, points.at(-1)));
    const through = (values: number[]) => new ChebyshevPolynomial(from, to, values);
    const logDensity = through(points.map((point) => Math.log(point.density)));
    if (logDensity.tail > TOLERANCE && halvingsLeft > 0) {
      const middle = (from + to) / 2;
      return {
        middle,
        low: this.make(from, middle, halvingsLeft - 1),
        high: this.make(middle, to, halvingsLeft - 1),
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
