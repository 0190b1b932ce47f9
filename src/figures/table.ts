import { escapeHtml } from "./escape.ts";
import type { FigureValue } from "./figureSpec.ts";
import { formatCount, formatValue } from "./formatValue.ts";

/** A page stays usable with this many rows; the output file of the same run holds all. */
export const tableRowLimit = 10_000;

export interface PageTable {
  /** Unique on the page. */
  readonly id: string;
  readonly caption: string;
  readonly columns: readonly TableColumn[];
  /** The first cell names the row. */
  readonly rows: readonly (readonly FigureValue[])[];
}

export interface TableColumn {
  readonly title: string;
  readonly unit?: string;
  /** Numbers line up on the right. */
  readonly numeric?: boolean;
  /** Significant digits of plain numbers. */
  readonly digits?: number;
  /** Sentences need room. */
  readonly wide?: boolean;
}

/**
 * A table in a region of its own that scrolls with the keyboard, under a header that stays in view. Cells are
 * untrusted text.
 */
export function tableHtml({ id, caption, columns, rows }: PageTable): string {
  const shown = rows.slice(0, tableRowLimit);
  const cut =
    shown.length < rows.length ? `; the first ${formatCount(shown.length)} of ${formatCount(rows.length)} rows` : "";
  const head = columns.map((column) => `<th scope="col"${classAttribute(column)}>${columnTitle(column)}</th>`).join("");
  const body = shown.map((row) => rowHtml(row, columns)).join("\n");
  const long = shown.length > 300 ? " long" : "";
  return `<div class="table-region${long}" role="region" aria-labelledby="${id}-caption" tabindex="0">
<table id="${id}">
<caption id="${id}-caption"><span>${escapeHtml(caption + cut)}</span></caption>
<thead><tr>${head}</tr></thead>
<tbody>
${body}
</tbody>
</table>
</div>`;
}

export function columnTitle({ title, unit }: TableColumn): string {
  return unit ? `${escapeHtml(title)} <span class="unit">(${escapeHtml(unit)})</span>` : escapeHtml(title);
}

function rowHtml(row: readonly FigureValue[], columns: readonly TableColumn[]): string {
  const cells = row.map((value, i) => {
    const text = `<bdi>${escapeHtml(formatValue(value, columns[i]?.digits))}</bdi>`;
    if (i === 0) return `<th scope="row"${classAttribute(columns[0])}>${text}</th>`;
    return value === null ? "<td></td>" : `<td${classAttribute(columns[i])}>${text}</td>`;
  });
  return `<tr>${cells.join("")}</tr>`;
}

function classAttribute(column?: TableColumn): string {
  const name = cellClass(column);
  return name === "" ? "" : ` class="${name}"`;
}

export function cellClass(column?: TableColumn): string {
  if (column?.numeric) return "number";
  return column?.wide ? "sentence" : "";
}
