import type { ColumnExplanation } from "../planets/explainColumns.ts";
import { ambiguousColumns, explainPlanetList } from "../planets/readPlanetList.ts";
import { readBytes } from "./inputFile.ts";
import type { Io } from "./io.ts";
import type { PlanetListFile } from "./planetListFile.ts";
import { provenanceOf } from "./provenance.ts";
import { emitTable, type GlobalOptions, type ResultOptions, tell } from "./resultOptions.ts";
import type { Table } from "./table.ts";

/**
 * Prints what each column of the lists is taken for. Throws InputError `ambiguous-column` afterwards if one could only
 * be guessed, as reading the list would.
 */
export async function explainLists(
  lists: readonly PlanetListFile[],
  options: GlobalOptions & ResultOptions,
  { io, args }: { io: Io; args: readonly string[] },
): Promise<void> {
  const explained = [];
  for (const list of lists) {
    explained.push({ list, ...(await explainPlanetList(readBytes(list.path, io), list.reader)) });
  }
  const notes = explained.flatMap(({ list, notes, format }) => [
    `${list.reader.file} is read as ${format}`,
    ...list.notes,
    ...notes,
  ]);
  tell(notes, options, io);
  const table = explainTable(explained.map(({ list, columns }) => ({ file: list.reader.file, columns })));
  await emitTable(table, provenanceOf({ args, earthRadius: options.earthRadiusKm, notes }), options, io);
  for (const { list, ambiguities } of explained) {
    if (ambiguities.length > 0) throw ambiguousColumns(list.reader.file, ambiguities);
  }
}

function explainTable(lists: readonly { file: string; columns: readonly ColumnExplanation[] }[]): Table {
  return {
    columns: ["list", "number", "column", "role", "meaning", "unit", "unit_source", "perhaps", "sample"],
    rows: lists.flatMap(({ file, columns }) =>
      columns.map(({ number, column, role, meaning, unit, unitSource, perhaps, sample }) => [
        file,
        BigInt(number),
        column,
        role,
        meaning,
        unit,
        unitSource,
        perhaps,
        sample,
      ]),
    ),
  };
}
