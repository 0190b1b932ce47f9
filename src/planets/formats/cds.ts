import { InputError } from "../../errors.ts";
import type { Line } from "../splitLines.ts";
import type { LineReader } from "./lineReader.ts";
import type { RawColumn, RawRecord, RawTable } from "./rawTable.ts";

interface CdsColumn extends RawColumn {
  /** Byte positions, from 0, the end excluded. */
  readonly start: number;
  readonly end: number;
  /** What the table writes for a missing value, beside blanks. */
  readonly missing?: string;
}

export const isCds = (head: string): boolean => /^[ \t]*Byte-by-byte Description/im.test(head);

const isRule = (line: Line): boolean => /^\s*(?:-{20,}|={20,})\s*$/.test(line.text);

/**
 * Table of the CDS and the AAS journals: a byte-by-byte description, notes, then lines of fixed columns.
 * Source  Standards for Astronomical Catalogues, version 2.0, section 3.3, https://cds.unistra.fr/doc/catstd.htx
 * Throws  `cds-description`, `cds-no-data`, `several-tables`
 */
export async function readCds(lines: LineReader, file: string): Promise<RawTable> {
  await lines.takeWhile((line) => !/Byte-by-byte Description/i.test(line.text));
  const start = await lines.next();
  await lines.takeWhile((line) => !/^\s*Bytes\b/i.test(line.text));
  await lines.next();
  await lines.next();
  const description = await lines.takeWhile((line) => !isRule(line));
  const columns = readColumns(description, file);
  if (columns.length === 0) throw badDescription(file, start, "describes no column");
  await lines.next();
  await skipNotes(lines, file);
  return { format: "cds", columns, batches: readRecords(lines, columns, file) };
}

const columnLine = /^\s*(?:(\d+)\s*-\s*)?(\d+)\s+([A-Z]\d*(?:\.\d+)?)\s+(\S+)\s+(\S+)(?:\s+(.*))?$/i;
/** An explanation may begin with the range of values and, after `?`, the value that stands for a missing one. */
const missingMark = /^(?:[[\]][^[\]]*[[\]]\s*)?\?(?:=(\S+))?/;

function readColumns(description: readonly Line[], file: string): CdsColumn[] {
  const columns: CdsColumn[] = [];
  for (const line of description) {
    const match = columnLine.exec(line.text);
    const previous = columns.at(-1);
    if (match === null && previous !== undefined) {
      columns[columns.length - 1] = { ...previous, description: `${previous.description ?? ""} ${line.text.trim()}` };
    }
    if (match === null) continue;
    const [, first, last = "0", , unit = "---", name = "", explanation = ""] = match;
    const column = {
      name,
      unit: /^-+$/.test(unit) ? undefined : unit,
      description: explanation.trim(),
      missing: missingMark.exec(explanation)?.[1],
      start: Number(first ?? last) - 1,
      end: Number(last),
    };
    if (!(column.start >= 0 && column.end > column.start))
      throw badDescription(file, line, `"${line.text.trim()}" has no valid bytes`);
    columns.push(column);
  }
  return columns;
}

const preface = /^\s*(?:Note|Global note|Acknowledg|History|Reference|See also|\(End\))/i;

/** Between the description and the data stand notes and the like, each closed by a rule. */
async function skipNotes(lines: LineReader, file: string): Promise<void> {
  for (;;) {
    await lines.takeWhile((line) => line.text.trim() === "" || isRule(line));
    const [next] = await lines.peek(1);
    if (next === undefined) throw noData(file);
    if (!preface.test(next.text)) return;
    await lines.takeWhile((line) => !isRule(line));
  }
}

async function* readRecords(
  lines: LineReader,
  columns: readonly CdsColumn[],
  file: string,
): AsyncGenerator<RawRecord[]> {
  for await (const batch of lines.rest()) {
    const described = batch.find((line) => /Byte-by-byte Description/i.test(line.text));
    if (described !== undefined) throw severalTables(file, described);
    yield batch
      .filter((line) => line.text.trim() !== "")
      .map((line) => ({ line: line.number, cells: columns.map((column) => readCell(line.text, column)) }));
  }
}

function readCell(text: string, { start, end, missing }: CdsColumn): string {
  const cell = text.slice(start, end).trim();
  const isMissing = missing !== undefined && cell !== "" && (cell === missing || Number(cell) === Number(missing));
  return isMissing ? "" : cell;
}

const badDescription = (file: string, line: Line | undefined, reason: string): InputError =>
  new InputError("cds-description", `${file}, line ${line?.number ?? 1}: the byte-by-byte description ${reason}`, {
    file,
    line: line?.number,
    found: line?.text,
  });

const noData = (file: string): InputError =>
  new InputError(
    "cds-no-data",
    `${file}: no data follow the byte-by-byte description and its notes; if they are in a file of their own, ` +
      "append them after a line of dashes",
    { file },
  );

const severalTables = (file: string, line: Line): InputError =>
  new InputError(
    "several-tables",
    `${file}, line ${line.number}: a second table begins; put each table in a file of its own`,
    {
      file,
      line: line.number,
    },
  );
