/** Text, a computed number (12 significant digits), a whole number such as a row of a file, or nothing. */
export type Cell = string | number | bigint | undefined;

/**
 * One record of RFC 4180 with a line feed. Text is kept verbatim: a name that a spreadsheet would take for a formula
 * (`=…`) is not altered, since the name must find its planet again. `#` is quoted too, or readers that skip `# ` comment
 * lines would cut the record there.
 */
export function csvRecord(cells: readonly Cell[]): string {
  return `${cells.map(csvField).join(",")}\n`;
}

function csvField(cell: Cell): string {
  if (cell === undefined) return "";
  if (typeof cell === "number") return cell.toPrecision(12);
  if (typeof cell === "bigint") return String(cell);
  return /["#,\r\n]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell;
}
