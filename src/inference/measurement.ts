import type { MassRange } from "../curve/radiusCurve.ts";
import { atDeviation, type SplitNormal, shareBetween } from "./splitNormal.ts";

/** What was measured of a planet: mass [kg] and radius [m], independent of each other. */
export interface Measurement {
  readonly mass: SplitNormal;
  readonly radius: SplitNormal;
}

/** True masses further from the measured one than this many of its errors are left out (2e-19 of a normal). */
const FARTHEST = 9;

/** The masses worth integrating over: within the models' range and near the measurement. */
export function massWindow(mass: SplitNormal, range: MassRange): MassRange {
  return {
    lightest: Math.max(range.lightest, atDeviation(mass, -FARTHEST)),
    heaviest: Math.min(range.heaviest, atDeviation(mass, FARTHEST)),
  };
}

/** How much of what the measurement says about the (positive) mass lies outside the models' range, 0 to 1. */
export function shareOutsideRange(mass: SplitNormal, range: MassRange): number {
  const outside = shareBetween(mass, 0, range.lightest) + shareBetween(mass, range.heaviest, Number.POSITIVE_INFINITY);
  return outside / shareBetween(mass, 0, Number.POSITIVE_INFINITY);
}
