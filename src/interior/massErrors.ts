import { ModelRangeError } from "../errors.ts";
import { EARTH_MASS, GPA } from "../units/constants.ts";
import type { Stretch } from "./trialIntegration.ts";

/** Masses the solver is built and tested for [kg]: 1e-3 to 1e3 Earth masses. */
export const MASS_RANGE = { minimum: 1e-3 * EARTH_MASS, maximum: 1e3 * EARTH_MASS } as const;

export function massOutOfRange(mass: number): ModelRangeError {
  return new ModelRangeError(
    "mass-range",
    `A mass of ${earthMasses(mass)} is outside the range the solver is made for, 0.001 to 1000 Earth masses.`,
    { quantity: "mass", value: mass, minimum: MASS_RANGE.minimum, maximum: MASS_RANGE.maximum },
  );
}

/** `broken` is the phase whose form ends, undefined where gravity sets the limit. */
export function massAboveMaximum(name: string, mass: number, maximum: number, broken?: Stretch): ModelRangeError {
  const why =
    broken === undefined
      ? "beyond it a higher central pressure holds less mass, so no stable planet exists"
      : `the equation of state of ${broken.layer.name}, phase ${broken.phase.name}, ends at ` +
        `${(broken.phase.curve.maxPressure / GPA).toPrecision(4)} GPa`;
  return new ModelRangeError(
    "mass-above-maximum",
    `${name} at ${earthMasses(mass)} is above the largest mass this composition can have, ` +
      `${earthMasses(maximum)}: ${why}. Ask for a smaller mass, or use materials continued to higher pressure.`,
    { quantity: "mass", value: mass, maximum },
  );
}

export function massIndependentOfPressure(name: string, mass: number, only: number): ModelRangeError {
  return new ModelRangeError(
    "mass-independent-of-pressure",
    `${name} at ${earthMasses(mass)}: every central pressure of this composition gives the same mass, ` +
      `${earthMasses(only)}. Give a central pressure instead of a mass.`,
    { quantity: "mass", value: mass, minimum: only, maximum: only },
  );
}

export function noCentralPressure(name: string, mass: number): ModelRangeError {
  return new ModelRangeError(
    "no-central-pressure",
    `${name} at ${earthMasses(mass)}: no central pressure holds up this mass in a stable way. ` +
      "The density answers to pressure too softly or too steeply; check the composition's materials.",
    { quantity: "mass", value: mass },
  );
}

function earthMasses(mass: number): string {
  return `${(mass / EARTH_MASS).toPrecision(5)} Earth masses`;
}
