import { EquidistantNodes } from "../../numerics/equidistantNodes.ts";
import { logIntegral } from "../densityQuadrature.ts";
import { atDeviation, deviation, type SplitNormal } from "../splitNormal.ts";

/** Spacing of the table in asinh of the distance from the minimum mass, in errors of it. */
const STEP = 0.05;
/** Masses up to this many times the minimum mass are told apart; a heavier planet is seen from one of 1e9 sides. */
const LARGEST_RATIO = 3e4;

/**
 * ln L of a true mass M, M sin i being measured and the orbit's direction unknown (cos i uniform from 0 to 1):
 *   L(M) = ∫_0^1 exp(-z(M sin i)²/2) d(cos i)
 * tabulated once for all masses over t = asinh((M - M_0)/σ), which follows the flank of the error and the long tail alike.
 */
export function minimumMassLikelihood(value: SplitNormal): { log(mass: number): number; bends: readonly number[] } {
  const sigma = Math.max(value.minus, value.plus);
  const from = Math.asinh((atDeviation(value, -9) - value.mode) / sigma) - 5 * STEP;
  const to = Math.asinh((LARGEST_RATIO * value.mode) / sigma);
  const logs = Array.from({ length: Math.ceil((to - from) / STEP) + 1 }, (_, n) =>
    logOverInclinations(value, value.mode + sigma * Math.sinh(from + n * STEP)),
  );
  const table = new EquidistantNodes(from, STEP, Float64Array.from(logs));
  return {
    log: (mass) => table.value(Math.min(to, Math.asinh((mass - value.mode) / sigma))),
    bends: [value.mode, atDeviation(value, 3), ...[1.5, 3, 10, 100].map((ratio) => ratio * value.mode)],
  };
}

function logOverInclinations(value: SplitNormal, mass: number): number {
  // Seen at this cos i, M sin i is just what was measured.
  const cosine = mass > value.mode ? Math.sqrt(1 - (value.mode / mass) ** 2) : undefined;
  const edges = cosine === undefined ? [0, 1] : [0, cosine, 1];
  return logIntegral((x) => -0.5 * deviation(value, mass * Math.sqrt(Math.max(0, 1 - x * x))) ** 2, edges);
}
