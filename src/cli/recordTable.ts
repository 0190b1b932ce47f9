import type { Cell } from "./csv.ts";

/** Columns that name a row or line of the user's file. */
const places = ["row", "line", "row_other"];

/** The cells of a record in the order of `columns`. */
export function recordCells<Column extends string>(
  record: Readonly<Partial<Record<Column, string | number>>>,
  columns: readonly Column[],
): Cell[] {
  return columns.map((column) => {
    const cell = record[column];
    return typeof cell === "number" && places.includes(column) ? BigInt(cell) : cell;
  });
}
