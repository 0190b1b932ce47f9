import type { QuantityName } from "../planets/quantity.ts";
import { constants, EARTH_MASS, EARTH_RADIUS, SUN_MASS, SUN_RADIUS } from "../units/constants.ts";
import type { Subject } from "./finding.ts";

const DEGREE = Math.PI / 180;
const GIGAYEAR = 1e9 * constants.julianYear.value;

/** Name, with its unit, under which a quantity leaves the program, and the size of that unit in SI. */
const displayUnits: Readonly<Record<QuantityName, readonly [name: string, unit: number]>> = {
  mass: ["mass_earth", EARTH_MASS],
  minimumMass: ["minimum_mass_earth", EARTH_MASS],
  radius: ["radius_earth", EARTH_RADIUS],
  density: ["density_kg_m3", 1],
  period: ["period_days", constants.day.value],
  semiMajorAxis: ["semi_major_axis_au", constants.astronomicalUnit.value],
  eccentricity: ["eccentricity", 1],
  inclination: ["inclination_deg", DEGREE],
  equilibriumTemperature: ["equilibrium_temperature_k", 1],
  insolation: ["insolation_earth", constants.solarIrradiance.value],
  surfaceGravity: ["surface_gravity_m_s2", 1],
  radiusRatio: ["radius_ratio", 1],
  scaledAxis: ["scaled_axis", 1],
  velocityAmplitude: ["velocity_amplitude_m_s", 1],
  starMass: ["star_mass_sun", SUN_MASS],
  starRadius: ["star_radius_sun", SUN_RADIUS],
  starTemperature: ["star_temperature_k", 1],
  starDensity: ["star_density_kg_m3", 1],
  starSurfaceGravity: ["star_surface_gravity_m_s2", 1],
  starMetallicity: ["star_metallicity_dex", 1],
  starAge: ["star_age_gyr", GIGAYEAR],
  rightAscension: ["right_ascension_deg", DEGREE],
  declination: ["declination_deg", DEGREE],
};

const isText = (subject: Subject): subject is Exclude<Subject, QuantityName> =>
  subject === "name" || subject === "status" || subject === "cell";

/** Public name of what a finding is about: `mass_earth`; `name`, `status` and `cell` as they are. */
export function displayName(subject: Subject): string {
  return isText(subject) ? subject : displayUnits[subject][0];
}

/** An SI value in the unit that `displayName` states; `earthRadius` [m] where the user chose another unit radius. */
export function inDisplayUnit(subject: Subject, value: number, earthRadius = EARTH_RADIUS): number {
  if (isText(subject)) return value;
  return value / (subject === "radius" ? earthRadius : displayUnits[subject][1]);
}
