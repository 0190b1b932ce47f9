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
    const counts = joinQuoted(lines, dialect).map((line) => countCells(line, dialect));
    const first = counts[0] ?? 1;
    const agreement = first < 2 ? 0 : counts.filter((count) => count === first).length / counts.length;
    if (agreement > best.agreement) best = { agreement, dialect };
  }
  return best.dialect;
}

export function dialectOf(format: ListFormat, delimiter: string, lines: readonly string[] = []): Dialect {
  const isBlank = delimiter === " ";
  const isPadded =
    !isBlank &&
    lines.map(withoutQuoted).some((line) => line.includes(`${delimiter} `) || line.includes(` ${delimiter}`));
  // As in Markdown, where every line begins and ends with a bar.
  const isBoxed = delimiter === "|" && lines.length > 0 && lines.every((line) => /^\s*\|.*\|\s*$/.test(line));
  const padding = delimiter === "\t" ? " " : " \t";
  const opensCell = (text: string, quote: number): boolean => {
    let before = quote - 1;
    if (isPadded || isBlank) while (before >= 0 && padding.includes(text.charAt(before))) before--;
    return before < 0 || text.charAt(before) === delimiter || (isBlank && before < quote - 1);
  };
  return {
    format,
    delimiter,
    isPadded,
    prepare: isBlank ? collapseBlanks : isBoxed ? withoutOuterBars : (text) => text,
    endsInsideQuotes: (text, startsInside) => endsInsideQuotes(text, startsInside, opensCell),
  };
}

/** Lines whose quoted cells are complete. */
function joinQuoted(lines: readonly string[], dialect: Dialect): string[] {
  const joined: string[] = [];
  let open = "";
  for (const line of lines) {
    const text = open + line;
    open = dialect.endsInsideQuotes(line, open !== "") ? `${text}\n` : "";
    if (open === "") joined.push(text);
  }
  return joined;
}

/** Quoted text replaced, also what is quoted to the end because the cell goes on in the next line. */
const withoutQuoted = (line: string): string => line.replace(/"(?:[^"]|"")*(?:"|$)/g, "q");

const countCells = (line: string, dialect: Dialect): number =>
  dialect.prepare(withoutQuoted(line)).split(dialect.delimiter).length;

const withoutOuterBars = (text: string): string => text.trim().replace(/^\||\|$/g, "");

const collapseBlanks = (text: string): string =>
  text.trim().replace(/("(?:[^"]|"")*")|[ \t]+/g, (_blanks, quoted: string | undefined) => quoted ?? " ");

/** A quote opens a cell only at its start, and is doubled inside one. */
function endsInsideQuotes(
  text: string,
  startsInside: boolean,
  opensCell: (text: string, quote: number) => boolean,
): boolean {
  let inside = startsInside;
  for (let at = text.indexOf('"'); at !== -1; at = text.indexOf('"', at + 1)) {
    if (!inside) inside = opensCell(text, at);
    else if (text.charAt(at + 1) === '"') at++;
    else inside = false;
  }
  return inside;
}
