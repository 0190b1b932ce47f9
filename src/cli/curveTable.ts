import type { CurvePoint } from "../curve/sweep.ts";
import { BulkwrightError } from "../errors.ts";
import type { Planet } from "../interior/planet.ts";
import { EARTH_MASS, GPA } from "../units/constants.ts";
import type { ColumnGroup } from "./columnGroup.ts";
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

/**
 * Mass–radius curves, one row a point, with further columns at the end; a point that could not be solved has its reason
 * as note.
 */
export function curveTable(curves: readonly Curve[], earthRadius: number, groups: readonly ColumnGroup[] = []): Table {
  const rows = curves.flatMap(({ composition, points }) =>
    points.map((point) => [composition.name, ...pointCells(point, earthRadius, groups)]),
  );
  return { columns: [...columns, ...groups.flatMap((group) => group.columns)], rows };
}

function pointCells({ mass, planet, error }: CurvePoint, earthRadius: number, groups: readonly ColumnGroup[]): Cell[] {
  const massEarth = mass / EARTH_MASS;
  if (!planet)
    return [massEarth, ...blank(8), error.message, ...groups.flatMap((group) => blank(group.columns.length))];
  const filled = groups.map((group) => filledGroup(group, planet));
  const notes = [...planet.notes, ...filled.flatMap(({ notes }) => notes)];
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
    notes.join("; ") || undefined,
    ...filled.flatMap(({ cells }) => cells),
  ];
}

function filledGroup(group: ColumnGroup, planet: Planet): { cells: readonly Cell[]; notes: readonly string[] } {
  try {
    return { cells: group.cells(planet), notes: [] };
  } catch (error) {
    if (!(error instanceof BulkwrightError)) throw error;
    return { cells: blank(group.columns.length), notes: [error.message] };
  }
}

function blank(count: number): Cell[] {
  return Array<Cell>(count).fill(undefined);
}
