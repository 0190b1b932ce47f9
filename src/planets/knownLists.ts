import type { QuantityName } from "./quantity.ts";

/** A published list whose documentation gives units that its header leaves out, known by the columns it has. */
export interface KnownList {
  readonly title: string;
  /** All of these keys must be present. */
  readonly signature: string;
  readonly units: Readonly<Partial<Record<QuantityName, string>>>;
  /** Columns that mean something else here than in general. */
  readonly names?: Readonly<Record<string, QuantityName>>;
}

const jupiterUnits = { mass: "jupiter", minimumMass: "jupiter", radius: "jupiter" } as const;

/** Units from the lists' own documentation pages, from memory. */
export const knownLists: readonly KnownList[] = [
  {
    title: "the exoplanet.eu catalogue",
    signature: "name mass mass_error_min mass_error_max radius orbital_period semi_major_axis star_name star_mass",
    units: { ...jupiterUnits, surfaceGravity: "log-cgs" },
    names: { log_g: "surfaceGravity" },
  },
  {
    title: "the catalogue of transiting systems (TEPCat)",
    signature: "system m_a r_a m_b r_b g_b rho_b",
    units: { ...jupiterUnits, density: "jupiter", starDensity: "sun" },
    names: {
      m_a: "starMass",
      r_a: "starRadius",
      logga: "starSurfaceGravity",
      rho_a: "starDensity",
      m_b: "mass",
      r_b: "radius",
      g_b: "surfaceGravity",
      rho_b: "density",
    },
  },
  {
    title: "the exoplanets.org table",
    signature: "name mass msini umass mstar per",
    units: { ...jupiterUnits, surfaceGravity: "log-cgs" },
    names: { r: "radius" },
  },
  {
    title: "the habitable-exoplanets catalogue",
    signature: "p_name p_mass p_radius p_period s_mass",
    units: { mass: "earth", radius: "earth" },
  },
];
