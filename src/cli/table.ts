import { type Cell, csvRecord } from "./csv.ts";
import { type Provenance, provenanceLines } from "./provenance.ts";

export interface Table {
  readonly columns: readonly string[];
  readonly rows: readonly (readonly Cell[])[];
}

export type TableFormat = "csv" | "json";

/** A table with its provenance as text: CSV after `# ` lines, or one JSON object. */
export function formatTable(table: Table, provenance: Provenance, format: TableFormat): string {
  return format === "csv" ? toCsv(table, provenance) : toJson(table, provenance);
}

function toCsv({ columns, rows }: Table, provenance: Provenance): string {
  return provenanceLines(provenance) + [columns, ...rows].map(csvRecord).join("");
}

function toJson({ columns, rows }: Table, provenance: Provenance): string {
  const objects = rows.map((row) => Object.fromEntries(columns.map((column, i) => [column, jsonValue(row[i])])));
  return `${JSON.stringify({ provenance, rows: objects }, null, 2)}\n`;
}

function jsonValue(cell: Cell): string | number | null {
  if (typeof cell === "bigint") return Number(cell);
  return typeof cell === "number" ? Number(cell.toPrecision(12)) : (cell ?? null);
}
