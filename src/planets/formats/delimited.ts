import { parse } from "csv-parse/sync";
import { InputError } from "../../errors.ts";
import { isKnownColumn, quantityMeanings, textMeaning } from "../columnMeaning.ts";
import { quantityColumns } from "../columnTable.ts";
import { LINE_LIMIT, type Line } from "../splitLines.ts";
import { findUnit } from "../unitTable.ts";
import { CommentedLines, isComment } from "./commentedLines.ts";
import { type Dialect, detectDialect } from "./dialect.ts";
import type { LineReader } from "./lineReader.ts";
import type { RawColumn, RawRecord, RawTable } from "./rawTable.ts";

const SAMPLE_LINES = 50;
/** Records handed to csv-parse at once; larger blocks are no faster. */
const BLOCK_CHARACTERS = 2 ** 16;

/**
 * Text separated by commas, tabs, semicolons, bars or blanks, under `#` comments of any kind. The header may itself be
 * commented out; a row of units and a row of dashes may follow it.
 * Throws `empty-file`, `no-header`, `unclosed-quote`.
 */
export async function readDelimited(lines: LineReader, file: string): Promise<RawTable> {
  const comments = await lines.takeWhile((line) => isBlank(line) || isComment(line.text));
  const sample = (await lines.peek(SAMPLE_LINES)).filter((line) => !isBlank(line) && !isComment(line.text));
  if (sample.length === 0 && comments.every(isBlank)) throw emptyFile(file);
  const headerComment = uncomment(comments.findLast((line) => !isBlank(line))?.text ?? "");
  const dialect = detectDialect(sample.length > 0 ? sample.map((line) => line.text) : [headerComment]);
  const header = await takeHeader(lines, headerComment, dialect, file);
  const units = await takeUnits(lines, header, dialect);
  const described = describedColumns(comments);
  const columns = header.map((name, index): RawColumn => {
    const about = described.get(name);
    return { name, unit: units?.[index] || about?.unit, description: about?.description };
  });
  const commented = new CommentedLines((text) => splitCells(text, dialect), columns.length);
  const batches = parseRecords(lines.rest(), dialect, file, (line) => commented.isComment(line));
  return {
    format: dialect.format,
    columns,
    batches,
    get notes() {
      return commented.notes;
    },
  };
}

const isBlank = (line: Line): boolean => line.text.trim() === "";

/** A commented line without its mark, and without the delimiters that a spreadsheet pads it with. */
function uncomment(text: string): string {
  let end = text.length;
  while (end > 0 && ",;\t ".includes(text[end - 1] ?? "")) end--;
  return text.slice(0, end).replace(/^\s*"?#+\s*/, "");
}

async function takeHeader(lines: LineReader, headerComment: string, dialect: Dialect, file: string): Promise<string[]> {
  const [first] = await lines.peek(1);
  const { text, lineCount } = await peekHeader(lines, dialect);
  const cells = first === undefined ? [] : splitCells(text, dialect);
  const commented = splitCells(headerComment, dialect);
  const known = cells.filter(isKnownColumn).length;
  const numbers = cells.filter((cell) => cell.trim() !== "" && Number.isFinite(Number(cell))).length;
  if (commented.filter(isKnownColumn).length > known && (cells.length === 0 || commented.length === cells.length)) {
    return commented.map((cell) => cell.trim());
  }
  if (first === undefined) throw emptyFile(file);
  if (numbers > 0 && numbers >= known) throw noHeader(file, first);
  for (let i = 0; i < lineCount; i++) await lines.next();
  return cells.map((cell) => cell.trim());
}

/** The header with the lines over which its quoted cells go on as one; where no quote ends, its first line. */
async function peekHeader(lines: LineReader, dialect: Dialect): Promise<{ text: string; lineCount: number }> {
  const sample = await lines.peek(SAMPLE_LINES);
  let isOpen = false;
  for (const [index, { text }] of sample.entries()) {
    isOpen = dialect.endsInsideQuotes(text, isOpen);
    const header = sample.slice(0, index + 1).map((line) => line.text);
    if (!isOpen) return { text: header.join(" "), lineCount: index + 1 };
  }
  return { text: sample[0]?.text ?? "", lineCount: 1 };
}

/** The row of units under the header and the row of dashes under that, as some archives write them. */
async function takeUnits(
  lines: LineReader,
  header: readonly string[],
  dialect: Dialect,
): Promise<string[] | undefined> {
  const [first, second] = await lines.peek(2);
  const isDashes = (line: Line | undefined): boolean =>
    line !== undefined && splitCells(line.text, dialect).every((cell) => /^\s*:?-+:?\s*$/.test(cell));
  if (header.length > 1 && isDashes(first)) {
    await lines.next();
    return undefined;
  }
  const cells = first === undefined ? [] : splitCells(first.text, dialect).map((cell) => cell.trim());
  if (!isDashes(second) && !isUnitRow(cells, header)) return undefined;
  await lines.next();
  if (isDashes(second)) await lines.next();
  return cells;
}

/** Some column has a unit of its own kind where its numbers would stand, and no cell holds anything that is no unit. */
function isUnitRow(cells: readonly string[], header: readonly string[]): boolean {
  const isOwnUnit = cells.map((cell, index) => {
    const [meaning] = quantityMeanings(header[index] ?? "");
    return meaning !== undefined && findUnit(cell, quantityColumns[meaning.quantity].dimension) !== undefined;
  });
  const isBlank = (cell: string): boolean => /^-*$/.test(cell);
  const isText = (index: number): boolean => textMeaning(header[index] ?? "") !== undefined;
  const rest = cells.filter((_, index) => !isOwnUnit[index]);
  return (
    cells.length === header.length &&
    isOwnUnit.includes(true) &&
    rest.every((cell) => isBlank(cell) || findUnit(cell) !== undefined) &&
    cells.every((cell, index) => !isText(index) || isBlank(cell))
  );
}

/** `# COLUMN name: What it is [unit]` lines, as archives put them above a table. */
function describedColumns(comments: readonly Line[]): Map<string, Omit<RawColumn, "name">> {
  const described = new Map<string, Omit<RawColumn, "name">>();
  for (const { text } of comments) {
    const match = /^"?#\s*COLUMN\s+(\S+?)\s*:\s*([^"]{0,1000})/i.exec(text);
    if (match?.[1] === undefined || match[2] === undefined) continue;
    const unit = /\[([^\]]+)\]/.exec(match[2])?.[1];
    described.set(match[1], { description: match[2].replace(/,+$/, "").trim(), unit });
  }
  return described;
}

