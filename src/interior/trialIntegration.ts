import { type Phase, phaseAt } from "../eos/material.ts";
import type { Composition, Layer } from "../library/composition.ts";
import { AdaptiveIntegrator } from "../numerics/adaptiveIntegrator.ts";
import { CentralBall } from "./centralBall.ts";
import type { Boundary } from "./planet.ts";
import { CONTROLLED, STATE_SIZE, StructureEquations } from "./structureEquations.ts";

/** What one integration from the centre with a trial central pressure found. */
export type TrialOutcome =
  /** The surface pressure was reached in the outermost layer. */
  | "surface"
  /** The pressure ran out before the outermost layer began: the central pressure is too low for this mass. */
  | "exhausted"
  /** The central pressure, or that at a layer boundary, is beyond what the form of a phase can describe. */
  | "beyond-form"
  /** The integrator gave up. */
  | "stuck";

/** Names of what was integrated through, innermost first, for boundaries and profiles. */
export interface Stretch {
  readonly layer: Layer;
  readonly phase: Phase;
}

/**
 * Integrates planets of one composition outwards from trial central pressures. Keeps its work space, so one object
 * serves a whole sweep. Results of the last run stand in its fields.
 */
export class TrialIntegration {
  readonly composition: Composition;
  readonly integrator = new AdaptiveIntegrator(STATE_SIZE, CONTROLLED);
  readonly equations: StructureEquations;
  private readonly centralBall = new CentralBall();
  private readonly layers: readonly Layer[];

  outcome: TrialOutcome = "stuck";
  /** ln(mass inside the surface pressure / mass asked for), and its derivative by ln P_c. */
  logMassExcess = 0;
  logMassExcessSlope = 0;
  /** r² at the surface and its derivative by ln P_c, moment of inertia, gravitational energy (positive). SI. */
  radiusSquared = 0;
  radiusSquaredSlope = 0;
  inertia = 0;
  bindingEnergy = 0;
  boundaries: Boundary[] = [];
  /** Layers that went beyond the data behind their equation of state. */
  extrapolated: string[] = [];
  /** The phase whose form gave out in the last `beyond-form` run; for the caller to reset. */
  brokenPhase: Stretch | undefined;
  runs = 0;

  /** Evaluations of the equation of state so far: one each right-hand side, and those at the centre. */
  get evaluations(): number {
    return this.integrator.evaluations + this.centralBall.evaluations;
  }

  /** Called after every accepted step, and at both sides of every boundary, while set. */
  onPoint: ((stretch: Stretch, byMass: boolean) => void) | undefined;

  constructor(composition: Composition) {
    this.composition = composition;
    this.layers = composition.layers;
    this.equations = new StructureEquations(this.layers[0].material.phases[0].curve);
  }

  run(mass: number, centralPressure: number): TrialOutcome {
    this.outcome = this.integrate(mass, centralPressure);
    return this.outcome;
  }

  private integrate(mass: number, centralPressure: number): TrialOutcome {
    const { integrator, layers } = this;
    this.runs++;
    this.boundaries = [];
    this.extrapolated = [];
    integrator.nextStep = 0;
    integrator.errorSum = 0;
    const first = this.enter(layers[0], centralPressure);
    if (first === undefined) return "beyond-form";
    const total = mass ** (2 / 3);
    if (!this.leaveCentre(first, centralPressure, (layers[0].massFraction * mass) ** (2 / 3))) return "stuck";
    let enclosed = 0;
    let stretch: Stretch = first;
    for (let i = 0; i < layers.length - 1; i++) {
      enclosed += layers[i].massFraction;
      const end = this.crossByMass(stretch, (enclosed * mass) ** (2 / 3));
      if (typeof end === "string") return end;
      const pressure = this.pressure();
      this.mark("layer", end, pressure);
      const next = this.enter(layers[i + 1], pressure);
      if (next === undefined) return "beyond-form";
      this.equations.enterCurve(next.phase.curve, pressure, integrator.x, integrator.y, "layer");
      this.onPoint?.(next, true);
      stretch = next;
    }
    return this.riseToSurface(stretch, total);
  }

  private leaveCentre(first: Stretch, centralPressure: number, layerEnd: number): boolean {
    const { integrator, equations } = this;
    const floor = Math.max(first.phase.fromPressure, this.composition.surface.pressurePa);
    equations.curve = first.phase.curve;
    integrator.x = this.centralBall.fill(equations.curve, centralPressure, floor, layerEnd, integrator.y);
    if (!(integrator.x > 0)) return false;
    this.onPoint?.(first, true);
    return true;
  }

