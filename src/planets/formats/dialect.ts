import type { ListFormat } from "./rawTable.ts";

/** How a delimited text separates its cells. */
export interface Dialect {
  readonly format: ListFormat;
  readonly delimiter: string;
  /** Blanks around the delimiters are decoration, not part of the cells. */
  readonly isPadded: boolean;
  /** Makes a line fit for a parser that knows one-character delimiters only. */
  prepare(text: string): string;
  /** Whether a quoted cell is still open after `text`, which starts inside one or not. */
  endsInsideQuotes(text: string, startsInside: boolean): boolean;
}

/** In order of preference when several fit equally: the rarer a character is in text, the surer a sign. */
const candidates = [
  { format: "tab-separated", delimiter: "\t" },
  { format: "semicolon-separated", delimiter: ";" },
  { format: "comma-separated", delimiter: "," },
  { format: "bar-separated", delimiter: "|" },
  { format: "blank-separated", delimiter: " " },
] as const satisfies readonly { format: ListFormat; delimiter: string }[];

/** The delimiter under which most lines have as many cells as the first; commas if none separates anything. */
export function detectDialect(lines: readonly string[]): Dialect {
  let best = { agreement: 0, dialect: dialectOf("comma-separated", ",", lines) };
  for (const { format, delimiter } of candidates) {
    const dialect = dialectOf(format, delimiter, lines);
    const counts = lines.map((line) => countCells(line, dialect));
    const first = counts[0] ?? 1;
    const agreement = first < 2 ? 0 : counts.filter((count) => count === first).length / counts.length;
    if (agreement > best.agreement) best = { agreement, dialect };
  }
  return best.dialect;
}

export function dialectOf(format: ListFormat, delimiter: string, lines: readonly string[] = []): Dialect {
  const isBlank = delimiter === " ";
  const escaped = delimiter === "|" ? "\\|" : delimiter;
  const padding = new RegExp(`${escaped} | ${escaped}`);
  const isPadded = !isBlank && lines.some((line) => padding.test(line));
  const opening = new RegExp(isPadded || isBlank ? `(?:^|${escaped})[ \\t]*$` : `(?:^|${escaped})$`);
  return {
    format,
    delimiter,
    isPadded,
    prepare: isBlank ? collapseBlanks : (text) => text,
    endsInsideQuotes: (text, startsInside) => endsInsideQuotes(text, startsInside, opening),
  };
}

const countCells = (line: string, dialect: Dialect): number =>
  dialect.prepare(line.replace(/"(?:[^"]|"")*"/g, "q")).split(dialect.delimiter).length;

const collapseBlanks = (text: string): string =>
  text.trim().replace(/("(?:[^"]|"")*")|[ \t]+/g, (_blanks, quoted: string | undefined) => quoted ?? " ");

/** A quote opens a cell only at its start, and is doubled inside one. */
function endsInsideQuotes(text: string, startsInside: boolean, opening: RegExp): boolean {
  let inside = startsInside;
  for (let at = text.indexOf('"'); at !== -1; at = text.indexOf('"', at + 1)) {
    // A look back over 200 characters keeps the cost of a line with many quotes in bounds.
    if (!inside) inside = opening.test(text.slice(Math.max(0, at - 200), at));
    else if (text[at + 1] === '"') at++;
    else inside = false;
  }
  return inside;
}
