import type { Composition } from "../library/composition.ts";
import { RungeKutta8 } from "../numerics/rungeKutta8.ts";
import { G } from "../units/constants.ts";
import { CentralBall } from "./centralBall.ts";
import type { Planet } from "./planet.ts";
import { planetSolver } from "./planetSolver.ts";
import { CONTROLLED, STATE_SIZE, StructureEquations } from "./structureEquations.ts";
import { DEFAULT_TOLERANCE } from "./structureSolver.ts";
import { type Stretch, TrialIntegration } from "./trialIntegration.ts";

/** A place inside a planet. SI. */
export interface ProfilePoint {
  readonly radius: number;
  readonly enclosedMass: number;
  readonly pressure: number;
  readonly density: number;
  readonly gravity: number;
  /** Absent where the equation of state follows no temperature. */
  readonly temperature?: number;
  readonly layer: string;
  readonly phase: string;
}

/** A point the integration passed through: its state, and the equations it was in. */
interface Waypoint {
  readonly x: number;
  readonly state: Float64Array;
  readonly stretch: Stretch;
  readonly byMass: boolean;
}

const LANDING_ROUNDS = 20;
const LANDED = 1e-14;

/**
 * The interior of a planet of `mass` [kg]: `count` points evenly spaced in radius from the centre to the surface, and
 * both sides of every layer and phase boundary; with a gas envelope they end where the gas begins. Points between the
 * integrator's own steps are integrated, not interpolated, so they are as good as the rest.
 * Throws as StructureSolver.solve
 * Checked hydrostatic balance by differences, both sides of boundaries, mass and radius: test/interior/profile.test.ts
 */
export function solveProfile(
  composition: Composition,
  mass: number,
  count: number,
): { planet: Planet; points: ProfilePoint[] } {
  const planet = planetSolver(composition).solve(mass);
  return { planet, points: profileOf(planet, count) };
}

/** As `solveProfile`, of a planet already solved. */
export function profileOf(whole: Planet, count: number): ProfilePoint[] {
  const planet = whole.envelope?.core ?? whole;
  const waypoints = record(planet.composition, planet.mass, planet.centralPressure);
  const radii = Array.from({ length: count }, (_, i) => (planet.radius * i) / (count - 1));
  const sampler = new Sampler(planet.composition, planet.centralPressure);
  const points: ProfilePoint[] = [sampler.centre(waypoints[0].stretch)];
  let next = 1;
  for (; next < count - 1 && radii[next] < radiusOf(waypoints[0]); next++) {
    points.push(sampler.insideBall(waypoints[0].stretch, radii[next]));
  }
  for (let i = 1; i < waypoints.length; i++) {
    const from = waypoints[i - 1];
    const to = waypoints[i];
    if (from.stretch.phase !== to.stretch.phase || from.stretch.layer !== to.stretch.layer) {
      points.push(sampler.at(from), sampler.at(to));
      continue;
    }
    for (; next < count - 1 && radii[next] <= radiusOf(to); next++) points.push(sampler.between(from, to, radii[next]));
  }
  points.push(sampler.at(waypoints[waypoints.length - 1]));
  return points;
}

/** All points the integration with this central pressure passes through. */
function record(composition: Composition, mass: number, centralPressure: number): Waypoint[] {
  const trial = new TrialIntegration(composition);
  trial.integrator.tolerance = DEFAULT_TOLERANCE;
  const waypoints: Waypoint[] = [];
  trial.onPoint = (stretch, byMass) => {
    waypoints.push({ x: trial.integrator.x, state: trial.integrator.y.slice(), stretch, byMass });
  };
  trial.run(mass, centralPressure);
  return waypoints;
}

/** The slot of r² in a state, see structureEquations.ts. */
function squaredRadiusSlot(byMass: boolean): number {
  return byMass ? 0 : 1;
}

function radiusOf({ state, byMass }: Waypoint): number {
  return Math.sqrt(state[squaredRadiusSlot(byMass)]);
}

/** Turns waypoints, and radii between them, into profile points. */
class Sampler {
  private readonly equations: StructureEquations;
  private readonly stepper = new RungeKutta8(STATE_SIZE, CONTROLLED);
  private readonly state = new Float64Array(STATE_SIZE);
  private readonly slope = new Float64Array(STATE_SIZE);
  private readonly centralPressure: number;

  constructor(composition: Composition, centralPressure: number) {
    this.equations = new StructureEquations(composition.layers[0].material.phases[0].curve);
    this.centralPressure = centralPressure;
  }

  at({ x, state, stretch, byMass }: Waypoint): ProfilePoint {
    const y = byMass ? state[1] : x;
    return point(stretch, byMass ? x : state[0], state[byMass ? 0 : 1], stretch.phase.curve.pressure(y), y);
  }

  centre(stretch: Stretch): ProfilePoint {
    return point(stretch, 0, 0, this.centralPressure, stretch.phase.curve.coordinate(this.centralPressure));
  }

  /** A point nearer to the centre than the integration itself begins: a ball that ends there. */
  insideBall(stretch: Stretch, radius: number): ProfilePoint {
    const ball = new CentralBall();
    const { curve, fromPressure } = stretch.phase;
    let s = Number.MIN_VALUE;
    let target = Number.POSITIVE_INFINITY;
    for (let round = 0; round < LANDING_ROUNDS; round++) {
      s = ball.fill(curve, this.centralPressure, fromPressure, target, this.state);
      const miss = radius ** 2 / this.state[0];
      if (Math.abs(miss - 1) < LANDED) break;
      target = s * miss;
    }
    return point(stretch, s, this.state[0], curve.pressure(this.state[1]), this.state[1]);
  }

  /** The point at `radius` inside the step from one waypoint to the next: Newton on the length of a part step. */
  between(from: Waypoint, to: Waypoint, radius: number): ProfilePoint {
    const { equations, stepper, state, slope } = this;
    equations.curve = from.stretch.phase.curve;
    const f = from.byMass ? equations.byMass : equations.byCoordinate;
    const slot = squaredRadiusSlot(from.byMass);
    const target = radius * radius;
    const share = (target - from.state[slot]) / (to.state[slot] - from.state[slot]);
    let h = share * (to.x - from.x);
    for (let round = 0; round < LANDING_ROUNDS; round++) {
      stepper.step(f, from.x, from.state, h, state);
      const miss = state[slot] - target;
      if (Math.abs(miss) < LANDED * target) break;
      f(from.x + h, state, slope);
      h -= miss / slope[slot];
    }
    return this.at({ ...from, x: from.x + h, state });
  }
}

function point({ layer, phase }: Stretch, s: number, v: number, pressure: number, y: number): ProfilePoint {
  const temperature = phase.curve.temperature?.(y);
  return {
    radius: Math.sqrt(v),
    enclosedMass: s ** 1.5,
    pressure,
    density: phase.curve.density(y),
    ...(temperature !== undefined && { temperature }),
    gravity: s === 0 ? 0 : (G * s ** 1.5) / v,
    layer: layer.name,
    phase: phase.name,
  };
}
