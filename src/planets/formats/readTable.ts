import { splitLines } from "../splitLines.ts";
import { readDelimited } from "./delimited.ts";
import { LineReader } from "./lineReader.ts";
import type { RawTable } from "./rawTable.ts";

/** The table in a text, by the reader of the format that its beginning shows. */
export async function readTable(text: AsyncIterable<string>, file: string): Promise<RawTable> {
  return readDelimited(new LineReader(splitLines(text, file)), file);
}
