import type { StepForecast } from "./planetForecast.ts";

/** What the two compositions are called in a statement. */
export type PairLabels = readonly [string, string];

/** Below this many sigma two compositions are called degenerate. */
export const DEGENERATE_BELOW = 1;

/** What a step means in one plain sentence; `now` is today's separation. */
export function stepStatement(step: StepForecast, now: number, labels: PairLabels): string {
  const { kind, improved, level = 0, separation, limiting, atMost } = step;
  if (separation === undefined) return outOfReach(improved, atMost ?? 0);
  if (kind === "required") {
    return now >= level ? "reached already: errors may be as large as this" : "reached with errors as small as this";
  }
  return separationStatement(separation, limiting ?? "mass", labels);
}

export function separationStatement(separation: number, limiting: string, [a, b]: PairLabels): string {
  const sigma = `${separation.toFixed(separation < 10 ? 1 : 0)} sigma`;
  if (separation === 0) return `says nothing yet: the ${limiting} is not measured`;
  return separation < DEGENERATE_BELOW
    ? `degenerate: ${a} and ${b} differ by ${sigma} only, so these errors do not tell them apart`
    : `${a} and ${b} differ by ${sigma}, limited by the ${limiting} error`;
}

function outOfReach(improved: StepForecast["improved"], atMost: number): string {
  if (improved === "both") return "cannot be reached: both compositions have the same radius";
  const other = improved === "mass" ? "radius" : "mass";
  return atMost === 0
    ? `cannot be reached by improving the ${improved} alone: the ${other} is not measured`
    : `cannot be reached by improving the ${improved} alone: the ${other} error allows ${atMost.toFixed(2)} sigma at most`;
}
