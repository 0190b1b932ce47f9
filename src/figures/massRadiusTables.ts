import type { FigureSpec, FigureValue } from "./figureSpec.ts";
import type { PageTable, TableColumn } from "./table.ts";

/** The planets of a figure as a table; columns that would be empty are left out. */
export function planetTable({ planets, columns, axes }: FigureSpec): PageTable {
  const all: TableColumn[] = [
    { title: "Planet" },
    { title: "Mass", unit: axes.mass.unit, numeric: true },
    { title: "Radius", unit: axes.radius.unit, numeric: true },
    { title: "Verdict", wide: true },
    ...columns.map((column) => ({ ...column, numeric: true })),
    { title: "Note", wide: true },
  ];
  const rows = planets.map(({ name, mass, radius, verdict, statement, reason, values, note }): FigureValue[] => [
    name,
    mass,
    radius,
    statement ?? verdict ?? `none: ${reason ?? "not classified"}`,
    ...values,
    note,
  ]);
  const kept = all.map((_, i) => i < 4 || rows.some((row) => row[i] !== null && row[i] !== ""));
  return {
    id: "planets",
    caption: "Planets, in the order of the list",
    columns: all.filter((_, i) => kept[i]),
    rows: rows.map((row) => row.filter((_, i) => kept[i])),
  };
}

/** Radius against mass for every curve, one row a mass. */
export function curveTable({ curves, axes }: FigureSpec): PageTable {
  const masses = [...new Set(curves.flatMap(({ mass }) => mass))].sort((a, b) => a - b);
  const radii = curves.map(({ mass, radius }) => new Map(mass.map((m, i) => [m, radius[i] ?? null])));
  return {
    id: "curves",
    caption: `Radius (${axes.radius.unit}) of each composition; blank where no planet was found`,
    columns: [
      { title: "Mass", unit: axes.mass.unit, numeric: true, digits: 6 },
      ...curves.map(({ label }) => ({ title: label, numeric: true, digits: 5 })),
    ],
    rows: masses.map((mass) => [mass, ...radii.map((radius) => radius.get(mass) ?? null)]),
  };
}
