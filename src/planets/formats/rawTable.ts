/** How a list is written; recognised from its content, never from its name. */
export type ListFormat =
  | "comma-separated"
  | "tab-separated"
  | "semicolon-separated"
  | "bar-separated"
  | "blank-separated"
  | "ecsv"
  | "votable"
  | "cds"
  | "ipac";

export interface RawColumn {
  /** The header as written. */
  readonly name: string;
  /** The unit the file itself declares for the column, if it does. */
  readonly unit?: string;
  readonly description?: string;
}

export interface RawRecord {
  /** The line where the record starts, from 1. */
  readonly line: number;
  readonly cells: readonly string[];
}

/** What every format reader returns: a table of text cells that nobody has interpreted yet. */
export interface RawTable {
  readonly format: ListFormat;
  readonly columns: readonly RawColumn[];
  /** Batches, because one await per record would cost more than reading it. */
  readonly batches: AsyncIterable<readonly RawRecord[]>;
}