/** Records of the lines, quoted line ends included; blank and commented lines are no records. */
export async function* parseRecords(
  batches: AsyncIterable<Line[]>,
  dialect: Dialect,
  file: string,
  isSkipped = (line: Line): boolean => isComment(line.text),
): AsyncGenerator<RawRecord[]> {
  let open: { line: number; text: string } | undefined;
  for await (const batch of batches) {
    let block: { line: number; text: string }[] = [];
    let characters = 0;
    for (const lineRead of batch) {
      const { number, text, ending } = lineRead;
      if (open === undefined && (isBlank(lineRead) || isSkipped(lineRead))) continue;
      const start: { line: number; text: string } = open ?? { line: number, text: "" };
      const isOpen = dialect.endsInsideQuotes(text, open !== undefined);
      open = isOpen ? { line: start.line, text: start.text + text + ending } : undefined;
      if (open !== undefined && open.text.length > LINE_LIMIT) throw unclosedQuote(file, open.line);
      if (open !== undefined) continue;
      block.push({ line: start.line, text: start.text + text });
      characters += start.text.length + text.length;
      if (characters < BLOCK_CHARACTERS) continue;
      yield parseBlock(block, dialect);
      block = [];
      characters = 0;
    }
    if (block.length > 0) yield parseBlock(block, dialect);
  }
  if (open !== undefined) throw unclosedQuote(file, open.line);
}

function parseBlock(block: readonly { line: number; text: string }[], dialect: Dialect): RawRecord[] {
  const texts = block.map((record) => dialect.prepare(record.text));
  const hasQuotes = texts.some((text) => text.includes('"'));
  const parsed = hasQuotes ? parseCells(texts.join("\n"), dialect) : undefined;
  // Stray quotes can make csv-parse see other records than the lines hold; then each line is taken by itself.
  const records = parsed?.length === block.length ? parsed : texts.map((text) => splitPrepared(text, dialect));
  return records.map((cells, i) => ({ line: block[i]?.line ?? 0, cells }));
}

export const splitCells = (text: string, dialect: Dialect): string[] => splitPrepared(dialect.prepare(text), dialect);

/** Without a quote a record is just cells between delimiters: no need of a parser, which takes ten times as long. */
function splitPrepared(text: string, dialect: Dialect): string[] {
  const records = text.includes('"') ? parseCells(text, dialect) : undefined;
  if (records?.length === 1 && records[0] !== undefined) return records[0];
  const cells = text.split(dialect.delimiter);
  return dialect.isPadded ? cells.map((cell) => cell.trim()) : cells;
}

function parseCells(text: string, dialect: Dialect): string[][] | undefined {
  try {
    return parse(text, {
      delimiter: dialect.delimiter,
      trim: dialect.isPadded,
      relax_quotes: true,
      relax_column_count: true,
      record_delimiter: "\n",
    });
  } catch {
    return undefined;
  }
}

const emptyFile = (file: string): InputError =>
  new InputError("empty-file", `${file}: the list is empty; it needs a header line and one line per planet`, { file });

const noHeader = (file: string, first: Line): InputError =>
  new InputError(
    "no-header",
    `${file}, line ${first.number}: the first line holds numbers where the column names should be ` +
      `("${first.text.slice(0, 60)}"); add a line of column names such as name,mass_earth,radius_earth`,
    { file, line: first.number, found: first.text.slice(0, 200) },
  );

const unclosedQuote = (file: string, line: number): InputError =>
  new InputError("unclosed-quote", `${file}, line ${line}: a quote is opened here and never closed`, { file, line });
