import { expect, it } from "vitest";
import { TrialIntegration } from "../../src/interior/trialIntegration.ts";
import type { Composition } from "../../src/library/composition.ts";
import { EARTH_MASS, GPA } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { planetOf } from "../support/referenceMaterials.ts";

/** ln(mass excess) and r² at a central pressure, tightly integrated. */
function run(composition: Composition, logPressure: number): TrialIntegration {
  const trial = new TrialIntegration(composition);
  trial.integrator.tolerance = 1e-13;
  expect(trial.run(EARTH_MASS, Math.exp(logPressure))).toBe("surface");
  return trial;
}

it.each([
  ["one layer", planetOf([["mantle-bm3", 1]]), 200],
  [
    "two layers",
    planetOf([
      ["fe-bm3", 0.325],
      ["mantle-bm3", 0.675],
    ]),
    380,
  ],
  [
    "phase changes in the outer layer",
    planetOf([
      ["fe-vinet", 0.325],
      ["silicate-3phase", 0.675],
    ]),
    450,
  ],
  [
    "phase changes in an inner layer",
    planetOf([
      ["silicate-3phase", 0.6],
      ["ice-bm3", 0.4],
    ]),
    160,
  ],
])("the integrated sensitivity equals the difference quotient: %s", (_name, composition, pressureGPa) => {
  const x = Math.log(pressureGPa * GPA);
  const h = 1e-4;
  const here = run(composition, x);
  const [below, above] = [run(composition, x - h), run(composition, x + h)];
  const because = "central difference with step 1e-4";
  const massSlope = (above.logMassExcess - below.logMassExcess) / (2 * h);
  expectClose(here.logMassExcessSlope, massSlope, { rel: 1e-6, because });
  const radiusSlope = (above.radiusSquared - below.radiusSquared) / (2 * h);
  expectClose(here.radiusSquaredSlope, radiusSlope, { rel: 1e-6, because });
});
