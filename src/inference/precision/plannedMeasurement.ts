import type { MassRange, RadiusCurve } from "../../curve/radiusCurve.ts";
import { InputError } from "../../errors.ts";
import { EARTH_MASS } from "../../units/constants.ts";
import type { Measurement } from "../measurement.ts";
import type { SplitNormal } from "../splitNormal.ts";
import type { ErrorSizes } from "./separation.ts";

/** What is known of a planet to plan for; one of the two may be missing. */
export interface KnownQuantities {
  readonly mass?: SplitNormal;
  readonly radius?: SplitNormal;
}

/**
 * The measurement to improve. A quantity that is missing gets the value it has for composition `a`, and an infinite error.
 * Throws InputError `nothing-known`, `radius-beyond-models`, or `mass-beyond-models` for a mass outside `range`.
 */
export function presentMeasurement(
  { mass, radius }: KnownQuantities,
  { a, range }: { readonly a: RadiusCurve; readonly range: MassRange },
): Measurement {
  const value = mass?.mode ?? massFromRadius(radius, a);
  if (!(value >= range.lightest && value <= range.heaviest)) throw massBeyondModels(value, range);
  return { mass: mass ?? unmeasured(value), radius: radius ?? unmeasured(a.radius(value)) };
}

export function isMeasured({ minus, plus }: SplitNormal): boolean {
  return minus + plus < Number.POSITIVE_INFINITY;
}

/** The mean of the errors to both sides, which linear forecasts use. */
export function errorSizes({ mass, radius }: Measurement): ErrorSizes {
  return { mass: (mass.minus + mass.plus) / 2, radius: (radius.minus + radius.plus) / 2 };
}

/** The same values with errors of these mean sizes; what was unequal on the two sides stays so in proportion. */
export function withErrors({ mass, radius }: Measurement, errors: ErrorSizes): Measurement {
  return { mass: withError(mass, errors.mass), radius: withError(radius, errors.radius) };
}

function withError(quantity: SplitNormal, size: number): SplitNormal {
  if (!isMeasured(quantity)) return { ...quantity, minus: size, plus: size };
  const factor = (2 * size) / (quantity.minus + quantity.plus);
  return { ...quantity, minus: factor * quantity.minus, plus: factor * quantity.plus };
}

function unmeasured(value: number): SplitNormal {
  return { mode: value, minus: Number.POSITIVE_INFINITY, plus: Number.POSITIVE_INFINITY };
}

function massFromRadius(radius: SplitNormal | undefined, a: RadiusCurve): number {
  if (radius === undefined)
    throw new InputError("nothing-known", "Neither mass nor radius is given. Give at least one.");
  const mass = a.massWithRadius(radius.mode);
  if (mass !== undefined) return mass;
  throw new InputError(
    "radius-beyond-models",
    `No planet of the first composition has a radius of ${(radius.mode / 1e3).toPrecision(5)} km. Give the mass too.`,
  );
}

function massBeyondModels(mass: number, { lightest, heaviest }: MassRange): InputError {
  const [value, low, high] = [mass, lightest, heaviest].map((m) => (m / EARTH_MASS).toPrecision(4));
  return new InputError(
    "mass-beyond-models",
    `A mass of ${value} Earth masses is outside the compositions' common range, ${low} to ${high} Earth masses.`,
  );
}
