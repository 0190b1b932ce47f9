import { type Command, InvalidArgumentError, Option } from "commander";
import type { FamilyModel } from "../../inference/composition/compositionPosterior.ts";
import type { Composition } from "../../library/composition.ts";
import type { Family } from "../../library/family.ts";
import type { PlanetRow } from "../../planets/quantity.ts";
import { readPlanetList } from "../../planets/readPlanetList.ts";
import {
  type BoundaryNames,
  classifyRows,
  comparedCompositions,
  comparisonWith,
  defaultBoundaries,
} from "../classification.ts";
import { planetPart } from "../classifyPage.ts";
import { classifyColumns, classifyTable } from "../classifyTable.ts";
import type { CommandContext } from "../commandContext.ts";
import { rowLikelihoods } from "../correlationColumn.ts";
import { explainLists } from "../explainColumns.ts";
import { type FamilyResult, familyInference } from "../familyInference.ts";
import { addFamilyOptions, chosenFamilies, type FamilyOptions, familyFiles } from "../familyOptions.ts";
import { figureMasses } from "../figureMasses.ts";
import { defaultCacheFolder, fileCache } from "../fileCache.ts";
import { allOf } from "../interruptible.ts";
import type { Io } from "../io.ts";
import { keptColumns } from "../keptColumns.ts";
import { openLibrary } from "../libraryFolder.ts";
import { addListOptions, type ListOptions, parseNames } from "../listOptions.ts";
import { massRadiusPage } from "../massRadiusPage.ts";
import { parseValueWithErrors } from "../numberOptions.ts";
import { type OnePlanet, onePlanetList } from "../onePlanet.ts";
import { checkDestinations, writeOutputFile } from "../outputFile.ts";
import { openPlanetList, planetListFile } from "../planetListFile.ts";
import { startProgress } from "../progress.ts";
import { provenanceOf } from "../provenance.ts";
import {
  addResultOptions,
  destinations,
  emitTable,
  type GlobalOptions,
  type ResultOptions,
  tell,
} from "../resultOptions.ts";
import { sweepCurves } from "../sweepCurves.ts";

interface ClassifyOptions extends GlobalOptions, ResultOptions, ListOptions, OnePlanet, FamilyOptions {
  readonly compositions: BoundaryNames;
  readonly keep?: readonly string[];
  readonly library?: string;
  readonly html?: string;
}

const example = `
Examples:
  bulkwright classify planets.csv --out verdicts.csv --html verdicts.html
  bulkwright classify --mass-earth 4.7,0.2 --radius-earth 1.61,0.03`;

export function define(command: Command, context: CommandContext): void {
  addFamilyOptions(addListOptions(addResultOptions(command)))
    .argument("[list]", "planet list; `-` reads standard input")
    .option("--mass-earth <value,error>", "of one planet: VALUE,ERROR or VALUE,MINUS,PLUS", parseValueWithErrors)
    .option("--radius-earth <value,error>", "of one planet, likewise", parseValueWithErrors)
    .addOption(
      new Option("--compositions <a,b,c>", "the curves between the classes, densest first")
        .argParser(parseBoundaries)
        .default(defaultBoundaries, defaultBoundaries.join(",")),
    )
    .option("--keep <columns>", "columns of the list to carry along, separated by commas", parseNames)
    .option("--library <folder>", "of your own compositions and materials")
    .option("--html <file>", "write a page with the planets in the mass–radius diagram there")
    .addHelpText("after", example)
    .action(async (list: string | undefined) => {
      const options = command.optsWithGlobals<ClassifyOptions>();
      const isOnePlanet = options.massEarth !== undefined || options.radiusEarth !== undefined;
      if ((list !== undefined) === isOnePlanet) {
        command.error("error: give either a list, or --mass-earth and --radius-earth of one planet");
      }
      await classify(list, options, context);
    });
}

async function classify(
  path: string | undefined,
  options: ClassifyOptions,
  { io, args }: CommandContext,
): Promise<void> {
  const ownFamilies = await familyFiles(options, io);
  const { library, inputs } = await openLibrary(options.library, io, ownFamilies);
  const file = path === undefined ? undefined : await planetListFile(path, options, io);
  await checkDestinations(destinations(options), [...(file?.inputs ?? []), ...inputs]);
  if (file && options.explainColumns) return explainLists([file], options, { io, args });
  const comparison = comparisonWith(options.compositions, library);
  const earthRadius = options.earthRadiusKm.value;
  const list = await (file
    ? openPlanetList(file, io)
    : readPlanetList(onePlanetList(options), { file: "the planet given", earthRadius }));
  const header = list.columns.map(({ name }) => name);
  const kept = keptColumns(options.keep ?? [], header, classifyColumns, list.file);
  const notes = [...library.notes, ...list.notes];
  tell(notes, options, io);

  const rows = await allOf(list.rows);
  const families = chosenFamilies(options, ownFamilies, library);
  const inference = families.length > 0 ? await inferenceFor(families, rows, header, options, io) : undefined;
  notes.push(...(inference?.notes ?? []));
  const progress = startProgress(rows.length, io, options.quiet);
  const classified = await classifyRows(rows, comparison, progress, inference?.infer).finally(() => progress.stop());

  const compositions = [...comparedCompositions(comparison), ...families.flatMap(compositionsOf)];
  const run = { args, earthRadius: options.earthRadiusKm };
  await emitTable(
    classifyTable(classified, earthRadius, kept, inference?.families),
    provenanceOf({ ...run, compositions, notes }),
    options,
    io,
  );
  if (options.html !== undefined) {
    const curves = await sweepCurves(comparedCompositions(comparison), figureMasses(classified));
    await writeOutputFile(
      options.html,
      await massRadiusPage(curves, planetPart(classified, comparison, earthRadius), run),
    );
  }
}

interface RowInference {
  readonly families: readonly FamilyModel[];
  readonly notes: readonly string[];
  infer(row: PlanetRow, index: number): readonly FamilyResult[];
}

async function inferenceFor(
  families: readonly Family[],
  rows: readonly PlanetRow[],
  header: readonly string[],
  options: ClassifyOptions,
  io: Io,
): Promise<RowInference> {
  const planets = rowLikelihoods(rows, header, options.correlation);
  const note = (text: string) => tell([text], options, io);
  const folder = options.cache === true ? defaultCacheFolder() : options.cache;
  const cache = folder === false ? undefined : fileCache(folder, note);
  const { infer, ...rest } = await familyInference(families, planets, { massPrior: options.massPrior, cache, note });
  tell(rest.notes, options, io);
  return { ...rest, infer: (_, index) => infer(planets[index]) };
}

/** For the sources. */
function compositionsOf({ components }: Family): Composition[] {
  return components.map(({ composition }) => composition);
}

function parseBoundaries(text: string): BoundaryNames {
  const [iron, silicate, water, ...more] = parseNames(text);
  if (water === undefined || more.length > 0) throw new InvalidArgumentError("Give three compositions, densest first.");
  return [iron, silicate, water];
}
