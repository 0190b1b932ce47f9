import { quarticThrough } from "../numerics/piecewiseQuartic.ts";
import type { LatticePoint, RadiusLattice } from "./radiusLattice.ts";

/** A rectangle of 5 × 5 lattice points, `di` and `dj` apart, starting at (i, j); ln R between them is a biquartic. */
export interface Cell extends LatticePoint {
  readonly di: number;
  readonly dj: number;
  /** ln R, row by row: at [5 a + b] for the point (i + a di, j + b dj). */
  readonly values: Float64Array;
  /** By how much it misses ln R of its test planets, at most. */
  readonly testError: number;
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

type OpenCell = Omit<Cell, "values" | "testError">;

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
      const nodes = own.slice(0, 25);
      const errors = testErrors(nodes, own.subarray(25));
      const halves = errors.any <= tolerance ? [] : halvesOf(cell, errors);
      if (halves.length === 0) done.push({ ...cell, values: nodes, testError: errors.any });
      return halves;
    });
  }
  return { cells: done };
}

/** Biquartic at u node distances along mass and v along fraction. */
export function cellValue(values: Float64Array, u: number, v: number): number {
  const alongMass = new Float64Array(5);
  for (let a = 0; a < 5; a++) alongMass[a] = quarticThrough(values, 5 * a, v);
  return quarticThrough(alongMass, 0, u);
}

function lastBeforeHole(points: readonly LatticePoint[], solved: readonly (number | undefined)[]): number {
  const firstHole = points.reduce(
    (first, { i }, n) => (solved[n] === undefined ? Math.min(first, i) : first),
    Infinity,
  );
  return points.reduce((last, { i }) => (i < firstHole ? Math.max(last, i) : last), -1);
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

function testErrors(values: Float64Array, solved: Float64Array): TestErrors {
  const errors = TESTS.map(([u, v], t) => Math.abs(cellValue(values, u, v) - solved[t]));
  return {
    alongMass: Math.max(errors[0], errors[1]),
    alongFraction: Math.max(errors[2], errors[3]),
    any: Math.max(...errors),
  };
}

/** None if the cell cannot be halved any more. */
function halvesOf(cell: OpenCell, errors: TestErrors): OpenCell[] {
  const { i, j, di, dj } = cell;
  const massFirst = errors.alongMass >= errors.alongFraction;
  if (di > 2 && (massFirst || dj <= 2)) {
    return [
      { ...cell, di: di / 2 },
      { ...cell, i: i + 2 * di, di: di / 2 },
    ];
  }
  if (dj <= 2) return [];
  return [
    { ...cell, dj: dj / 2 },
    { ...cell, j: j + 2 * dj, dj: dj / 2 },
  ];
}
