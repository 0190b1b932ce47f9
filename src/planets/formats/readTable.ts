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

/** Beginnings of files that are something else, as Windows-1252 or UTF-8 text has them. */
const otherFormats: readonly { readonly starts: readonly string[]; readonly what: string; readonly remedy: string }[] =
  [
    {
      starts: ["PK\u0003\u0004"],
      what: "a spreadsheet or zip file",
      remedy: "save the sheet as CSV, or unpack the file",
    },
    { starts: ["ÐÏ\u0011à"], what: "an old spreadsheet", remedy: "save the sheet as CSV" },
    { starts: ["BZh", "ý7zXZ", "(µ/ý"], what: "compressed in a way other than gzip", remedy: "unpack the file first" },
    { starts: ["SIMPLE  ="], what: "a FITS file", remedy: "convert the table to VOTable or CSV" },
    { starts: ["%PDF"], what: "a PDF document", remedy: "fetch the table itself" },
    {
      starts: ["<!DOCTYPE HTML", "<HTML"],
      what: "a web page",
      remedy: "it may be an error message; fetch the table itself",
    },
    { starts: ["{", "["], what: "JSON", remedy: "fetch the table as CSV or VOTable" },
  ];

function refuseOtherFormats(head: string, file: string): void {
  const start = head.slice(0, 1000).trimStart().toUpperCase();
  const other = otherFormats.find(({ starts }) => starts.some((sign) => start.startsWith(sign.toUpperCase())));
  const binary = { what: "a binary file", remedy: "save the table as text" };
  const found = other ?? (head.includes("\0") ? binary : undefined);
  if (found === undefined) return;
  const message = `${file}: this is ${found.what}, not a planet list; ${found.remedy}`;
  throw new InputError("unsupported-format", message, { file, found: head.slice(0, 80) });
}
