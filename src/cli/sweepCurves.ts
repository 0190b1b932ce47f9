import { sweepMasses } from "../curve/sweep.ts";
import type { Composition } from "../library/composition.ts";
import { EARTH_MASS } from "../units/constants.ts";
import { allOf, interruptible } from "./interruptible.ts";
import type { Curve } from "./massRadiusPage.ts";

/** One curve for each composition, at these masses [Earth masses]. */
export async function sweepCurves(
  compositions: readonly Composition[],
  massesEarth: readonly number[],
): Promise<Curve[]> {
  const masses = massesEarth.map((mass) => mass * EARTH_MASS);
  const curves: Curve[] = [];
  for (const composition of compositions) {
    curves.push({ composition, points: await allOf(interruptible(sweepMasses(composition, masses))) });
  }
  return curves;
}
