import type { RawRecord, RawTable } from "./rawTable.ts";
import { failedQuery, noTable } from "./votableErrors.ts";
import { VotableReader } from "./votableReader.ts";

export const isVotable = (head: string): boolean =>
  /^\s*(?:<\?xml|<!DOCTYPE\s+VOTABLE|<(?:\w+:)?VOTABLE|<!--)/.test(head);

/**
 * VOTable 1.1 to 1.5 with TABLEDATA, BINARY or BINARY2 data: the first table with fields is read, as a stream.
 * Entities other than XML's own five are errors and nothing outside the file is ever fetched.
 * Source  IVOA Recommendation VOTable 1.5, https://www.ivoa.net/documents/VOTable/
 * Throws  `xml-malformed`, `votable-no-table`, `votable-query-failed`, `votable-external-data`, `votable-field`,
 *         `votable-data`, `line-too-long`
 */
export async function readVotable(text: AsyncIterable<string>, file: string): Promise<RawTable> {
  const reader = new VotableReader(file);
  const chunks = text[Symbol.asyncIterator]();
  let next = await chunks.next();
  for (; !next.done; next = await chunks.next()) {
    reader.write(next.value);
    if (reader.hasFields) break;
  }
  if (next.done) reader.end();
  if (!reader.hasFields) throw reader.failure === undefined ? noTable(file) : failedQuery(file, reader.failure);
  async function* batches(): AsyncGenerator<RawRecord[]> {
    yield reader.takeRecords();
    if (next.done) return;
    for (let more = await chunks.next(); !more.done; more = await chunks.next()) {
      reader.write(more.value);
      yield reader.takeRecords();
    }
    reader.end();
    yield reader.takeRecords();
  }
  return { format: "votable", columns: reader.fields, notes: reader.notes, batches: batches() };
}
