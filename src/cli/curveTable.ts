import type { CurvePoint } from "../curve/sweep.ts";
import { EARTH_MASS, GPA } from "../units/constants.ts";
import type { Cell } from "./csv.ts";
import type { Curve } from "./massRadiusPage.ts";
import type { Table } from "./table.ts";

const columns = [
  "composition",
  "mass_earth",
  "radius_earth",
  "radius_m",
  "bulk_density_kg_m3",
  "surface_gravity_m_s2",
  "central_pressure_gpa",
  "inertia_factor",
  "radius_relative_error",
  "extrapolated_layers",
  "note",
];

/** Mass–radius curves, one row a point; a point that could not be solved has its reason as note. */
export function curveTable(curves: readonly Curve[], earthRadius: number): Table {
  const rows = curves.flatMap(({ composition, points }) =>
    points.map((point) => [composition.name, ...pointCells(point, earthRadius)]),
  );
  return { columns, rows };
}

function pointCells({ mass, planet, error }: CurvePoint, earthRadius: number): Cell[] {
  const massEarth = mass / EARTH_MASS;
  if (!planet) return [massEarth, ...Array<Cell>(8).fill(undefined), error.message];
  return [
    massEarth,
    planet.radius / earthRadius,
    planet.radius,
    planet.bulkDensity,
    planet.surfaceGravity,
    planet.centralPressure / GPA,
    planet.inertiaFactor,
    planet.radiusRelativeError,
    planet.extrapolatedLayers.join(";"),
    planet.notes.join("; ") || undefined,
  ];
}
