import { readPlainNumber } from "../numberCell.ts";
import type { Line } from "../splitLines.ts";

export const isComment = (text: string): boolean => /^\s*"?#/.test(text);

const SHOWN_LINES = 5;

/**
 * Tells rows of names such as `#1 Aster b` from comments, below the header of a list: a row has as many cells as the
 * header, and a number among them. Whatever is decided is noted, because either could be meant otherwise.
 */
export class CommentedLines {
  private readonly split: (text: string) => readonly string[];
  private readonly width: number;
  private readonly rows: number[] = [];
  private readonly comments: number[] = [];

  constructor(split: (text: string) => readonly string[], width: number) {
    this.split = split;
    this.width = width;
  }

  isComment({ text, number }: Line): boolean {
    if (!isComment(text)) return false;
    const cells = this.split(text);
    const isRow = cells.length === this.width && cells.slice(1).some((cell) => readPlainNumber(cell) !== undefined);
    (isRow ? this.rows : this.comments).push(number);
    return !isRow;
  }

  get notes(): string[] {
    return [...note(this.rows, "rows, having a cell for every column"), ...note(this.comments, "comments")];
  }
}

function note(lines: readonly number[], consequence: string): string[] {
  if (lines.length === 0) return [];
  const shown = lines.slice(0, SHOWN_LINES).join(", ") + (lines.length > SHOWN_LINES ? ", ..." : "");
  const count = lines.length === 1 ? "1 line" : `${lines.length} lines`;
  return [`${count} below the header beginning with # taken for ${consequence}; see line ${shown}`];
}
