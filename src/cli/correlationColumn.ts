import { InputError } from "../errors.ts";
import { type RowLikelihood, rowLikelihood } from "../inference/composition/planetData.ts";
import { suggestion } from "../library/nearest.ts";
import type { PlanetRow } from "../planets/quantity.ts";

/**
 * The likelihoods of a list's rows, with the correlation of their errors from a column if one is named; an empty cell there
 * means none. Throws InputError `column-not-found`.
 */
export function rowLikelihoods(
  rows: readonly PlanetRow[],
  header: readonly string[],
  column: string | undefined,
): RowLikelihood[] {
  if (column === undefined) return rows.map((row) => rowLikelihood(row));
  const index = header.indexOf(column);
  if (index < 0) {
    const message = `there is no column "${column}" for the correlation.${suggestion(column, header)}`;
    throw new InputError("column-not-found", message, { found: column });
  }
  return rows.map((row) => {
    const cell = (row.cells[index] ?? "").trim();
    const correlation = cell === "" ? 0 : Number(cell);
    return correlation > -1 && correlation < 1
      ? rowLikelihood(row, correlation)
      : { reasons: ["correlation-unusable"] };
  });
}
