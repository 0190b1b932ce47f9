import { ConvergenceError } from "../errors.ts";
import type { Composition } from "../library/composition.ts";
import { G } from "../units/constants.ts";
import type { Planet } from "./planet.ts";
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
/** While boundary pressures still move by more than this, a coarse structure is enough. */
const NEARLY_SETTLED = 1e-4;
const COARSE_TOLERANCE = 1e-6;
/** Density of the uniform sphere that gives the first guess of the boundary pressures [kg m^-3]. */
const GUESS_DENSITY = 6000;

/**
 * Planets of a composition with temperature. Temperature comes from the surface down, structure from the centre up;
 * they meet in the pressures at which the inner layers begin. Each round builds the layers for assumed pressures,
 * solves the structure with them and takes over the pressures found; thermal expansion being small, a round gains a
 * factor of 20 or more, and the ratio of the last two rounds tells most of the rest.
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
  solve(mass: number, guess?: number): Planet {
    let tops = this.firstTops(mass);
    let step: readonly number[] = [];
    let centralPressure = guess;
    let coarse = tops.length > 0;
    const counters = { integrations: 0, rightHandSides: 0 };
    for (let round = 0; round < MAX_ROUNDS; round++) {
      const tolerance = coarse ? COARSE_TOLERANCE : this.tolerance;
      const planet = new StructureSolver(this.layers.resolve(tops), { tolerance }).solve(mass, centralPressure);
      counters.integrations += planet.counters.integrations;
      counters.rightHandSides += planet.counters.rightHandSides;
      const found = innerTops(planet);
      const change = Math.max(0, ...found.map((pressure, i) => Math.abs(pressure / tops[i] - 1)));
      if (change <= SETTLED * this.tolerance && !coarse) {
        this.shares = found.map((pressure) => pressure / pressureScale(mass));
        const integrationError = planet.radiusRelativeError * (this.hasKinks ? KINKED : 1);
        return {
          ...planet,
          counters,
          radiusRelativeError: integrationError + EXPANSION * change,
          notes: warmNotes(planet),
        };
      }
      coarse &&= change > NEARLY_SETTLED;
      const lastStep = step;
      step = found.map((pressure, i) => pressure - tops[i]);
      tops = found.map((pressure, i) => pressure + extrapolated(step[i], lastStep[i]));
      centralPressure = planet.centralPressure;
    }
    throw new ConvergenceError(
      "warm-structure-not-converged",
      `The layer temperatures of ${this.composition.name} at ${mass} kg did not settle in ${MAX_ROUNDS} rounds.`,
      { centralPressure },
    );
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

/** What is left to go if steps go on shrinking by the ratio of the last two (Aitken); nothing while they do not. */
function extrapolated(step: number, lastStep: number | undefined): number {
  const ratio = lastStep === undefined || lastStep === 0 ? 0 : step / lastStep;
  return Math.abs(ratio) < 0.3 ? (step * ratio) / (1 - ratio) : 0;
}

/** Pressures at the tops of all layers but the outermost, centre to surface. */
function innerTops(planet: Planet): number[] {
  return planet.boundaries.filter(({ kind }) => kind === "layer").map(({ pressure }) => pressure);
}
