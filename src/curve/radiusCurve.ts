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
  /** Largest relative error of the radius at planets solved between the nodes, none of which shaped the curve. */
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

interface Interpolant {
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
    if (missed.length === 0) return finishedCurve(x, curve, logRadii, tolerance);
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
  throw new ConvergenceError("curve-empty", `The lightest planet asked for, ${Math.exp(from)} kg, cannot be solved`);
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

function finishedCurve(
  x: readonly number[],
  logRadius: LocalCubic,
  logRadii: LogRadii,
  tolerance: number,
): MeasuredCurve {
  const tested = betweenNodes(x, MEASURED_AT);
  const solved = logRadii(tested);
  const errors = tested.map((m, i) => Math.abs(Math.expm1(logRadius.value(m) - (solved[i] ?? Number.NaN))));
  // Up to its maximum mass a radius plunges ever more steeply: the last stretch that cannot be interpolated is left out.
  let last = x.length - 1;
  while (last > 1 && !(errors[last - 1] <= tolerance)) last--;
  const curve = new InterpolatedCurve(logRadius, x.slice(0, last + 1));
  return Object.assign(curve, { relativeError: Math.max(...errors.slice(0, last)), nodeCount: last + 1 });
}

/** A curve from an interpolant of ln R over ln M and its nodes; radius rises with mass up to the first node where it falls. */
export class InterpolatedCurve implements RadiusCurve {
  readonly lightest: number;
  readonly heaviest: number;
  private readonly logRadius: Interpolant;
  private readonly from: number;
  /** ln M of the node up to which ln R rises. */
  private readonly top: number;

  constructor(logRadius: Interpolant, x: ArrayLike<number>) {
    this.from = x[0];
    this.lightest = Math.exp(x[0]);
    this.heaviest = Math.exp(x[x.length - 1]);
    this.logRadius = logRadius;
    this.top = x[0];
    let largest = logRadius.value(x[0]);
    for (let i = 1; i < x.length && logRadius.value(x[i]) > largest; i++) {
      this.top = x[i];
      largest = logRadius.value(x[i]);
    }
  }

  radius(mass: number): number {
    if (!(mass >= this.lightest && mass <= this.heaviest)) throw massOutOfRange(mass, this);
    return Math.exp(this.logRadius.value(Math.log(mass)));
  }

  massWithRadius(radius: number): number | undefined {
    const wanted = Math.log(radius);
    let low = this.from;
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

function massOutOfRange(mass: number, { lightest, heaviest }: MassRange): ModelRangeError {
  return new ModelRangeError(
    "curve-mass-range",
    `A mass of ${mass} kg is outside the curve, which runs from ${lightest} to ${heaviest} kg.`,
    { quantity: "mass", value: mass, minimum: lightest, maximum: heaviest },
  );
}
