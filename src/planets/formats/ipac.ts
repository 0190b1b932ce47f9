import { InputError } from "../../errors.ts";
import type { LineReader } from "./lineReader.ts";
import type { RawColumn, RawRecord, RawTable } from "./rawTable.ts";

interface IpacColumn extends RawColumn {
  readonly start: number;
  readonly end: number;
  readonly missing?: string;
}

/**
 * Keyword or comment lines with backslashes may come first; then one to four header lines that begin and end with a bar.
 * Text whose data lines begin with bars as well is separated by bars.
 */
export function isIpac(head: string): boolean {
  const lines = head.split(/\r\n|\n|\r/);
  const start = lines.findIndex((line) => !line.startsWith("\\"));
  const table = lines.slice(start);
  const headerEnd = table.findIndex((line) => !line.startsWith("|"));
  const header = table.slice(0, headerEnd === -1 ? table.length : headerEnd);
  const isBarred = header.length >= 1 && header.length <= 4 && header.every((line) => /\|\s*$/.test(line.slice(1)));
  if (!isBarred || header[1] === undefined) return isBarred;
  return !markdownRule.test(header[1]) && header[1].split("|").every((cell) => typeWord.test(cell));
}

/** Markdown tables have a line of nothing but dashes where the types would stand. */
const markdownRule = /^\|(?:\s*-+\s*\|)+\s*$/;

const typeWord = /^[\s-]*(?:d|double|r|real|f|float|i|int|l|long|c|char|date)?[\s-]*$/i;

/**
 * Table of the Infrared Processing and Analysis Center: up to four header lines (names, types, units, nulls) whose bars
 * set fixed columns.
 * Source  IPAC Table Format, https://irsa.ipac.caltech.edu/applications/DDGEN/Doc/ipac_tbl.html
 * Throws  `ipac-header`
 */
export async function readIpac(lines: LineReader, file: string): Promise<RawTable> {
  await lines.takeWhile((line) => line.text.startsWith("\\"));
  const header = await lines.takeWhile((line) => line.text.startsWith("|"));
  const [names, , units, nulls] = header.map((line) => line.text);
  const bars = [...(names ?? "").matchAll(/\|/g)].map((match) => match.index);
  if (header.length > 4 || bars.length < 2) throw badHeader(file, header[0]?.number, names);
  const columns = bars.slice(0, -1).map((bar, index): IpacColumn => {
    const start = bar + 1;
    const end = bars[index + 1] ?? start;
    const unit = clean(units?.slice(start, end));
    return {
      name: clean(names?.slice(start, end)),
      unit: unit === "" ? undefined : unit,
      missing: clean(nulls?.slice(start, end)),
      start,
      end,
    };
  });
  return { format: "ipac", columns, batches: readRecords(lines, columns) };
}

/** Names may be padded with dashes as well as blanks. */
const clean = (text = ""): string =>
  text
    .trim()
    .replace(/^-+(?=\D)|-+$/g, "")
    .trim();

async function* readRecords(lines: LineReader, columns: readonly IpacColumn[]): AsyncGenerator<RawRecord[]> {
  for await (const batch of lines.rest()) {
    yield batch
      .filter((line) => line.text.trim() !== "" && !line.text.startsWith("\\"))
      .map((line) => ({ line: line.number, cells: columns.map((column) => readCell(line.text, column)) }));
  }
}

function readCell(text: string, { start, end, missing }: IpacColumn): string {
  const cell = text.slice(start, end).trim();
  return cell === missing || cell === "null" ? "" : cell;
}

const badHeader = (file: string, line: number | undefined, found: string | undefined): InputError =>
  new InputError(
    "ipac-header",
    `${file}, line ${line ?? 1}: not a header of an IPAC table; it has up to four lines of bars`,
    {
      file,
      line,
      found,
    },
  );
