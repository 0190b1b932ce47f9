import { InputError, ModelRangeError } from "../errors.ts";
import { GPA } from "../units/constants.ts";
import type { EosCurve } from "./curve.ts";

const inGPa = (pressure: number): string => `${Number((pressure / GPA).toPrecision(6))} GPa`;

/** Throws ModelRangeError `eos-pressure-range` unless the form can be evaluated at this pressure [Pa]. */
export function checkPressure(
  form: string,
  curve: Pick<EosCurve, "minPressure" | "maxPressure">,
  pressure: number,
): void {
  const { minPressure, maxPressure } = curve;
  if (pressure >= minPressure && pressure <= maxPressure && pressure < Number.POSITIVE_INFINITY) return;
  const top = maxPressure === Number.POSITIVE_INFINITY ? "any finite pressure" : inGPa(maxPressure);
  throw new ModelRangeError(
    "eos-pressure-range",
    `pressure ${inGPa(pressure)} is outside what this ${form} curve describes: ${inGPa(minPressure)} to ${top}, where the form ` +
      "itself ends. Stay within that range or continue the material with a further phase.",
    { quantity: "pressure", value: pressure, minimum: minPressure, maximum: maxPressure },
  );
}

/** Throws ModelRangeError `eos-density-range` unless minimum <= density <= maximum [kg m^-3]. */
export function checkDensity(form: string, density: number, minimum: number, maximum: number): void {
  if (density >= minimum && density <= maximum && density < Number.POSITIVE_INFINITY) return;
  throw new ModelRangeError(
    "eos-density-range",
    `density ${density} kg/m3 is outside what this ${form} curve reaches: ${minimum} to ${maximum} kg/m3.`,
    { quantity: "density", value: density, minimum, maximum },
  );
}

/** Throws InputError `eos-parameter` unless the parameter is finite and above `bound`. */
export function checkParameter(form: string, name: string, value: number, bound = 0): void {
  if (value > bound && value < Number.POSITIVE_INFINITY) return;
  throw new InputError("eos-parameter", `${form}: ${name} is ${value}; it must be a finite number above ${bound}.`, {
    column: name,
    found: String(value),
  });
}
