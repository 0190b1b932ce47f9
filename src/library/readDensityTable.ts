import type { TableRow } from "../eos/tabulated.ts";
import { InputError } from "../errors.ts";
import { GPA } from "../units/constants.ts";

const COLUMNS = ["pressure_gpa", "density_kg_m3"];

/**
 * Reads an equation-of-state table: CSV with the header `pressure_gpa,density_kg_m3`, `#` lines and empty lines skipped.
 * Throws InputError `library-table` with file, line and column.
 */
export function readDensityTable(file: string, text: string): TableRow[] {
  const rows: TableRow[] = [];
  let header: string[] | undefined;
  text
    .replace(/^\uFEFF/, "")
    .split(/\r\n|\n|\r/)
    .forEach((content, i) => {
      if (content.trim() === "" || content.startsWith("#")) return;
      const cells = content.split(",").map((cell) => cell.trim());
      if (header === undefined) header = checkHeader(file, i + 1, cells);
      else rows.push(readRow(file, i + 1, header, cells));
    });
  return rows;
}

function checkHeader(file: string, line: number, cells: string[]): string[] {
  const missing = COLUMNS.filter((column) => !cells.includes(column));
  if (missing.length === 0) return cells;
  throw new InputError(
    "library-table",
    `${file}:${line}: found the columns ${cells.join(", ")}; a table needs ${COLUMNS.join(" and ")}.`,
    { file, line, found: cells.join(",") },
  );
}

function readRow(file: string, line: number, header: string[], cells: string[]): TableRow {
  const [pressure, density] = COLUMNS.map((column) => {
    const cell = cells[header.indexOf(column)] ?? "";
    const value = Number(cell);
    if (cell !== "" && Number.isFinite(value)) return value;
    throw new InputError("library-table", `${file}:${line}: ${column} is "${cell}"; a number is needed.`, {
      file,
      line,
      column,
      found: cell,
    });
  });
  return { pressure: pressure * GPA, density };
}
