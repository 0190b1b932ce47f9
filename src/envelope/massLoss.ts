import { constants, G } from "../units/constants.ts";

const MEGAYEAR = 1e6 * constants.julianYear.value;

/** Share of the star's light that is X-ray and extreme ultraviolet while it is young, and how it fades. */
const SATURATED_SHARE = 10 ** -3.5;
const SATURATED_UNTIL = 100 * MEGAYEAR;
const DECLINE = -1.5;

/** Share of the incident energy that lifts gas; published values run from 0.01 to 0.3. */
export const ESCAPE_EFFICIENCY = 0.1;

/**
 * High-energy flux [W m^-2] at a planet that receives `flux` in all from a star of this age [s].
 * Formula F_XUV = 10^-3.5 F up to 100 Myr, then falling as age^-1.5; a sun-like star within a factor of a few
 * Source  Owen & Wu 2017, Astrophys. J. 847, 29, equations 22-24 (from memory)
 * Checked test/envelope/massLoss.test.ts
 */
export function highEnergyFlux(flux: number, age: number): number {
  return SATURATED_SHARE * flux * Math.max(age / SATURATED_UNTIL, 1) ** DECLINE;
}

/**
 * Time [s] in which an envelope would be lost at the present rate, limited by the energy that heats it. Younger stars
 * are brighter in this light, so an envelope with less of this time left than its age has not survived.
 * Formula t = M_env / (dM/dt), dM/dt = η π R³ F_XUV / (G M)
 * Source  Watson, Donahue & Walker 1981, Icarus 48, 150; in this form Erkaev et al. 2007, Astron. Astrophys. 472, 329,
 *         with their tidal factor left at 1
 * Checked test/envelope/massLoss.test.ts
 */
export function massLossTime(planet: {
  mass: number;
  radius: number;
  envelopeMass: number;
  highEnergyFlux: number;
  efficiency?: number;
}): number {
  const { mass, radius, envelopeMass, highEnergyFlux: heating, efficiency = ESCAPE_EFFICIENCY } = planet;
  return (envelopeMass * G * mass) / (efficiency * Math.PI * radius ** 3 * heating);
}
