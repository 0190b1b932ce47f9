import { mkdir } from "node:fs/promises";
import { join } from "node:path";
import type { Command } from "commander";
import { survey, surveyTitle } from "../../demo/survey.ts";
import { InputError } from "../../errors.ts";
import { CLASS_CODES } from "../../inference/verdict.ts";
import { readPlanetList } from "../../planets/readPlanetList.ts";
import { classifyRows, comparedCompositions, comparisonWith, defaultBoundaries } from "../classification.ts";
import { planetPart } from "../classifyPage.ts";
import { type ClassifiedRow, classifyTable } from "../classifyTable.ts";
import type { CommandContext } from "../commandContext.ts";
import { curveTable } from "../curveTable.ts";
import { figureMasses } from "../figureMasses.ts";
import { bytesOf } from "../inputFile.ts";
import { allOf } from "../interruptible.ts";
import { openLibrary } from "../libraryFolder.ts";
import { massRadiusPage } from "../massRadiusPage.ts";
import { writeOutputFile } from "../outputFile.ts";
import { startProgress } from "../progress.ts";
import { provenanceOf } from "../provenance.ts";
import type { GlobalOptions } from "../resultOptions.ts";
import { sweepCurves } from "../sweepCurves.ts";
import { systemReason } from "../systemReason.ts";
import { formatTable } from "../table.ts";

interface DemoOptions extends GlobalOptions {
  readonly directory: string;
}

export function define(command: Command, context: CommandContext): void {
  command
    .option("--directory <folder>", "where to write, made if it is not there", "output")
    .addHelpText("after", "\nExample:\n  bulkwright demo")
    .action(() => demo(command.optsWithGlobals<DemoOptions>(), context));
}

async function demo(options: DemoOptions, { io, args }: CommandContext): Promise<void> {
  const earthRadius = options.earthRadiusKm.value;
  await makeFolder(options.directory);
  const { library } = await openLibrary(undefined, io);
  const comparison = comparisonWith(defaultBoundaries, library);
  const compositions = comparedCompositions(comparison);
  const list = await readPlanetList(bytesOf(survey), { file: surveyTitle, earthRadius });
  const rows = await allOf(list.rows);
  const progress = startProgress(rows.length, io, options.quiet);
  const classified = await classifyRows(rows, comparison, progress).finally(() => progress.stop());
  const curves = await sweepCurves(compositions, figureMasses(classified));

  const run = { args, earthRadius: options.earthRadiusKm };
  const provenance = provenanceOf({ ...run, compositions });
  const part = { ...planetPart(classified, comparison, earthRadius), title: `${surveyTitle}: invented planets` };
  const files = {
    "demo.html": await massRadiusPage(curves, part, run),
    "demo-verdicts.csv": formatTable(classifyTable(classified, earthRadius), provenance, "csv"),
    "demo-curves.csv": formatTable(curveTable(curves, earthRadius), provenance, "csv"),
    "demo-survey.csv": survey,
  };
  for (const [name, text] of Object.entries(files)) await writeOutputFile(join(options.directory, name), text);
  if (!options.quiet) io.out(summary(classified));
  io.out(
    Object.keys(files)
      .map((name) => `${join(options.directory, name)}\n`)
      .join(""),
  );
}

/** How many planets got which verdict. */
function summary(classified: readonly ClassifiedRow[]): string {
  const count = (code?: string) => classified.filter(({ result }) => result.verdict?.code === code).length;
  return [
    `${surveyTitle}: ${classified.length} invented planets`,
    ...[...CLASS_CODES, "undecided"].map((code) => `  ${count(code)} ${code}`),
    `  ${count()} without a verdict, each with its reasons`,
    "written:\n",
  ].join("\n");
}

async function makeFolder(path: string): Promise<void> {
  try {
    await mkdir(path, { recursive: true });
  } catch (error) {
    throw new InputError(
      "unwritable",
      `Cannot make ${path}: ${systemReason(error)}.`,
      { file: path },
      { cause: error },
    );
  }
}
