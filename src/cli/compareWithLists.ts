import { type ChosenRow, choosePublications } from "../crosscheck/choosePublication.ts";
import { compareLists } from "../crosscheck/compareLists.ts";
import { displayName } from "../crosscheck/displayUnits.ts";
import type { ListMatch } from "../crosscheck/listMatch.ts";
import { matchLists } from "../crosscheck/matchLists.ts";
import { pairColumns, pairRecords } from "../crosscheck/pairRecords.ts";
import { comparisonPage } from "../figures/comparisonPage.ts";
import type { Library } from "../library/library.ts";
import type { PlanetRow } from "../planets/quantity.ts";
import { parseAliases } from "./aliasFile.ts";
import { classifyRows, comparedCompositions, comparisonWith, defaultBoundaries } from "./classification.ts";
import type { CommandContext } from "./commandContext.ts";
import { comparisonSummary, matchSummary } from "./comparisonSummary.ts";
import type { CrosscheckOptions } from "./crosscheckOptions.ts";
import { inputName, readText } from "./inputFile.ts";
import type { Io } from "./io.ts";
import { writeOutputFile } from "./outputFile.ts";
import { openPlanetList, type PlanetListFile } from "./planetListFile.ts";
import { startProgress } from "./progress.ts";
import { provenanceOf, reproducingCommand } from "./provenance.ts";
import { recordCells } from "./recordTable.ts";
import { emitTable, summarise, tell } from "./resultOptions.ts";
import { version } from "./version.ts";

/** Matches a list with others, one after another, and says where they disagree. */
export async function compareWithLists(
  files: readonly PlanetListFile[],
  library: Library,
  options: CrosscheckOptions,
  { io, args }: CommandContext,
): Promise<void> {
  const earthRadius = options.earthRadiusKm;
  const aliases =
    options.aliases === undefined
      ? undefined
      : parseAliases(await readText(options.aliases, io), inputName(options.aliases));
  const lists: ChosenList[] = [];
  const notes = [...library.notes];
  for (const file of files) {
    const list = await openPlanetList(file, io);
    notes.push(...list.notes.map((note) => `${list.file}: ${note}`));
    lists.push(await chosenList(list.file, list.rows, options));
  }
  tell(notes, options, io);

  const [first, ...others] = lists as [ChosenList, ...ChosenList[]];
  const matches = others.map((other) => ({ other, match: matchLists(first.rows, other.rows, { aliases }) }));
  const models = comparisonWith(defaultBoundaries, library);
  const verdictOf = await verdicts(
    matches.map(({ match }) => match),
    models,
    options,
    io,
  );
  const results = matches.map(({ other, match }) => {
    const comparison = compareLists(match.pairs, (row) => verdictOf.get(row));
    const choiceOf = (row: PlanetRow) => first.choices.get(row) ?? other.choices.get(row);
    return {
      other: other.file,
      match,
      comparison,
      records: pairRecords(match, comparison, { earthRadius: earthRadius.value, choiceOf }),
    };
  });

  const summaries = results.map((result) => comparisonSummary(first.file, result));
  const version1 = "columns of compared lists, version 1";
  const provenance = provenanceOf({
    args,
    earthRadius,
    compositions: comparedCompositions(models),
    notes: [...notes, version1, ...summaries.flatMap((text) => text.trimEnd().split("\n"))],
  });
  const table = {
    columns: [...pairColumns, "list_other"],
    rows: results.flatMap(({ other, records }) =>
      records.map((record) => [...recordCells(record, pairColumns), other]),
    ),
  };
  await emitTable(table, provenance, options, io);
  if (options.html !== undefined) {
    const page = {
      list: first.file,
      comparisons: results.map(({ other, match, comparison, records }) => ({
        other,
        summary: matchSummary(first.file, other, match),
        records,
        pulls: comparison.pulls.map((pull) => ({ ...pull, quantity: displayName(pull.quantity) })),
        moved: comparison.verdicts.flatMap(({ pair, verdict, verdictOther, moved }) =>
          moved && verdict && verdictOther ? [{ name: pair.row.name, verdict, verdictOther }] : [],
        ),
      })),
      notes,
      made: {
        version,
        earthRadius: `1 Earth radius = ${earthRadius.value / 1e3} km`,
        command: reproducingCommand(args),
      },
    };
    await writeOutputFile(options.html, await comparisonPage(page));
  }
  summarise(summaries.join("\n"), options, io);
}

interface ChosenList {
  readonly file: string;
  readonly rows: readonly PlanetRow[];
  /** Where a planet has several publications, how its row was come by. */
  readonly choices: ReadonlyMap<PlanetRow, string>;
}

async function chosenList(
  file: string,
  rows: AsyncIterable<PlanetRow>,
  { choose = "preferred" }: CrosscheckOptions,
): Promise<ChosenList> {
  const all: PlanetRow[] = [];
  // Cells are the larger part of a row, and are not compared.
  for await (const row of rows) all.push({ ...row, cells: [] });
  const chosen: readonly ChosenRow[] = choosePublications(all, choose);
  return { file, rows: chosen.map(({ row }) => row), choices: new Map(chosen.map(({ row, choice }) => [row, choice])) };
}

/** Verdicts of all rows that found a partner. */
async function verdicts(
  matches: readonly ListMatch[],
  models: ReturnType<typeof comparisonWith>,
  { quiet }: CrosscheckOptions,
  io: Io,
): Promise<Map<PlanetRow, string | undefined>> {
  const rows = [...new Set(matches.flatMap(({ pairs }) => pairs.flatMap(({ row, other }) => [row, other])))];
  const progress = await startProgress(rows.length, io, quiet);
  const classified = await classifyRows(rows, models, progress).finally(() => progress.stop());
  return new Map(classified.map(({ row, result }) => [row, result.verdict?.code]));
}
