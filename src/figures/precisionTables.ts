import type { PrecisionSpec } from "./precisionSpec.ts";
import type { PageTable } from "./table.ts";

/** The steps of a precision figure; columns that would be empty are left out. */
export function stepTable({ steps: { columns, rows } }: PrecisionSpec): PageTable {
  const kept = columns.map((_, i) => rows.some((row) => row[i] !== null && row[i] !== ""));
  return {
    id: "steps",
    caption: "What errors give which separation, and what else they buy",
    columns: columns
      .map((column, i) => ({ ...column, numeric: i > 0 && i < columns.length - 1, wide: i === columns.length - 1 }))
      .filter((_, i) => kept[i]),
    rows: rows.map((row) => row.filter((_, i) => kept[i])),
  };
}

/** The separations of the map, one row a mass error, one column a radius error. */
export function gridTable({ grid }: PrecisionSpec): PageTable {
  return {
    id: "grid",
    caption: "Separation in sigma by the relative errors of mass (down) and radius (across)",
    columns: [
      { title: "Mass error", unit: "%", numeric: true },
      ...grid.radiusErrors.map((error) => ({
        title: `Radius ${Number(error.toPrecision(3))} %`,
        numeric: true,
        digits: 3,
      })),
    ],
    rows: grid.massErrors.map((error, i) => [error, ...grid.separation[i]]),
  };
}
