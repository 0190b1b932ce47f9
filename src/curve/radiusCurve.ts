import { ConvergenceError, ModelRangeError } from "../errors.ts";
import { LocalCubic } from "../numerics/localCubic.ts";

/** Radii [m] of planets of rising mass [kg]; undefined where there is no such planet. */
export type RadiusSolver = (masses: readonly number[]) => readonly (number | undefined)[];

/** [kg] */
export interface MassRange {
  readonly lightest: number;
  readonly heaviest: number;
}

/** Radius of one composition as a function of mass. */
export interface RadiusCurve extends MassRange {
  /** Radius [m] at a mass [kg]. Throws ModelRangeError `curve-mass-range` outside the curve's range. */
  radius(mass: number): number;
  /** The mass [kg] with that radius on the branch where radius rises with mass; undefined where there is none. */
  massWithRadius(radius: number): number | undefined;
}

/** A curve through solved planets, with its measured error. */
export interface MeasuredCurve extends RadiusCurve {
  /** Largest relative error of the radius at planets solved between the nodes, other than those that decided on them. */
  readonly relativeError: number;
  readonly nodeCount: number;
}

/** Of ln M: distance of the first nodes, and the closest that refinement brings them. */
const FIRST_SPACING = 0.5;
const CLOSEST_SPACING = 1e-4;
/** How near to its heaviest planet a curve that ends early must reach, in ln M. */
const END_GAP = 1e-3;
/** Where between two nodes the finished curve is measured: not the middle, where it was made to fit. */
const MEASURED_AT = 0.382;
/** Of the range in ln M when a mass is sought: 14 / 2^48 is round-off. */
const HALVINGS = 48;

/** Masses at the ends of the range go through a logarithm and back. */
const ROUND_OFF = 1e-12;

interface Interpolant {
  /** Rising. */
  readonly nodes: ArrayLike<number>;
  value(x: number): number;
}

/**
 * R(M) of one composition over a mass range, interpolated: local cubics in ln R over ln M through solved planets, with
 * a node added wherever the curve misses a planet solved halfway between two nodes by more than half of `tolerance`.
 * The range ends early where the composition has no heavier planet.
 * Throws ConvergenceError `curve-empty` if there is no planet at the light end.
 * Checked test/curve/radiusCurve.test.ts
 */
export function radiusCurve(solve: RadiusSolver, range: MassRange, { tolerance = 1e-6 } = {}): MeasuredCurve {
  const logRadii = rememberingSolver(solve);
  let x = firstNodes(logRadii, Math.log(range.lightest), Math.log(range.heaviest));
  for (;;) {
    const curve = new LocalCubic(x, logRadii(x) as number[]);
    const tested = betweenNodes(x, 0.5).filter((_, i) => x[i + 1] - x[i] > CLOSEST_SPACING);
    const solved = logRadii(tested);
    const missed = tested.filter((m, i) => !(Math.abs(curve.value(m) - (solved[i] ?? Number.NaN)) <= tolerance / 2));
    if (missed.length === 0) return finishedCurve(x, logRadii, tolerance);
    x = [...x, ...missed].sort((a, b) => a - b);
    const hole = logRadii(x).indexOf(undefined);
    if (hole >= 0) x = firstNodes(logRadii, x[0], x[hole - 1]);
  }
}

type LogRadii = (logMasses: readonly number[]) => (number | undefined)[];

/** Solves in ln M and ln R, each mass once. */
function rememberingSolver(solve: RadiusSolver): LogRadii {
  const known = new Map<number, number | undefined>();
  return (logMasses) => {
    const unknown = logMasses.filter((x) => !known.has(x));
    const radii = solve(unknown.map(Math.exp));
    unknown.forEach((x, i) => {
      const radius = radii[i];
      known.set(x, radius === undefined ? undefined : Math.log(radius));
    });
    return logMasses.map((x) => known.get(x));
  };
}

