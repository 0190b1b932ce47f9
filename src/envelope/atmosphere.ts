import { constants, G } from "../units/constants.ts";

const R = constants.gasConstant.value;
/** Mean molar mass of hydrogen and helium in the Sun's proportions [kg/mol]; mean molecular weight 2.35 from memory. */
export const GAS_MOLAR_MASS = 2.35e-3;
const HYDROGEN_MOLAR_MASS = 1.008e-3;

/**
 * Scale heights between the radiative–convective boundary and the pressure at which the planet is opaque in transit,
 * about ln(100 bar / 20 mbar).
 * Source  Lopez & Fortney 2014, Astrophys. J. 792, 1, section 2.3 (the factor from memory)
 */
const SCALE_HEIGHTS = 9;

/** Temperature of a black sphere that spreads the star's flux [W m^-2] evenly: (F/4σ)^(1/4) [K]. */
export function equilibriumTemperature(flux: number): number {
  return (flux / (4 * constants.stefanBoltzmann.value)) ** 0.25;
}

/** Scale height k T / (μ m_u g) of the atmosphere at a radius [m], with the gravity there. */
export function scaleHeight(planetMass: number, radius: number, temperature: number): number {
  const gravity = (G * planetMass) / (radius * radius);
  return (R * temperature) / (GAS_MOLAR_MASS * gravity);
}

/**
 * Transit radius [m] of an isothermal radiative atmosphere on a convective envelope of given outer radius [m].
 * Formula R = R_c + 9 k T_eq/(μ m_u g(R_c))
 * Checked test/envelope/atmosphere.test.ts
 */
export function radiusWithAtmosphere(planetMass: number, convectiveRadius: number, temperature: number): number {
  return convectiveRadius + SCALE_HEIGHTS * scaleHeight(planetMass, convectiveRadius, temperature);
}

/** Convective radius under a given transit radius: the same equation, quadratic in R_c, solved. */
export function radiusWithoutAtmosphere(planetMass: number, transitRadius: number, temperature: number): number {
  const perSquare = SCALE_HEIGHTS * scaleHeight(planetMass, 1, temperature);
  return (2 * transitRadius) / (1 + Math.sqrt(1 + 4 * perSquare * transitRadius));
}

/**
 * Gravitational over thermal energy of a hydrogen atom at the planet's radius. Below about 20 an envelope of hydrogen
 * flows away at its own temperature, without need of high-energy light.
 * Formula Λ = G M m_H / (k T R)
 * Source  Fossati et al. 2017, Astron. Astrophys. 598, A90, who find the limit between 15 and 35 (from memory)
 * Checked test/envelope/atmosphere.test.ts
 */
export function escapeParameter(planetMass: number, radius: number, temperature: number): number {
  return (G * planetMass * HYDROGEN_MOLAR_MASS) / (R * temperature * radius);
}
