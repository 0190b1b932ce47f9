import { readFileSync } from "node:fs";
import { decodeText } from "../../src/planets/decodeText.ts";
import type { RawColumn, RawRecord } from "../../src/planets/formats/rawTable.ts";
import { readTable } from "../../src/planets/formats/readTable.ts";
import type { PlanetRow } from "../../src/planets/quantity.ts";
import { type ListOptions, type PlanetList, readPlanetList } from "../../src/planets/readPlanetList.ts";
import { EARTH_RADIUS } from "../../src/units/constants.ts";

export type Content = string | Uint8Array;

const bytesOf = (content: Content): Uint8Array =>
  typeof content === "string" ? new TextEncoder().encode(content) : content;

/** A file as it comes from a disk or a network: in pieces of any size. */
export async function* inChunks(content: Content, size = 65536): AsyncGenerator<Uint8Array> {
  const bytes = bytesOf(content);
  for (let start = 0; start < bytes.length; start += size) yield bytes.subarray(start, start + size);
}

export const fixture = (name: string): Uint8Array => {
  const bytes = readFileSync(new URL(`../fixtures/planets/${name}`, import.meta.url));
  return new Uint8Array(bytes);
};

export interface ReadList extends Omit<PlanetList, "rows"> {
  readonly rows: readonly PlanetRow[];
}

export async function readList(
  content: Content,
  options: Partial<ListOptions> = {},
  chunkSize?: number,
): Promise<ReadList> {
  const list = await readPlanetList(inChunks(content, chunkSize), {
    file: "list",
    earthRadius: EARTH_RADIUS,
    ...options,
  });
  const rows: PlanetRow[] = [];
  for await (const row of list.rows) rows.push(row);
  return { ...list, rows };
}

/** The table as text cells, before anything is interpreted. */
export async function readRaw(
  content: Content,
  chunkSize?: number,
): Promise<{ format: string; columns: readonly RawColumn[]; records: RawRecord[] }> {
  const table = await readTable(decodeText(inChunks(content, chunkSize), "table"), "table");
  const records: RawRecord[] = [];
  for await (const batch of table.batches) records.push(...batch);
  return { format: table.format, columns: table.columns, records };
}

export const cellsOf = async (content: Content, chunkSize?: number): Promise<(readonly string[])[]> =>
  (await readRaw(content, chunkSize)).records.map((record) => record.cells);
