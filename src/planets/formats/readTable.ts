import { InputError } from "../../errors.ts";
import { splitLines } from "../splitLines.ts";
import { isCds, readCds } from "./cds.ts";
import { readDelimited } from "./delimited.ts";
import { isEcsv, readEcsv } from "./ecsv.ts";
import { isIpac, readIpac } from "./ipac.ts";
import { LineReader } from "./lineReader.ts";
import type { RawTable } from "./rawTable.ts";
import { isVotable, readVotable } from "./votable.ts";

const HEAD_CHARACTERS = 2 ** 16;

/** Formats of lines, each with the sign by which it is known; delimited text is what is left. */
const lineFormats = [
  { isFormat: isEcsv, read: readEcsv },
  { isFormat: isCds, read: readCds },
  { isFormat: isIpac, read: readIpac },
  { isFormat: () => true, read: readDelimited },
];

/** The table in a text, by the reader of the format that its beginning shows. Throws `unsupported-format`. */
export async function readTable(text: AsyncIterable<string>, file: string): Promise<RawTable> {
  const { head, all } = await peek(text);
  refuseOtherFormats(head, file);
  if (isVotable(head)) return readVotable(all, file);
  const format = lineFormats.find(({ isFormat }) => isFormat(head));
  return (format?.read ?? readDelimited)(new LineReader(splitLines(all, file), file), file);
}

async function peek(text: AsyncIterable<string>): Promise<{ head: string; all: AsyncIterable<string> }> {
  const iterator = text[Symbol.asyncIterator]();
  let head = "";
  while (head.length < HEAD_CHARACTERS) {
    const next = await iterator.next();
    if (next.done) break;
    head += next.value;
  }
  async function* all(): AsyncGenerator<string> {
    yield head;
    yield* { [Symbol.asyncIterator]: () => iterator };
  }
  return { head, all: all() };
}

const otherFormats: readonly (readonly [RegExp, what: string, remedy: string])[] = [
  [/^PK\x03\x04/, "a spreadsheet or zip file", "save the sheet as CSV, or unpack the file"],
  [/^\xd0\xcf\x11\xe0|^ÐÏ/, "an old spreadsheet", "save the sheet as CSV"],
  [/^BZh\d|^\xfd7zXZ|^ý7zXZ|^\x28\xb5\x2f\xfd|^\(µ\/ý/, "compressed in a way other than gzip", "unpack the file first"],
  [/^SIMPLE\s+=/, "a FITS file", "convert the table to VOTable or CSV"],
  [/^%PDF/, "a PDF document", "fetch the table itself"],
  [/^\s*<(?:!doctype\s+html|html)/i, "a web page", "it may be an error message of the archive; fetch the table itself"],
  [/^\s*[{[]\s*["{[]/, "JSON", "fetch the table as CSV or VOTable"],
  // biome-ignore lint/suspicious/noControlCharactersInRegex: a NUL is what tells a binary file from a text
  [/\0/, "a binary file", "save the table as text"],
];

function refuseOtherFormats(head: string, file: string): void {
  const other = otherFormats.find(([pattern]) => pattern.test(head));
  if (other === undefined) return;
  const [, what, remedy] = other;
  throw new InputError("unsupported-format", `${file}: this is ${what}, not a planet list; ${remedy}`, { file, found: head.slice(0, 80) });
}
