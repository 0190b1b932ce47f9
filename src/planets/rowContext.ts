import type { ColumnPlan, ListConventions } from "./columnPlan.ts";
import type { ListFormat, RawColumn, RawRecord } from "./formats/rawTable.ts";
import type { Origin, RowIssue } from "./quantity.ts";

/** What is the same for all rows of a list. */
export interface ListContext {
  readonly file: string;
  readonly format: ListFormat;
  readonly columns: readonly RawColumn[];
  readonly plan: ColumnPlan;
  readonly conventions: ListConventions;
}

/** One record on its way to a planet row: its cells, and the issues found in them so far. */
export class RowContext {
  readonly list: ListContext;
  readonly line: number;
  readonly cells: readonly string[];
  readonly issues: RowIssue[] = [];

  constructor(record: RawRecord, list: ListContext) {
    this.list = list;
    this.line = record.line;
    this.cells = record.cells;
  }

  place(index: number): Origin {
    return { file: this.list.file, line: this.line, column: this.list.columns[index]?.name ?? "" };
  }

  report(code: string, index: number, message: string): void {
    this.issues.push({ code, origin: this.place(index), found: this.cells[index] ?? "", message });
  }
}
