import type { RadiusSolver } from "./radiusCurve.ts";

/** The solver of one member of a family, by its fraction. */
export type FamilySolver = (fraction: number) => RadiusSolver;

export interface LatticePoint {
  readonly i: number;
  readonly j: number;
}

/**
 * Solves a family's planets at points of a lattice, each point once:
 * ln M = from + i · step, fraction = sin²(πφ/2) with φ = j / fractionSteps.
 */
export class RadiusLattice {
  readonly from: number;
  readonly step: number;
  readonly fractionSteps: number;
  readonly solveMember: FamilySolver;
  private readonly known = new Map<number, number | undefined>();

  constructor(solveMember: FamilySolver, from: number, step: number, fractionSteps: number) {
    this.solveMember = solveMember;
    this.fractionSteps = fractionSteps;
    this.from = from;
    this.step = step;
  }

  get solvedPlanets(): number {
    return this.known.size;
  }

  mass(i: number): number {
    return Math.exp(this.from + i * this.step);
  }

  fraction(j: number): number {
    return Math.sin((Math.PI / 2) * (j / this.fractionSteps)) ** 2;
  }

  /** ln R at the points, in their order; undefined where there is no planet. */
  readonly solve: (points: readonly LatticePoint[]) => (number | undefined)[] = (points) => {
    const unknown = new Map<number, Set<number>>();
    for (const { i, j } of points) {
      if (this.known.has(this.key(i, j))) continue;
      unknown.set(j, (unknown.get(j) ?? new Set()).add(i));
    }
    for (const [j, masses] of unknown) this.solveRow(j, [...masses]);
    return points.map(({ i, j }) => this.known.get(this.key(i, j)));
  };

  /** In order of mass, so that one planet predicts the next. */
  private solveRow(j: number, unordered: readonly number[]): void {
    const rising = [...unordered].sort((a, b) => a - b);
    const radii = this.solveMember(this.fraction(j))(rising.map((i) => this.mass(i)));
    rising.forEach((i, n) => {
      const radius = radii[n];
      this.known.set(this.key(i, j), radius === undefined ? undefined : Math.log(radius));
    });
  }

  private key(i: number, j: number): number {
    return i * (this.fractionSteps + 1) + j;
  }
}

/** The φ (0 to 1) of a fraction. */
export function angleOf(fraction: number): number {
  return (2 / Math.PI) * Math.asin(Math.sqrt(fraction));
}
