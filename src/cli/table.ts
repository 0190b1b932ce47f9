import { type Cell, csvRecord } from "./csv.ts";
import { type Provenance, provenanceLines } from "./provenance.ts";

export interface Table {
  readonly columns: readonly string[];
  readonly rows: readonly (readonly Cell[])[];
  /** What only JSON has room for, one a row. */
  readonly details?: readonly object[];
}

export type TableFormat = "csv" | "json";

/** A table with its provenance as text: CSV after `# ` lines, or one JSON object. */
export function formatTable(table: Table, provenance: Provenance, format: TableFormat): string {
  return format === "csv" ? toCsv(table, provenance) : toJson(table, provenance);
}

function toCsv({ columns, rows }: Table, provenance: Provenance): string {
  return provenanceLines(provenance) + [columns, ...rows].map(csvRecord).join("");
}

function toJson({ columns, rows, details }: Table, provenance: Provenance): string {
  const objects = rows.map((row, r) => ({
    ...Object.fromEntries(columns.map((column, i) => [column, jsonValue(row[i])])),
    ...details?.[r],
  }));
  return `${JSON.stringify({ provenance, rows: objects }, roundedNumbers, 2)}\n`;
}

function jsonValue(cell: Cell): string | number | null {
  return typeof cell === "bigint" ? Number(cell) : (cell ?? null);
}

/** As many digits as in CSV. */
function roundedNumbers(_key: string, value: unknown): unknown {
  return typeof value === "number" ? Number(value.toPrecision(12)) : value;
}