  /** Pressure at the integrator's present by-mass point [Pa]. */
  private pressure(): number {
    return this.equations.curve.pressure(this.integrator.y[1]);
  }

  /** The phase of `layer` at `pressure`, or undefined where its form does not reach that far. */
  private enter(layer: Layer, pressure: number): Stretch | undefined {
    const stretch = { layer, phase: phaseAt(layer.material, pressure) };
    if (pressure > stretch.phase.curve.maxPressure) {
      this.brokenPhase = stretch;
      return undefined;
    }
    this.noteExtrapolation(stretch, pressure);
    return stretch;
  }

  private noteExtrapolation({ layer, phase }: Stretch, pressure: number): void {
    if (pressure > phase.calibratedTo && !this.extrapolated.includes(layer.name)) this.extrapolated.push(layer.name);
  }

  /** Integrates by mass up to s, through phase boundaries; returns the stretch it ends in. */
  private crossByMass(start: Stretch, s: number): Stretch | TrialOutcome {
    const { integrator, equations } = this;
    let stretch = start;
    for (;;) {
      const floor = Math.max(stretch.phase.fromPressure, this.composition.surface.pressurePa);
      const event = { component: 1, value: stretch.phase.curve.coordinate(floor) };
      const here = stretch;
      const status = integrator.advance(equations.byMass, s, event, this.onPoint && (() => this.onPoint?.(here, true)));
      if (status === "arrived") return stretch;
      if (status === "stuck") return "exhausted";
      if (floor !== stretch.phase.fromPressure || floor === 0) return "exhausted";
      this.mark("phase", stretch, floor);
      stretch = this.below(stretch);
      equations.enterCurve(stretch.phase.curve, floor, integrator.x, integrator.y, "phase");
      this.onPoint?.(stretch, true);
    }
  }

  /** Integrates the outermost layer by the coordinate of its equation of state, down to the surface pressure. */
  private riseToSurface(start: Stretch, totalS: number): TrialOutcome {
    const { integrator, equations } = this;
    const { y: state } = integrator;
    const surfacePressure = this.composition.surface.pressurePa;
    let stretch = start;
    integrator.x = equations.massToCoordinate(integrator.x, state);
    this.onPoint?.(start, false);
    for (;;) {
      const floor = Math.max(stretch.phase.fromPressure, surfacePressure);
      const end = stretch.phase.curve.coordinate(floor);
      if (end > integrator.x) return "exhausted";
      const here = stretch;
      integrator.nextStep = 0;
      const status = integrator.advance(
        equations.byCoordinate,
        end,
        undefined,
        this.onPoint && (() => this.onPoint?.(here, false)),
      );
      if (status === "stuck") return "stuck";
      if (floor === surfacePressure) break;
      this.boundary("phase", stretch, state[0] ** 1.5, state[1], floor);
      stretch = this.below(stretch);
      equations.curve = stretch.phase.curve;
      integrator.x = equations.curve.coordinate(floor);
      this.onPoint?.(stretch, false);
    }
    this.boundary("surface", stretch, state[0] ** 1.5, state[1], surfacePressure);
    this.logMassExcess = 1.5 * Math.log(state[0] / totalS);
    this.logMassExcessSlope = (1.5 * state[4]) / state[0];
    this.radiusSquared = state[1];
    this.radiusSquaredSlope = state[5];
    this.inertia = state[2];
    this.bindingEnergy = state[3];
    return "surface";
  }

  /** The next phase outwards in the same layer. */
  private below({ layer, phase }: Stretch): Stretch {
    const { phases } = layer.material;
    const stretch = { layer, phase: phases[phases.indexOf(phase) - 1] };
    this.noteExtrapolation(stretch, phase.fromPressure);
    return stretch;
  }

  private mark(kind: Boundary["kind"], stretch: Stretch, pressure: number): void {
    this.boundary(kind, stretch, this.integrator.x ** 1.5, this.integrator.y[0], pressure);
  }

  private boundary(kind: Boundary["kind"], at: Stretch, mass: number, radiusSquared: number, pressure: number): void {
    const { name, curve } = at.phase;
    const temperature = curve.temperature?.(curve.coordinate(pressure));
    this.boundaries.push({
      kind,
      layer: at.layer.name,
      phase: name,
      enclosedMass: mass,
      radius: Math.sqrt(radiusSquared),
      pressure,
      ...(temperature !== undefined && { temperature }),
    });
  }
}
