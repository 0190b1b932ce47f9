/** Rows of text in columns two blanks apart, numbers to the right, for a person to read. */
export function textTable(header: readonly string[], rows: readonly (readonly (string | number)[])[]): string {
  const lines = [header, ...rows];
  const widths = header.map((_, column) => Math.max(...lines.map((line) => String(line[column]).length)));
  const isNumeric = header.map((_, column) => rows.every((row) => typeof row[column] === "number"));
  const pad = (cell: string | number, column: number) =>
    isNumeric[column] ? String(cell).padStart(widths[column]) : String(cell).padEnd(widths[column]);
  return lines.map((line) => `${line.map(pad).join("  ").trimEnd()}\n`).join("");
}
