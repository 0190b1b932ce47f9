import { logChiSquareAbove } from "../../src/inference/composition/chiSquare.ts";
import type { RankedTruth } from "./calibrateFamily.ts";

/** How well the posteriors of one component's fraction are calibrated. */
export interface FractionCalibration {
  readonly family: string;
  readonly component: string;
  readonly planets: number;
  /** Of the shares below the truth against a uniform distribution. */
  readonly chiSquare: number;
  readonly degreesOfFreedom: number;
  /** Probability of a larger one if the shares are uniform. */
  readonly uniformP: number;
  /** Share of truths within the intervals of 68 % and 95 %. */
  readonly coverage68: number;
  readonly coverage95: number;
}

const MOST_BINS = 20;
/** Planets expected in a bin, at least: many enough for the chi-square distribution. */
const FEWEST_EXPECTED = 15;

export function fractionCalibration(
  family: string,
  component: string,
  truths: readonly RankedTruth[],
): FractionCalibration {
  const planets = truths.length;
  const bins = Math.min(MOST_BINS, Math.floor(planets / FEWEST_EXPECTED));
  const counts = new Array<number>(bins).fill(0);
  for (const { below } of truths) counts[Math.min(bins - 1, Math.floor(below * bins))] += 1;
  const expected = planets / bins;
  const chiSquare = counts.reduce((sum, count) => sum + (count - expected) ** 2 / expected, 0);
  return {
    family,
    component,
    planets,
    chiSquare,
    degreesOfFreedom: bins - 1,
    uniformP: Math.exp(logChiSquareAbove(chiSquare, bins - 1)),
    coverage68: truths.filter(({ in68 }) => in68).length / planets,
    coverage95: truths.filter(({ in95 }) => in95).length / planets,
  };
}
