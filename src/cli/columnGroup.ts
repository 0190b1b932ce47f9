import type { Planet } from "../interior/planet.ts";
import type { Cell } from "./csv.ts";

/** Columns that an option or a kind of composition appends to the curve table. */
export interface ColumnGroup {
  readonly columns: readonly string[];
  /** One cell a column. A BulkwrightError leaves them empty and becomes a note of the row. */
  cells(planet: Planet): readonly Cell[];
}
