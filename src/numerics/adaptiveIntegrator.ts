import { type RightHandSide, RungeKutta8 } from "./rungeKutta8.ts";

/**
 * How an advance ended. `arrived` and `event` are success; `stuck` means the step size vanished, as it does where the
 * right-hand side leaves its domain before the end.
 */
export type AdvanceStatus = "arrived" | "event" | "stuck";

/** Stop where a component, falling with the direction of travel, reaches `value`. */
export interface FallingEvent {
  readonly component: number;
  readonly value: number;
}

/** Bounds on how fast a step may shrink or grow, and how much of the allowed error to aim for: common practice. */
const SHRINK = 0.2;
const GROW = 6;
const SAFETY = 0.9;
const SMALLEST_STEP = 1e-12;
const MAX_STEPS = 10_000;
const MAX_EVENT_ITERATIONS = 30;

/**
 * Adaptive integration with a state that outlives a single stretch: advance, change the right-hand side or the state
 * at a boundary, advance again. No physics, no units.
 * Checked closed forms, event location, failure modes: test/numerics/adaptiveIntegrator.test.ts
 */
export class AdaptiveIntegrator {
  /** Independent variable and state; may be rewritten between advances. */
  x = 0;
  readonly y: Float64Array;
  /** Step to try next, signed; 0 lets the next advance choose. */
  nextStep = 0;
  /** Allowed estimated relative error of one step. */
  tolerance = 1e-9;
  /** Sum of the estimated relative errors of all accepted steps since last reset by the caller. */
  errorSum = 0;
  private readonly stepper: RungeKutta8;
  private readonly trial: Float64Array;
  private readonly slope: Float64Array;

  constructor(dimension: number, controlled: number) {
    this.stepper = new RungeKutta8(dimension, controlled);
    this.y = new Float64Array(dimension);
    this.trial = new Float64Array(dimension);
    this.slope = new Float64Array(dimension);
  }

  get evaluations(): number {
    return this.stepper.evaluations;
  }

  /**
   * Integrates to `end`, or to the event if that comes first.
   * `onStep` sees every accepted point (not the start).
   */
  advance(f: RightHandSide, end: number, event?: FallingEvent, onStep?: () => void): AdvanceStatus {
    const span = end - this.x;
    if (span === 0) return "arrived";
    let h = this.nextStep === 0 ? span / 6 : this.nextStep;
    for (let steps = 0; steps < MAX_STEPS; steps++) {
      const remaining = end - this.x;
      const last = Math.abs(h) >= Math.abs(remaining) * (1 - 1e-10);
      if (last) h = remaining;
      const error = this.stepper.step(f, this.x, this.y, h, this.trial);
      if (!(error <= this.tolerance)) {
        h *= error > 0 ? Math.max(SHRINK, SAFETY * (this.tolerance / error) ** 0.125) : SHRINK;
        if (!(Math.abs(h) > SMALLEST_STEP * Math.abs(span))) return "stuck";
        continue;
      }
      if (event !== undefined && this.trial[event.component] < event.value) {
        return this.landOn(event, f, h, onStep);
      }
      this.accept(last ? end : this.x + h, error, onStep);
      const grown = h * (error === 0 ? GROW : Math.min(GROW, SAFETY * (this.tolerance / error) ** 0.125));
      // A last step cut short says little about the step the next stretch can take: never let it shrink the memory.
      this.nextStep = last && Math.abs(grown) < Math.abs(this.nextStep) ? this.nextStep : grown;
      if (last) return "arrived";
      h = grown;
    }
    return "stuck";
  }

  private accept(x: number, error: number, onStep?: () => void): void {
    this.x = x;
    this.y.set(this.trial);
    this.errorSum += error;
    onStep?.();
  }

  /**
   * Newton iteration on the length of the step itself, so that the event point has the full order of the method.
   * `h` is a step that overshoots; the step lengths 0 and h bracket the root.
   */
  private landOn(event: FallingEvent, f: RightHandSide, h: number, onStep?: () => void): AdvanceStatus {
    let short = 0;
    let long = h;
    let error = 0;
    for (let i = 0; i < MAX_EVENT_ITERATIONS; i++) {
      const overshoot = this.trial[event.component] - event.value;
      if (Math.abs(overshoot) <= 4e-16 * Math.abs(event.value)) break;
      if (overshoot < 0) long = h;
      else short = h;
      f(this.x + h, this.trial, this.slope);
      const newton = h - overshoot / this.slope[event.component];
      const inside = (newton - short) * (newton - long) < 0;
      const next = inside ? newton : (short + long) / 2;
      if (next === h) break;
      h = next;
      error = this.stepper.step(f, this.x, this.y, h, this.trial);
    }
    this.accept(this.x + h, error, onStep);
    return "event";
  }
}
