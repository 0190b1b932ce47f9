import { ConvergenceError, ModelRangeError } from "../errors.ts";
import { PiecewiseQuartic, quarticThrough } from "../numerics/piecewiseQuartic.ts";
import { CELL_STEPS, type Cell, cellValue, refinedCells } from "./radiusCells.ts";
import { InterpolatedCurve, type MassRange, type RadiusCurve } from "./radiusCurve.ts";
import { angleOf, type FamilySolver, RadiusLattice } from "./radiusLattice.ts";

/** R(M, f) of a one-parameter family of compositions, f from 0 to 1. */
export interface RadiusGrid extends MassRange {
  /** Largest relative error of the radius at planets solved between the nodes. */
  readonly relativeError: number;
  /** Of the errors at one more planet in every cell, over the plane of ln M and the lattice's measure of the fraction. */
  readonly rootMeanSquareError: number;
  readonly cellCount: number;
  readonly solvedPlanets: number;
  /**
   * The curve of one member, at least over the masses of `within` (default: all). Cheap enough to be made anew for every
   * fraction an inference asks for. Throws ModelRangeError `grid-fraction-range`.
   */
  member(fraction: number, within?: MassRange): RadiusCurve;
}

/** Size of the first cells: in ln M, and their number along the fraction. */
const FIRST_CELL = 1;
const FRACTION_CELLS = 4;
const FRACTION_STEPS = FRACTION_CELLS * CELL_STEPS;

/**
 * Solves a family until R is known to `tolerance` at every mass of the range and every fraction, by biquartic cells in
 * ln M and the angle φ of f = sin²(πφ/2), which gives room to thin outer layers and small cores. What costs is the folds
 * of R along lines where a phase appears or vanishes: with the default the largest error is reached there only, and the
 * root mean square is about ten times smaller. Halving `tolerance` doubles the work.
 * The range ends early, for all members alike, where some member has no heavier planet.
 * Throws ConvergenceError `grid-empty` if a member has no planet at the light end.
 * Checked test/curve/radiusGrid.test.ts
 */
export function radiusGrid(solveMember: FamilySolver, range: MassRange, { tolerance = 1e-4 } = {}): RadiusGrid {
  const from = Math.log(range.lightest);
  const to = Math.log(range.heaviest);
  const massCells = Math.max(1, Math.ceil((to - from) / FIRST_CELL));
  const step = (to - from) / (massCells * CELL_STEPS);
  const lattice = new RadiusLattice(solveMember, from, step, FRACTION_STEPS);
  const refinement = refinedCells(lattice, massCells, FRACTION_CELLS, tolerance / 2);
  if (refinement.cells !== undefined) return new CellGrid(refinement.cells, lattice);
  if (refinement.solvableUntil > 0) {
    return radiusGrid(solveMember, { ...range, heaviest: lattice.mass(refinement.solvableUntil) }, { tolerance });
  }
  throw new ConvergenceError(
    "grid-empty",
    `A member of the family has no planet of ${range.lightest} kg, the lightest mass asked for. Ask for heavier planets.`,
  );
}

/** Cells in flat arrays, in order of mass. */
class CellGrid implements RadiusGrid {
  readonly lightest: number;
  readonly heaviest: number;
  readonly relativeError: number;
  readonly rootMeanSquareError: number;
  readonly cellCount: number;
  readonly solvedPlanets: number;
  /** For each cell: ln M at its first node and the distance of its nodes; the same for the angle. */
  private readonly massFrom: Float64Array;
  private readonly massSpacing: Float64Array;
  private readonly angleFrom: Float64Array;
  private readonly angleSpacing: Float64Array;
  /** 25 values of ln R for each cell. */
  private readonly values: Float64Array;

  constructor(unsorted: readonly Cell[], lattice: RadiusLattice) {
    const cells = [...unsorted].sort((a, b) => a.i - b.i || a.j - b.j);
    this.cellCount = cells.length;
    this.massFrom = Float64Array.from(cells, ({ i }) => lattice.from + i * lattice.step);
    this.massSpacing = Float64Array.from(cells, ({ di }) => di * lattice.step);
    this.angleFrom = Float64Array.from(cells, ({ j }) => j / FRACTION_STEPS);
    this.angleSpacing = Float64Array.from(cells, ({ dj }) => dj / FRACTION_STEPS);
    this.values = new Float64Array(25 * cells.length);
    cells.forEach(({ values }, c) => void this.values.set(values, 25 * c));
    const last = cells[cells.length - 1];
    this.lightest = lattice.mass(0);
    this.heaviest = lattice.mass(last.i + 4 * last.di);
    const errors = measureErrors(cells, lattice);
    this.relativeError = errors.largest;
    this.rootMeanSquareError = errors.rootMeanSquare;
    this.solvedPlanets = lattice.solvedPlanets;
  }

  member(fraction: number, within: MassRange = this): RadiusCurve {
    if (!(fraction >= 0 && fraction <= 1)) {
      const range = { quantity: "mass fraction", value: fraction, minimum: 0, maximum: 1 };
      throw new ModelRangeError("grid-fraction-range", `A mass fraction of ${fraction} is not between 0 and 1.`, range);
    }
    const angle = angleOf(fraction);
    const crossed = this.cellsAt(angle, Math.log(within.lightest), Math.log(within.heaviest));
    const from = crossed.map((c) => this.massFrom[c]);
    const spacing = crossed.map((c) => this.massSpacing[c]);
    const values = new Float64Array(5 * crossed.length);
    crossed.forEach((c, n) => {
      const v = (angle - this.angleFrom[c]) / this.angleSpacing[c];
      for (let a = 0; a < 5; a++) values[5 * n + a] = quarticThrough(this.values, 25 * c + 5 * a, v);
    });
    return new InterpolatedCurve(new PiecewiseQuartic(from, spacing, values));
  }

  /** In order of mass; an angle on the line between two cells belongs to the upper one. */
  private cellsAt(angle: number, from: number, to: number): number[] {
    const cells: number[] = [];
    for (let c = 0; c < this.cellCount && this.massFrom[c] <= to; c++) {
      if (this.massFrom[c] + 4 * this.massSpacing[c] < from) continue;
      const v = (angle - this.angleFrom[c]) / this.angleSpacing[c];
      if (v >= 0 && (v < 4 || (v === 4 && angle === 1))) cells.push(c);
    }
    return cells;
  }
}

/** Solves one more planet in every cell, at places that fill a square evenly: multiples of 1/p and 1/p², p = 1.3247… (p³ = p + 1). */
function measureErrors(cells: readonly Cell[], lattice: RadiusLattice): { largest: number; rootMeanSquare: number } {
  let largest = 0;
  let squares = 0;
  let area = 0;
  cells.forEach((cell, c) => {
    const u = (4 * c * 0.7548776662466927) % 4;
    const v = (4 * c * 0.5698402909980532) % 4;
    const [radius] = lattice.solveMember(lattice.fraction(cell.j + v * cell.dj))([lattice.mass(cell.i + u * cell.di)]);
    const error = Math.abs(Math.exp(cellValue(cell.values, u, v)) / (radius ?? Number.NaN) - 1);
    largest = Math.max(largest, error, cell.testError);
    squares += cell.di * cell.dj * error * error;
    area += cell.di * cell.dj;
  });
  return { largest, rootMeanSquare: Math.sqrt(squares / area) };
}