function firstNodes(logRadii: LogRadii, from: number, to: number): number[] {
  const intervals = Math.max(3, Math.ceil((to - from) / FIRST_SPACING));
  const x = Array.from({ length: intervals + 1 }, (_, i) => from + ((to - from) * i) / intervals);
  const missing = logRadii(x).indexOf(undefined);
  if (missing < 0) return x;
  if (missing > 0) return firstNodes(logRadii, from, lastSolvable(logRadii, x[missing - 1], x[missing]));
  throw new ConvergenceError(
    "curve-empty",
    `The lightest planet asked for, ${Math.exp(from)} kg, cannot be solved. Ask for heavier planets.`,
  );
}

function lastSolvable(logRadii: LogRadii, solvable: number, unsolvable: number): number {
  if (unsolvable - solvable < END_GAP) return solvable;
  const middle = (solvable + unsolvable) / 2;
  return logRadii([middle])[0] === undefined
    ? lastSolvable(logRadii, solvable, middle)
    : lastSolvable(logRadii, middle, unsolvable);
}

function betweenNodes(x: readonly number[], at: number): number[] {
  return x.slice(1).map((next, i) => x[i] + at * (next - x[i]));
}

function finishedCurve(x: readonly number[], logRadii: LogRadii, tolerance: number): MeasuredCurve {
  const logRadius = new LocalCubic(x, logRadii(x) as number[]);
  const tested = betweenNodes(x, MEASURED_AT);
  const solved = logRadii(tested);
  const errors = tested.map((m, i) => Math.abs(Math.expm1(logRadius.value(m) - (solved[i] ?? Number.NaN))));
  // Up to its maximum mass a radius plunges ever more steeply: a last stretch that cannot be interpolated is left out.
  if (x.length > 4 && !(errors[errors.length - 1] <= tolerance))
    return finishedCurve(x.slice(0, -1), logRadii, tolerance);
  return Object.assign(new InterpolatedCurve(logRadius), { relativeError: Math.max(...errors), nodeCount: x.length });
}

/** A curve from an interpolant of ln R over ln M. */
export class InterpolatedCurve implements RadiusCurve {
  readonly lightest: number;
  readonly heaviest: number;
  private readonly logRadius: Interpolant;
  /** ln M of the node up to which ln R rises; found when first needed. */
  private top?: number;

  constructor(logRadius: Interpolant) {
    const { nodes } = logRadius;
    this.lightest = Math.exp(nodes[0]);
    this.heaviest = Math.exp(nodes[nodes.length - 1]);
    this.logRadius = logRadius;
  }

  radius(mass: number): number {
    if (!(mass >= this.lightest * (1 - ROUND_OFF) && mass <= this.heaviest * (1 + ROUND_OFF)))
      throw massOutOfRange(mass, this);
    return Math.exp(this.logRadius.value(Math.log(mass)));
  }

  massWithRadius(radius: number): number | undefined {
    const wanted = Math.log(radius);
    this.top ??= endOfRise(this.logRadius);
    let low = this.logRadius.nodes[0];
    let high = this.top;
    if (!(wanted >= this.logRadius.value(low) && wanted <= this.logRadius.value(high))) return undefined;
    for (let step = 0; step < HALVINGS; step++) {
      const middle = (low + high) / 2;
      if (this.logRadius.value(middle) < wanted) low = middle;
      else high = middle;
    }
    return Math.exp((low + high) / 2);
  }
}

function endOfRise(logRadius: Interpolant): number {
  const { nodes } = logRadius;
  let i = 0;
  while (i + 1 < nodes.length && logRadius.value(nodes[i + 1]) > logRadius.value(nodes[i])) i++;
  return nodes[i];
}

function massOutOfRange(mass: number, { lightest, heaviest }: MassRange): ModelRangeError {
  return new ModelRangeError(
    "curve-mass-range",
    `A mass of ${mass} kg is outside the curve, which runs from ${lightest} to ${heaviest} kg.`,
    { quantity: "mass", value: mass, minimum: lightest, maximum: heaviest },
  );
}
