import { escapeHtml, jsonForScript } from "./escape.ts";
import type { FigureValue } from "./figureSpec.ts";
import { formatValue } from "./formatValue.ts";
import type { PageTable, TableColumn } from "./table.ts";
import { cellClass, columnTitle } from "./table.ts";
import { visibleText } from "./visibleText.ts";

/** A long table that the reader sorts and filters; the page holds all of its rows but shows some at a time. */
export interface ExplorableTable extends PageTable {
  readonly columns: readonly ExplorableColumn[];
  /** What the rows are, for the counts: `findings`. */
  readonly noun: string;
}

export interface ExplorableColumn extends TableColumn {
  /** The reader may choose one of the column's values. */
  readonly isChoice?: boolean;
  /** The values from first to last, where that is not the alphabet. */
  readonly order?: readonly string[];
}

/** What the script in the page reads. Texts are stored once, since most cells repeat; a cell is its text's place. */
export interface ExplorerData {
  readonly noun: string;
  readonly columns: readonly { numeric: boolean; className: string; order: readonly string[] | null }[];
  readonly texts: readonly string[];
  readonly rows: readonly (readonly number[])[];
}

/** The table with its controls, and the data block that belongs to it: cells are untrusted text. */
export function explorer(table: ExplorableTable): { html: string; data: Readonly<Record<string, string>> } {
  const data = explorerData(table);
  return { html: explorerHtml(table, data), data: { [`${table.id}-data`]: jsonForScript(data) } };
}

function explorerData({ noun, columns, rows }: ExplorableTable): ExplorerData {
  const places = new Map<string, number>();
  const place = (value: FigureValue, column: ExplorableColumn | undefined): number => {
    const text = visibleText(formatValue(value, column?.digits));
    const known = places.get(text);
    if (known !== undefined) return known;
    places.set(text, places.size);
    return places.size - 1;
  };
  const cells = rows.map((row) => row.map((value, i) => place(value, columns[i])));
  return {
    noun,
    columns: columns.map((column) => ({
      numeric: column.numeric ?? false,
      className: cellClass(column),
      order: column.order ?? null,
    })),
    texts: [...places.keys()],
    rows: cells,
  };
}

function explorerHtml({ id, caption, columns, noun }: ExplorableTable, { texts, rows }: ExplorerData): string {
  const choices = columns.flatMap((column, i) => {
    if (!column.isChoice) return [];
    const present = [...new Set(rows.map((row) => row[i] ?? 0))];
    return [choiceHtml(column, i, sorted(present, texts, column.order), texts)];
  });
  const head = columns.map(
    (column) =>
      `<th scope="col" class="${cellClass(column)}"><button type="button">${columnTitle(column)}</button></th>`,
  );
  return `<div class="explorer" data-table="${id}">
<div class="controls" role="search" aria-label="Filter ${noun}">
${choices.join("\n")}
<label>Text <input type="search" autocomplete="off" spellcheck="false"></label>
</div>
<p class="pager"><button type="button" data-step="-1">Previous</button> <button type="button" data-step="1">Next</button> <span role="status"></span></p>
<noscript><p>This table needs JavaScript; the output file of the same run holds the same rows.</p></noscript>
<div class="table-region" role="region" aria-labelledby="${id}-caption" tabindex="0">
<table id="${id}">
<caption id="${id}-caption"><span>${escapeHtml(caption)}</span></caption>
<thead><tr>${head.join("")}</tr></thead>
<tbody></tbody>
</table>
</div>
</div>`;
}

function choiceHtml({ title }: ExplorableColumn, column: number, values: readonly number[], texts: readonly string[]) {
  const options = values.map((value) => `<option value="${value}">${escapeHtml(texts[value] || "(none)")}</option>`);
  return `<label>${escapeHtml(title)} <select data-column="${column}"><option value="">all</option>${options.join("")}</select></label>`;
}

function sorted(places: readonly number[], texts: readonly string[], order: readonly string[] | undefined): number[] {
  const rank = (place: number) => order?.indexOf(texts[place] ?? "") ?? 0;
  return [...places].sort((a, b) => rank(a) - rank(b) || ((texts[a] ?? "") < (texts[b] ?? "") ? -1 : 1));
}
