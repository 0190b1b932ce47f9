import type { ProfilePoint } from "../interior/profile.ts";
import { EARTH_MASS, GPA } from "../units/constants.ts";
import type { Table } from "./table.ts";

const columns = [
  "radius_km",
  "enclosed_mass_earth",
  "pressure_gpa",
  "density_kg_m3",
  "gravity_m_s2",
  "layer",
  "phase",
  "temperature_k",
];

/** The inside of a planet, one row a point from centre to surface; cold layers have no temperature. */
export function profileTable(points: readonly ProfilePoint[]): Table {
  return {
    columns,
    rows: points.map(({ radius, enclosedMass, pressure, density, temperature, gravity, layer, phase }) => [
      radius / 1e3,
      enclosedMass / EARTH_MASS,
      pressure / GPA,
      density,
      gravity,
      layer,
      phase,
      temperature,
    ]),
  };
}
