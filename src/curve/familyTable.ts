import { InputError } from "../errors.ts";
import { EquidistantNodes, quinticWeights } from "../numerics/equidistantNodes.ts";
import { InterpolatedCurve, type MassRange, type RadiusCurve } from "./radiusCurve.ts";
import { anglesOf } from "./simplexAngles.ts";

/** ln R at the nodes of a family's lattice: all that was solved, in plain numbers, so that it can be kept on disk. */
export interface FamilyLattice {
  readonly componentCount: number;
  /** Intervals along each of the angles of `fractionsAt`. */
  readonly angleSteps: number;
  /** ln of the lightest mass [kg], and the distance of the masses in the logarithm. */
  readonly logMassFrom: number;
  readonly logMassStep: number;
  readonly massCount: number;
  /** The masses of one composition after those of another; of the angles the last moves fastest. */
  readonly logRadii: Float64Array;
}

/** How far interpolated radii are off, relative, at planets solved between the nodes. */
export interface MeasuredError {
  readonly largest: number;
  readonly rootMeanSquare: number;
  readonly median: number;
  readonly tested: number;
  /** Where the largest was found. */
  readonly worst: { readonly mass: number; readonly fractions: readonly number[] };
}

/** Planets of every mass and all mass fractions of the components of a family. */
export interface CompositionTable extends MassRange {
  readonly componentCount: number;
  /** The curve of one member, at least over the masses of `within`. Throws InputError `fractions`. */
  member(fractions: ArrayLike<number>, within?: MassRange): RadiusCurve;
}

const WIDTH = 6;
const SUM_TOLERANCE = 1e-9;

/**
 * R(M, fractions) between the nodes of a lattice: quintics in ln R over ln M and each angle. A member's curve costs
 * about a microsecond.
 * Checked test/curve/familyTable.test.ts
 */
export class FamilyTable implements CompositionTable {
  readonly lightest: number;
  readonly heaviest: number;
  readonly componentCount: number;
  private readonly lattice: FamilyLattice;
  private readonly angles: Float64Array;
  private readonly weights = new Float64Array(WIDTH);
  /** Compositions that a member is interpolated from, by the place of their first mass, and their weights. */
  private places: Int32Array;
  private shares: Float64Array;

  constructor(lattice: FamilyLattice) {
    this.lattice = lattice;
    this.componentCount = lattice.componentCount;
    this.lightest = Math.exp(lattice.logMassFrom);
    this.heaviest = Math.exp(lattice.logMassFrom + (lattice.massCount - 1) * lattice.logMassStep);
    this.angles = new Float64Array(lattice.componentCount - 1);
    this.places = new Int32Array(WIDTH ** this.angles.length);
    this.shares = new Float64Array(WIDTH ** this.angles.length);
  }

  member(fractions: ArrayLike<number>, within: MassRange = this): RadiusCurve {
    checkFractions(fractions, this.componentCount);
    const { logMassFrom, logMassStep, massCount, logRadii } = this.lattice;
    const last = Math.ceil((Math.log(within.heaviest) - logMassFrom) / logMassStep) + WIDTH / 2 - 1;
    const first = Math.floor((Math.log(within.lightest) - logMassFrom) / logMassStep) - (WIDTH / 2 - 1);
    const to = Math.min(massCount - 1, Math.max(last, first + WIDTH - 1, WIDTH - 1));
    const from = Math.max(0, Math.min(first, to - WIDTH + 1));
    const terms = this.gather(fractions);
    const values = new Float64Array(to - from + 1);
    for (let n = 0; n < terms; n++) {
      const place = this.places[n] + from;
      const share = this.shares[n];
      for (let i = 0; i < values.length; i++) values[i] += share * logRadii[place + i];
    }
    return new InterpolatedCurve(new EquidistantNodes(logMassFrom + from * logMassStep, logMassStep, values));
  }

  /** Fills `places` and `shares`; returns how many there are. */
  private gather(fractions: ArrayLike<number>): number {
    const { angleSteps, massCount } = this.lattice;
    anglesOf(fractions, this.angles);
    this.places[0] = 0;
    this.shares[0] = 1;
    let count = 1;
    for (const angle of this.angles) {
      const t = angle * angleSteps;
      const start = Math.floor(t) - (WIDTH / 2 - 1);
      quinticWeights(t - start, this.weights);
      count = this.spread(count, start, angleSteps);
    }
    for (let n = 0; n < count; n++) this.places[n] *= massCount;
    return count;
  }

  /** Replaces each of the compositions so far by those of one more angle; in place, from the last on. */
  private spread(count: number, start: number, angleSteps: number): number {
    let used = 0;
    for (let k = 0; k < WIDTH; k++) if (this.weights[k] !== 0) used += 1;
    for (let n = count - 1; n >= 0; n--) {
      const place = this.places[n] * (angleSteps + 1);
      const share = this.shares[n];
      let at = n * used + used;
      for (let k = WIDTH - 1; k >= 0; k--) {
        if (this.weights[k] === 0) continue;
        at -= 1;
        this.places[at] = place + mirrored(start + k, angleSteps);
        this.shares[at] = share * this.weights[k];
      }
    }
    return count * used;
  }
}

/** The node within 0…last that equals this one by the evenness about both ends. */
function mirrored(node: number, last: number): number {
  const positive = Math.abs(node);
  return positive <= last ? positive : 2 * last - positive;
}

function checkFractions(fractions: ArrayLike<number>, count: number): void {
  let sum = 0;
  let positive = fractions.length === count;
  for (let k = 0; k < fractions.length; k++) {
    sum += fractions[k];
    if (!(fractions[k] >= 0)) positive = false;
  }
  if (positive && Math.abs(sum - 1) <= SUM_TOLERANCE) return;
  throw new InputError(
    "fractions",
    `Mass fractions ${Array.from(fractions).join(", ")}: ${count} of 0 or more that sum to 1 are needed.`,
  );
}
