import { ConvergenceError } from "../errors.ts";
import type { Composition } from "../library/composition.ts";
import { G } from "../units/constants.ts";
import type { Planet, SolidPlanet } from "./planet.ts";
import { DEFAULT_TOLERANCE, StructureSolver } from "./structureSolver.ts";
import { WarmLayers } from "./warmLayers.ts";
import { warmNotes } from "./warmNotes.ts";

const MAX_ROUNDS = 40;
/** Relative change of the boundary pressures that ends the iteration, over the tolerance of an integration step. */
const SETTLED = 100;
/** Share of such a change that reaches the radius, at most: thermal expansion is a few percent in all. */
const EXPANSION = 0.03;
/** Steps across the kinks of a table of temperatures are better judged than they are: by a factor of 1.7 measured. */
const KINKED = 3;
/** Once boundary pressures move by less than this, the next round is worth the full accuracy. */
const NEARLY_SETTLED = 1e-4;
/** Until then a structure as good as this share of their last move is enough, and never worse than the coarsest. */
const WORTH = 1e-3;
const COARSEST = 1e-4;
/** A steeper answer than this is no answer to extrapolate by. */
const STEEPEST = 0.5;
/** Density of the uniform sphere that gives the first guess of the boundary pressures [kg m^-3]. */
const GUESS_DENSITY = 6000;

/** Pressures assumed and found at the tops of the inner layers, centre to surface. */
interface Round {
  readonly tops: readonly number[];
  readonly found: readonly number[];
  readonly centralPressure: number;
}

/**
 * Planets of a composition with temperature. Temperature comes from the surface down, structure from the centre up;
 * they meet in the pressures at which the inner layers begin. Each round builds the layers for assumed pressures,
 * solves the structure with them and finds others; thermal expansion being small, these answer weakly to those assumed,
 * by a sixth where a core freezes inside, and the secant through two rounds tells where both agree.
 * Checked test/interior/warmSolver.test.ts
 */
export class WarmSolver {
  readonly composition: Composition;
  private readonly layers: WarmLayers;
  private readonly tolerance: number;
  private readonly hasKinks: boolean;
  /** Where the inner layers of the last planet begin, over the scale of its mass, to start the next one from. */
  private shares: readonly number[] | undefined;

  constructor(composition: Composition, options: { tolerance?: number } = {}) {
    this.composition = composition;
    this.layers = new WarmLayers(composition);
    this.tolerance = options.tolerance ?? DEFAULT_TOLERANCE;
    this.hasKinks = composition.temperature?.mode.kind === "table";
  }

  /** As StructureSolver.solve; the planet's composition holds the curves that its temperatures led to. */
  solve(mass: number, guess?: number): SolidPlanet {
    let tops = this.firstTops(mass);
    let last: Round | undefined;
    let centralPressure = guess;
    let tolerance = tops.length > 0 ? COARSEST : this.tolerance;
    const counters = { integrations: 0, rightHandSides: 0 };
    for (let round = 0; round < MAX_ROUNDS; round++) {
      const planet = new StructureSolver(this.layers.resolve(tops), { tolerance }).solve(mass, centralPressure);
      counters.integrations += planet.counters.integrations;
      counters.rightHandSides += planet.counters.rightHandSides;
      const here: Round = { tops, found: innerTops(planet), centralPressure: planet.centralPressure };
      const change = Math.max(0, ...here.found.map((pressure, i) => Math.abs(pressure / tops[i] - 1)));
      if (change <= SETTLED * this.tolerance && tolerance === this.tolerance) {
        this.shares = here.found.map((pressure) => pressure / pressureScale(mass));
        return this.settled(planet, counters, change);
      }
      const enough = change > NEARLY_SETTLED ? Math.min(WORTH * change, COARSEST) : this.tolerance;
      tolerance = Math.max(enough, this.tolerance);
      tops = nextTops(here, last);
      centralPressure = nextCentralPressure(tops, here, last);
      last = here;
    }
    throw new ConvergenceError(
      "warm-structure-not-converged",
      `The layer temperatures of ${this.composition.name} at ${mass} kg did not settle in ${MAX_ROUNDS} rounds.`,
      { centralPressure },
    );
  }

  private settled(planet: SolidPlanet, counters: Planet["counters"], change: number): SolidPlanet {
    const integrationError = planet.radiusRelativeError * (this.hasKinks ? KINKED : 1);
    const radiusRelativeError = integrationError + EXPANSION * change;
    return { ...planet, counters, radiusRelativeError, notes: warmNotes(planet) };
  }

  /** From the last planet, or from a uniform sphere, where P = P_c (1 - q^(2/3)) at enclosed mass fraction q. */
  private firstTops(mass: number): number[] {
    const scale = pressureScale(mass);
    if (this.shares !== undefined) return this.shares.map((share) => share * scale);
    let enclosed = 0;
    return this.composition.layers.slice(0, -1).map(({ massFraction }) => {
      enclosed += massFraction;
      return scale * (1 - enclosed ** (2 / 3)) + this.composition.surface.pressurePa;
    });
  }
}

/** Central pressure of a uniform sphere [Pa], 3GM²/8πR⁴ (Chandrasekhar 1939, ch. III). */
function pressureScale(mass: number): number {
  const radius = Math.cbrt(mass / ((4 / 3) * Math.PI * GUESS_DENSITY));
  return (3 * G * mass * mass) / (8 * Math.PI * radius ** 4);
}

/** Where the fixed point lies if each pressure found answers to its own assumption alone, as in the last two rounds. */
function nextTops({ tops, found }: Round, last: Round | undefined): number[] {
  return found.map((pressure, i) => {
    const slope = last === undefined ? 0 : (pressure - last.found[i]) / (tops[i] - last.tops[i]);
    return Math.abs(slope) < STEEPEST ? tops[i] + (pressure - tops[i]) / (1 - slope) : pressure;
  });
}

/** Follows the top of the core, on a straight line through the last two rounds. */
function nextCentralPressure([top]: readonly number[], here: Round, last: Round | undefined): number {
  if (last === undefined) return here.centralPressure;
  const share = (top - here.tops[0]) / (here.tops[0] - last.tops[0]);
  return Math.abs(share) < 1
    ? here.centralPressure * (here.centralPressure / last.centralPressure) ** share
    : here.centralPressure;
}

/** Pressures at the tops of all layers but the outermost, centre to surface. */
function innerTops(planet: Planet): number[] {
  return planet.boundaries.filter(({ kind }) => kind === "layer").map(({ pressure }) => pressure);
}
