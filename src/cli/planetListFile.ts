import type { ColumnChoices } from "../planets/columnChoices.ts";
import type { QuantityName } from "../planets/quantity.ts";
import { type PlanetList, type ListOptions as ReaderOptions, readPlanetList } from "../planets/readPlanetList.ts";
import { readColumnMapping } from "./columnMapping.ts";
import { inputName, readBytes } from "./inputFile.ts";
import type { Io } from "./io.ts";
import type { ListOptions } from "./listOptions.ts";
import type { GlobalOptions } from "./resultOptions.ts";

/** A planet list of the user's, and all that is said about its columns before it is read. */
export interface PlanetListFile {
  readonly path: string;
  readonly reader: ReaderOptions;
  /** The list, and its mapping file if there is one. */
  readonly inputs: readonly string[];
  readonly notes: readonly string[];
}

/** Options win over the mapping file beside the list, column by column. */
export async function planetListFile(
  path: string,
  options: ListOptions & GlobalOptions,
  io: Io,
  needs?: readonly QuantityName[],
): Promise<PlanetListFile> {
  const { file, ...mapping } = await readColumnMapping(path, io);
  const choices: ColumnChoices = {
    columnChoices: { ...mapping.columnChoices, ...options.column },
    unitChoices: { ...mapping.unitChoices, ...options.unit },
  };
  return {
    path,
    reader: { file: inputName(path), earthRadius: options.earthRadiusKm.value, needs, ...choices },
    inputs: file === undefined ? [path] : [path, file],
    notes: file === undefined ? [] : [`columns of ${inputName(path)} as ${file} says`],
  };
}

export async function openPlanetList({ path, reader, notes }: PlanetListFile, io: Io): Promise<PlanetList> {
  const list = await readPlanetList(readBytes(path, io), reader);
  return { ...list, notes: [...notes, ...list.notes] };
}
