import { quarticThrough } from "../numerics/piecewiseQuartic.ts";
import type { LatticePoint, RadiusLattice } from "./radiusLattice.ts";

/** A rectangle of 5 × 5 lattice points, `di` and `dj` apart, starting at (i, j); ln R between them is a biquartic. */
export interface Cell extends LatticePoint {
  readonly di: number;
  readonly dj: number;
  /** ln R, row by row: at [5 a + b] for the point (i + a di, j + b dj). */
  readonly values: Float64Array;
}

/** How often a first cell can be halved each way. */
export const HALVINGS = 9;
/** Lattice steps along a first cell: four node distances, halved, and once more for the points that test the last. */
export const CELL_STEPS = 4 * 2 ** (HALVINGS + 1);

/** Where a cell is tested, in node distances: halfway to the next node where a quartic errs most, along each axis alone… */
const TESTS_ALONG_MASS = [
  [0.5, 2],
  [3.5, 2],
] as const;
const TESTS_ALONG_FRACTION = [
  [2, 0.5],
  [2, 3.5],
] as const;
/** …and where a fold that crosses the cell would otherwise be missed. */
const TESTS_BETWEEN = [
  [0.5, 0.5],
  [0.5, 3.5],
  [1.5, 2.5],
  [2.5, 1.5],
  [3.5, 0.5],
  [3.5, 3.5],
] as const;
const TESTS = [...TESTS_ALONG_MASS, ...TESTS_ALONG_FRACTION, ...TESTS_BETWEEN];

type OpenCell = Omit<Cell, "values">;

/** The cells, or the largest i up to which every member of the family has planets; below 0 if there is none. */
export type Refinement = { readonly cells: Cell[] } | { readonly cells?: undefined; readonly solvableUntil: number };

/**
 * Halves cells, along the axis that is worse, until each meets its test planets within `tolerance` in ln R (or cannot be
 * halved). Refines where it must: along the lines in (M, f) where a phase appears or vanishes, R has a fold.
 */
export function refinedCells(
  lattice: RadiusLattice,
  massCells: number,
  fractionCells: number,
  tolerance: number,
): Refinement {
  const done: Cell[] = [];
  let open: OpenCell[] = [];
  for (let a = 0; a < massCells; a++) {
    for (let b = 0; b < fractionCells; b++) {
      open.push({ i: a * CELL_STEPS, j: b * CELL_STEPS, di: CELL_STEPS / 4, dj: CELL_STEPS / 4 });
    }
  }
  while (open.length > 0) {
    const points = open.flatMap((cell) => [...nodesOf(cell), ...testsOf(cell)]);
    const solved = lattice.solve(points);
    if (solved.includes(undefined)) return { solvableUntil: lastBeforeHole(points, solved) };
    const values = Float64Array.from(solved as number[]);
    const perCell = 25 + TESTS.length;
    open = open.flatMap((cell, c) => {
      const own = values.subarray(c * perCell, (c + 1) * perCell);
      const finished = { ...cell, values: own.slice(0, 25) };
      const halves = halvesOf(cell, testErrors(finished, own.subarray(25)), tolerance);
      if (halves.length === 0) done.push(finished);
      return halves;
    });
  }
  return { cells: done };
}

/** Biquartic at u node distances along mass and v along fraction. */
export function cellValue({ values }: Cell, u: number, v: number): number {
  const alongMass = new Float64Array(5);
  for (let a = 0; a < 5; a++) alongMass[a] = quarticThrough(values, 5 * a, v);
  return quarticThrough(alongMass, 0, u);
}

function lastBeforeHole(points: readonly LatticePoint[], solved: readonly (number | undefined)[]): number {
  const holes = points.filter((_, n) => solved[n] === undefined).map(({ i }) => i);
  const first = Math.min(...holes);
  return Math.max(-1, ...points.map(({ i }) => i).filter((i) => i < first));
}

function nodesOf({ i, j, di, dj }: OpenCell): LatticePoint[] {
  return Array.from({ length: 25 }, (_, n) => ({ i: i + Math.floor(n / 5) * di, j: j + (n % 5) * dj }));
}

function testsOf({ i, j, di, dj }: OpenCell): LatticePoint[] {
  return TESTS.map(([u, v]) => ({ i: i + u * di, j: j + v * dj }));
}

interface TestErrors {
  readonly alongMass: number;
  readonly alongFraction: number;
  readonly any: number;
}

function testErrors(cell: Cell, solved: Float64Array): TestErrors {
  const errors = TESTS.map(([u, v], t) => Math.abs(cellValue(cell, u, v) - solved[t]));
  return {
    alongMass: Math.max(errors[0], errors[1]),
    alongFraction: Math.max(errors[2], errors[3]),
    any: Math.max(...errors),
  };
}

function halvesOf(cell: OpenCell, errors: TestErrors, tolerance: number): OpenCell[] {
  const { i, j, di, dj } = cell;
  if (errors.any <= tolerance) return [];
  const byMass = di > 2 && (errors.alongMass >= errors.alongFraction || dj <= 2);
  if (byMass)
    return [
      { ...cell, di: di / 2 },
      { ...cell, i: i + 2 * di, di: di / 2 },
    ];
  if (dj > 2)
    return [
      { ...cell, dj: dj / 2 },
      { ...cell, j: j + 2 * dj, dj: dj / 2 },
    ];
  return [];
}
