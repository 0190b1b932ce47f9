import { InputError } from "../errors.ts";
import { GPA } from "../units/constants.ts";
import type { EosCurve } from "./curve.ts";

/** Fine enough to separate the two crossings of curves that graze each other by more than about 1e-5 in density. */
const SCAN_RATIO = 1.01;

/** [Pa], beyond the centre of any planet. */
const HIGHEST_PRESSURE = 1e18;

/**
 * The lowest pressure [Pa] above `fromPressure` at which the density of `lower`, at first the denser, meets that of
 * `upper`: found by scan, then bisection to the last bit.
 * Throws InputError `phases-never-cross` with the closest approach if there is none.
 * Checked test/eos/phaseStack.test.ts
 */
export function findCrossing(lower: EosCurve, upper: EosCurve, fromPressure: number): number {
  const excess = (pressure: number): number =>
    lower.density(lower.coordinate(pressure)) / upper.density(upper.coordinate(pressure)) - 1;
  const end = Math.min(lower.maxPressure, upper.maxPressure, HIGHEST_PRESSURE);
  let below = Math.max(fromPressure, lower.minPressure, upper.minPressure);
  let above = below;
  let closest = { excess: Number.POSITIVE_INFINITY, pressure: below };
  for (;;) {
    const here = excess(above);
    if (Math.abs(here) < closest.excess) closest = { excess: Math.abs(here), pressure: above };
    const startsLighter = above === below && here < 0;
    if (here <= 0 && !startsLighter) break;
    if (above >= end || startsLighter) throw neverCross(fromPressure, closest);
    below = above;
    above = Math.min(above * SCAN_RATIO, end);
  }
  for (let middle = 0.5 * (below + above); middle !== below && middle !== above; middle = 0.5 * (below + above)) {
    if (excess(middle) > 0) below = middle;
    else above = middle;
  }
  return above;
}

function neverCross(fromPressure: number, closest: { excess: number; pressure: number }): InputError {
  const percent = (100 * closest.excess).toPrecision(3);
  const gpa = (closest.pressure / GPA).toPrecision(4);
  return new InputError(
    "phases-never-cross",
    `beyond ${fromPressure / GPA} GPa its density never comes down to that of the next phase (closest: ${percent} % ` +
      `at ${gpa} GPa); end it at a pressure of your choice ("untilGPa") and join the two by a phase of form "bridge".`,
    { column: "untilCrossing" },
  );
}
