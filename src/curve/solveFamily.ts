import { ConvergenceError } from "../errors.ts";
import { type FamilyLattice, FamilyTable, type MeasuredError } from "./familyTable.ts";
import type { MassRange, RadiusSolver } from "./radiusCurve.ts";
import { fractionsAt } from "./simplexAngles.ts";

/** The solver of one member of a family, by its mass fractions, centre to surface. */
export type MemberSolver = (fractions: readonly number[]) => RadiusSolver;

export interface LatticeOptions {
  /** Intervals along each angle. */
  readonly angleSteps?: number;
  /** Largest distance of the masses, in ln M. */
  readonly massStep?: number;
}

/** A family's lattice and how well radii between its nodes are met. */
export interface SolvedFamily {
  readonly lattice: FamilyLattice;
  readonly error: MeasuredError;
}

const ANGLE_STEPS = 24;
const MASS_STEP = 0.2;
/** Masses that a table must have to be interpolated in. */
const FEWEST_MASSES = 6;
/** Planets solved anew to measure the error. */
const TESTS = 256;

/**
 * Solves a family's planets on a lattice over `range` (with at least six masses). The range ends early, for all members
 * alike, where some member has no heavier planet.
 *
 * Between nodes R is met to about 1e-6, but for the surfaces along which a phase appears or vanishes: there R has a fold,
 * and the error is of the order of the jump of the slope times the distance of the nodes. `error` is measured, not
 * estimated, at planets spread evenly over masses and angles.
 * Throws ConvergenceError `grid-empty` if a member has no planet at the light end.
 * Checked test/curve/familyTable.test.ts
 */
export function solveFamily(
  solver: MemberSolver,
  componentCount: number,
  range: MassRange,
  { angleSteps = ANGLE_STEPS, massStep = MASS_STEP }: LatticeOptions = {},
): SolvedFamily {
  const from = Math.log(range.lightest);
  const span = Math.log(range.heaviest) - from;
  const intervals = Math.max(FEWEST_MASSES - 1, Math.ceil(span / massStep));
  const step = Math.max(span, massStep) / intervals;
  const masses = Array.from({ length: intervals + 1 }, (_, i) => Math.exp(from + i * step));
  const members = latticeAngles(componentCount - 1, angleSteps).map(fractionsAt);
  const curves = solveMembers(solver, members, masses);
  const massCount = Math.min(
    ...curves.map((radii) => (radii.includes(undefined) ? radii.indexOf(undefined) : radii.length)),
  );
  if (massCount < FEWEST_MASSES) throw empty(range);

  const logRadii = new Float64Array(curves.length * massCount);
  curves.forEach((radii, c) => {
    for (let i = 0; i < massCount; i++) logRadii[c * massCount + i] = Math.log(radii[i] as number);
  });
  const lattice = { componentCount, angleSteps, logMassFrom: from, logMassStep: step, massCount, logRadii };
  return { lattice, error: measureError(solver, new FamilyTable(lattice)) };
}

/** All points of the lattice of angles, the last angle moving fastest. */
function latticeAngles(dimensions: number, steps: number): number[][] {
  if (dimensions === 0) return [[]];
  const along = Array.from({ length: steps + 1 }, (_, i) => i / steps);
  return latticeAngles(dimensions - 1, steps).flatMap((angles) => along.map((angle) => [...angles, angle]));
}

/** Where the outer components are all there is, many points of the lattice are the same planet: each is solved once. */
function solveMembers(solver: MemberSolver, members: readonly number[][], masses: readonly number[]) {
  const solved = new Map<string, readonly (number | undefined)[]>();
  return members.map((unrounded) => {
    const fractions = unrounded.map((f) => (f < 1e-12 ? 0 : f));
    const key = fractions.join();
    const radii = solved.get(key) ?? solver(fractions)(masses);
    solved.set(key, radii);
    return radii;
  });
}

/** At places that fill masses and angles evenly: multiples of 1/p, 1/p², … with p^(d+1) = p + 1 for d coordinates. */
function measureError(solver: MemberSolver, table: FamilyTable): MeasuredError {
  const dimensions = table.componentCount;
  const strides = Array.from({ length: dimensions }, (_, d) => plasticNumber(dimensions) ** -(d + 1));
  const ratio = table.heaviest / table.lightest;
  const tests = Array.from({ length: TESTS }, (_, n) => {
    const [atMass, ...angles] = strides.map((stride) => ((n + 0.5) * stride) % 1);
    const fractions = fractionsAt(angles);
    const mass = table.lightest * ratio ** atMass;
    const [radius] = solver(fractions)([mass]);
    const error = radius === undefined ? Number.NaN : Math.abs(table.member(fractions).radius(mass) / radius - 1);
    return { mass, fractions, error };
  });
  const ranked = [...tests].sort((a, b) => b.error - a.error);
  const { mass, fractions, error } = ranked[0];
  return {
    largest: error,
    rootMeanSquare: Math.sqrt(tests.reduce((sum, test) => sum + test.error ** 2, 0) / TESTS),
    median: ranked[TESTS / 2].error,
    tested: TESTS,
    worst: { mass, fractions },
  };
}

/** The p above 1 with p^(d+1) = p + 1: the golden ratio for d = 1, 1.3247… for d = 2. */
function plasticNumber(d: number): number {
  let p = 1.5;
  for (let step = 0; step < 60; step++) p = (1 + p) ** (1 / (d + 1));
  return p;
}

function empty({ lightest }: MassRange): ConvergenceError {
  return new ConvergenceError(
    "grid-empty",
    `A member of the family has no planets from ${lightest} kg on, the lightest mass asked for. Ask for heavier planets.`,
  );
}
