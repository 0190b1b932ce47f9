import type { EosCurve } from "../eos/curve.ts";
import type { Phase } from "../eos/material.ts";
import { GPA } from "../units/constants.ts";

/** Steps below this are rounding: the two densities meet. */
const NO_STEP = 1e-9;

/** How two phases, or the two sides of a bridge, meet. Steps are density above over density below, less 1. */
export type JoinDescription =
  | {
      readonly kind: "crossing" | "transition";
      readonly lower: string;
      readonly upper: string;
      readonly atGPa: number;
      readonly step: number;
    }
  | {
      readonly kind: "bridge";
      readonly lower: string;
      readonly upper: string;
      readonly fromGPa: number;
      readonly untilGPa: number;
      /** What the step would be at either end; absent where the lower form does not reach. */
      readonly stepAtFrom?: number;
      readonly stepAtUntil?: number;
    };

/** Every boundary between phases; a bridge stands for its two. */
export function describeJoins(phases: readonly Phase[]): JoinDescription[] {
  return phases.slice(1).flatMap((upper, i): JoinDescription[] => {
    const lower = phases[i];
    if (upper.form === "bridge") return [describeBridge(lower, upper, phases[i + 2])];
    if (lower.form === "bridge") return [];
    const step = stepAt(lower.curve, upper.curve, upper.fromPressure) ?? 0;
    const kind = Math.abs(step) < NO_STEP ? "crossing" : "transition";
    return [{ kind, lower: lower.name, upper: upper.name, atGPa: upper.fromPressure / GPA, step }];
  });
}

function describeBridge(lower: Phase, bridge: Phase, upper: Phase): JoinDescription {
  const { fromPressure, untilPressure } = bridge;
  return {
    kind: "bridge",
    lower: lower.name,
    upper: upper.name,
    fromGPa: fromPressure / GPA,
    untilGPa: untilPressure / GPA,
    stepAtFrom: stepAt(lower.curve, upper.curve, fromPressure),
    stepAtUntil: stepAt(lower.curve, upper.curve, untilPressure),
  };
}

function stepAt(lower: EosCurve, upper: EosCurve, pressure: number): number | undefined {
  if (pressure > lower.maxPressure || pressure < upper.minPressure) return undefined;
  return upper.density(upper.coordinate(pressure)) / lower.density(lower.coordinate(pressure)) - 1;
}
