import { InputError } from "../errors.ts";
import { GPA } from "../units/constants.ts";
import { bridge } from "./bridge.ts";
import type { EosCurve } from "./curve.ts";
import { findCrossing } from "./findCrossing.ts";
import type { Material, Phase, Source } from "./material.ts";

/** A phase as its author gives it; where it begins follows from the phase before. */
export interface PhaseSpec {
  readonly name: string;
  readonly form: string;
  /** Or "bridge": a monotone join of the phase before and the one after. */
  readonly curve: EosCurve | "bridge";
  /**
   * Where it ends [Pa], or "crossing": at the lowest pressure beyond `calibratedTo` where its density meets that of the
   * next phase. Infinity for the last.
   */
  readonly until: number | "crossing";
  /** Top of the data behind it [Pa]. Of no account for a bridge, all of which is extrapolation. */
  readonly calibratedTo: number;
  readonly source: Source;
}

/** Two densities that are meant to be equal at a crossing differ by rounding only. */
const CONTINUOUS = 1e-9;

/**
 * Stacks phases by pressure into a material whose density never falls.
 * Throws InputError `phases-never-cross`, `bridge-not-monotone`, `bridge-ends`, `phase-order`, `phase-beyond-form` or
 *        `density-falls`
 * Checked test/eos/phaseStack.test.ts
 */
export function stackPhases(name: string, title: string, specs: readonly PhaseSpec[]): Material {
  const phases: Phase[] = [];
  specs.forEach((spec, i) => {
    try {
      phases.push(placePhase(spec, phases.at(-1), specs[i + 1]));
    } catch (error) {
      if (!(error instanceof InputError)) throw error;
      const { place, found, remedy } = error;
      const message = `phase "${spec.name}": ${error.message}`;
      throw new InputError(error.code, message, { ...place, found, remedy }, { cause: error });
    }
  });
  return { name, title, phases };
}

function placePhase(spec: PhaseSpec, before: Phase | undefined, next: PhaseSpec | undefined): Phase {
  const { name, form, source } = spec;
  if (spec.curve === "bridge") {
    if (before === undefined || next === undefined || next.curve === "bridge" || typeof spec.until !== "number") {
      throw new InputError(
        "bridge-ends",
        'a bridge needs a phase with an equation of state of its own on either side, and an end of its own ("untilGPa").',
        { column: "form", found: "bridge" },
      );
    }
    const fromPressure = before.untilPressure;
    const curve = bridge(before.curve, next.curve, fromPressure, spec.until);
    return { name, form, curve, fromPressure, untilPressure: spec.until, calibratedTo: fromPressure, source };
  }
  const { curve, calibratedTo } = spec;
  const fromPressure = before?.untilPressure ?? curve.minPressure;
  const untilPressure = spec.until === "crossing" ? crossing(curve, spec, next, fromPressure) : spec.until;
  const phase = { name, form, curve, fromPressure, untilPressure, calibratedTo, source };
  checkRange(phase);
  if (before !== undefined) checkStep(before, phase);
  return phase;
}

function crossing(curve: EosCurve, spec: PhaseSpec, next: PhaseSpec | undefined, fromPressure: number): number {
  if (next === undefined || next.curve === "bridge") {
    throw new InputError(
      "phases-never-cross",
      "there is no equation of state after it whose density its own could meet.",
      { column: "untilCrossing" },
    );
  }
  return findCrossing(curve, next.curve, Math.max(fromPressure, spec.calibratedTo));
}

function checkRange({ curve, fromPressure, untilPressure }: Phase): void {
  if (!(untilPressure > fromPressure)) {
    throw new InputError(
      "phase-order",
      `it ends at ${untilPressure / GPA} GPa but begins at ${fromPressure / GPA} GPa; phases are listed by rising pressure.`,
      { column: "untilGPa", found: String(untilPressure / GPA) },
    );
  }
  // The last phase goes on as far as its form does; a planet that needs more is told so when it is solved.
  const end = untilPressure === Number.POSITIVE_INFINITY ? fromPressure : untilPressure;
  if (curve.minPressure > fromPressure || curve.maxPressure < end) {
    throw new InputError(
      "phase-beyond-form",
      `it is to hold from ${fromPressure / GPA} to ${untilPressure / GPA} GPa, but its equation of state is defined ` +
        `from ${curve.minPressure / GPA} to ${curve.maxPressure / GPA} GPa only.`,
      { column: "untilGPa", found: String(untilPressure / GPA) },
    );
  }
}

/** Bridges meet their neighbours by construction, so only the two densities at the boundary need a look. */
function checkStep(before: Phase, phase: Phase): void {
  const pressure = phase.fromPressure;
  const densityBefore = before.curve.density(before.curve.coordinate(pressure));
  const density = phase.curve.density(phase.curve.coordinate(pressure));
  if (density >= densityBefore * (1 - CONTINUOUS)) return;
  throw new InputError(
    "density-falls",
    `at ${pressure / GPA} GPa, where it begins, its density (${density.toPrecision(6)} kg/m3) is below that of ` +
      `"${before.name}" (${densityBefore.toPrecision(6)} kg/m3); density must not fall with pressure. Move the boundary ` +
      'or join the two by a phase of form "bridge".',
    { column: "untilGPa", found: String(pressure / GPA) },
  );
}
