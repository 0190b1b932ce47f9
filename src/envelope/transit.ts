import { ModelRangeError } from "../errors.ts";
import { constants, G } from "../units/constants.ts";
import { GAS_MOLAR_MASS, scaleHeight } from "./atmosphere.ts";

/**
 * Pressure [Pa] at the transit radius of the published scaling: what `radiusWithAtmosphere` reaches.
 * Source  Lopez & Fortney 2014, Astrophys. J. 792, 1, section 2.3: 20 mbar (from memory)
 */
export const TRANSIT_PRESSURE = 2000;

/** Optical depth along the chord at the radius of the opaque disc that dims the star as much: e^-γ, 0.56. */
const CHORD_DEPTH = 0.5614594835668851;

/**
 * Radius [m] at which the pressure is `pressure` [Pa], in an isothermal atmosphere with the transit pressure at the
 * planet's radius; gravity falls with the square of distance.
 * Formula 1/R(P) = 1/R0 - (k T / (G M μ m_u)) ln(P0/P), from dP/P = -(μ m_u / k T) (G M / r²) dr
 * Throws  ModelRangeError `atmosphere-unbound` for pressures so low that no height has them
 * Checked test/envelope/transit.test.ts
 */
export function radiusAtPressure(
  { mass, radius }: { readonly mass: number; readonly radius: number },
  temperature: number,
  pressure: number,
): number {
  const perLogPressure = (constants.gasConstant.value * temperature) / (G * mass * GAS_MOLAR_MASS);
  const inverse = 1 / radius - perLogPressure * Math.log(TRANSIT_PRESSURE / pressure);
  if (inverse > 0) return 1 / inverse;
  const lowest = TRANSIT_PRESSURE * Math.exp(-1 / (radius * perLogPressure));
  throw new ModelRangeError(
    "atmosphere-unbound",
    `An isothermal atmosphere at ${temperature.toPrecision(4)} K has no radius with ${pressure} Pa here: its pressure falls to ${lowest.toPrecision(3)} Pa at infinity.`,
    { quantity: "transit pressure", value: pressure, minimum: lowest },
  );
}

/**
 * Pressure [Pa] at the transit radius of an atmosphere of given opacity [m²/kg], the same at all heights. Light that
 * grazes the planet crosses √(2πR/H) times what lies above its lowest point.
 * Formula P = 0.56 g / (κ √(2πR/H)), the vertical column above P being P/g
 * Source  Fortney 2005, Mon. Not. R. Astron. Soc. 364, 649; 0.56: Lecavelier des Etangs et al. 2008, Astron. Astrophys.
 *         481, L83 (both from memory)
 * Range   H much smaller than R; error of the factor about H/R
 * Checked test/envelope/transit.test.ts
 */
export function transitPressure(
  { mass, radius }: { readonly mass: number; readonly radius: number },
  temperature: number,
  opacity: number,
): number {
  const gravity = (G * mass) / radius ** 2;
  const slant = Math.sqrt((2 * Math.PI * radius) / scaleHeight(mass, radius, temperature));
  return (CHORD_DEPTH * gravity) / (opacity * slant);
}
