import { type Command, Option } from "commander";
import { InputError } from "../../errors.ts";
import type { Composition } from "../../library/composition.ts";
import type { CommandContext } from "../commandContext.ts";
import { curveTable } from "../curveTable.ts";
import { openLibrary } from "../libraryFolder.ts";
import { type Curve, massRadiusPage } from "../massRadiusPage.ts";
import { parseMasses, pressurePa } from "../numberOptions.ts";
import { checkDestinations, writeOutputFile } from "../outputFile.ts";
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

interface CurveOptions extends GlobalOptions, ResultOptions {
  readonly masses: readonly number[];
  readonly surfacePressurePa?: number;
  readonly library?: string;
  readonly html?: string;
}

const defaultMasses = "0.1:20:60";
const withoutPlanets = { title: "Mass–radius curves", planets: [], columns: [], verdicts: [], warnings: [] };

export function define(command: Command, context: CommandContext): void {
  addResultOptions(command)
    .argument("<name...>", "compositions, as `bulkwright library` lists them")
    .addOption(
      new Option("--masses <list>", "in Earth masses: from:to:count, evenly spaced in the logarithm, or 0.5,1,2")
        .argParser(parseMasses)
        .default(parseMasses(defaultMasses), defaultMasses),
    )
    .option("--surface-pressure-pa <pressure>", "instead of each composition's own", pressurePa)
    .option("--library <folder>", "of your own compositions and materials")
    .option("--html <file>", "write a page with the mass–radius diagram there")
    .addHelpText("after", "\nExample:\n  bulkwright curve iron earth-like --masses 0.5,1,2 --out curves.csv")
    .action((names: string[]) => curve(names, command.optsWithGlobals<CurveOptions>(), context));
}

async function curve(names: readonly string[], options: CurveOptions, { io, args }: CommandContext): Promise<void> {
  const { library, inputs } = await openLibrary(options.library, io);
  await checkDestinations(destinations(options), inputs);
  tell(library.notes, options, io);
  const compositions = names.map((name) => withSurfacePressure(library.composition(name), options.surfacePressurePa));
  const curves = await sweepCurves(compositions, options.masses);

  const run = { args, earthRadius: options.earthRadiusKm };
  const provenance = provenanceOf({ ...run, compositions, notes: library.notes });
  await emitTable(curveTable(curves, run.earthRadius.value), provenance, options, io);
  if (options.html !== undefined)
    await writeOutputFile(options.html, await massRadiusPage(curves, withoutPlanets, run));
  if (!curves.some(({ points }) => points.some(({ planet }) => planet))) throw nothingSolved(curves);
}

function nothingSolved(curves: readonly Curve[]): InputError {
  const first = curves[0].points[0].error?.message;
  return new InputError("nothing-solved", `None of the planets could be solved. The first: ${first}`);
}

function withSurfacePressure(composition: Composition, pressurePa: number | undefined): Composition {
  return pressurePa === undefined ? composition : { ...composition, surface: { ...composition.surface, pressurePa } };
}
