import { type Command, Option } from "commander";
import { InputError } from "../../errors.ts";
import type { Composition } from "../../library/composition.ts";
import { constants } from "../../units/constants.ts";
import type { ColumnGroup } from "../columnGroup.ts";
import type { CommandContext } from "../commandContext.ts";
import { compositionNotes } from "../compositionNotes.ts";
import { curveTable } from "../curveTable.ts";
import { envelopeColumns, transitColumn } from "../envelopeColumns.ts";
import { addEnvelopeOptions, type EnvelopeOptions, requireEnvelope, withEnvelopeOptions } from "../envelopeOptions.ts";
import { openLibrary } from "../libraryFolder.ts";
import { type Curve, massRadiusPage } from "../massRadiusPage.ts";
import { parseMasses, positiveNumber, pressurePa } from "../numberOptions.ts";
import { distortionColumns, observableColumns } from "../observableColumns.ts";
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
import { spreadOf } from "../spread.ts";
import { sweepCurves } from "../sweepCurves.ts";

interface CurveOptions extends GlobalOptions, ResultOptions, EnvelopeOptions {
  readonly masses: readonly number[];
  readonly surfacePressurePa?: number;
  readonly library?: string;
  readonly html?: string;
  readonly observables?: boolean;
  readonly periodDays?: number;
  readonly spread?: boolean;
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
    .option("--spread", "append the range of radii over the published sets for each material")
    .option("--observables", "append Love number, core radius, escape speed and binding energy")
    .option(
      "--period-days <period>",
      "append what a transit shows of a planet that turns with this orbit",
      positiveNumber,
    )
    .addHelpText(
      "after",
      "\nExamples:\n  bulkwright curve iron earth-like --masses 0.5,1,2 --out curves.csv" +
        "\n  bulkwright curve earth-like --masses 1:10:5 --spread --observables" +
        "\n  bulkwright curve earth-like-gas-2 --masses 2:10:9 --flux-earth 50",
    )
    .action((names: string[]) => curve(names, command.optsWithGlobals<CurveOptions>(), context));
  addEnvelopeOptions(command).option(
    "--transit-pressure-pa <pressure>",
    "append the radius at which gas envelopes have it",
    positiveNumber,
  );
}

async function curve(names: readonly string[], options: CurveOptions, { io, args }: CommandContext): Promise<void> {
  const { library, inputs } = await openLibrary(options.library, io);
  await checkDestinations(destinations(options), inputs);
  tell(library.notes, options, io);
  const adjust = (composition: Composition): Composition =>
    withEnvelopeOptions(withSurfacePressure(composition, options.surfacePressurePa), options);
  const compositions = names.map((name) => adjust(library.composition(name)));
  requireEnvelope(compositions, options);
  const curves = await sweepCurves(compositions, options.masses);

  const run = { args, earthRadius: options.earthRadiusKm };
  const earthRadius = run.earthRadius.value;
  const spread = options.spread ? await spreadOf(curves, options.masses, { library, adjust, earthRadius }) : undefined;
  const groups = [...columnGroups(compositions, options), ...(spread ? [spread.group] : [])];
  const notes = [...library.notes, ...warmOrGaseous(compositions).flatMap(compositionNotes), ...(spread?.notes ?? [])];
  const provenance = provenanceOf({ ...run, compositions: [...compositions, ...(spread?.compositions ?? [])], notes });
  await emitTable(curveTable(curves, earthRadius, groups), provenance, options, io);
  if (options.html !== undefined)
    await writeOutputFile(options.html, await massRadiusPage(curves, withoutPlanets, run));
  if (!curves.some(({ points }) => points.some(({ planet }) => planet))) throw nothingSolved(curves);
}

/** Columns are appended only where something fills them. */
function columnGroups(compositions: readonly Composition[], options: CurveOptions): ColumnGroup[] {
  const { observables, periodDays, transitPressurePa } = options;
  const earthRadius = options.earthRadiusKm.value;
  const hasEnvelope = compositions.some(({ envelope }) => envelope);
  return [
    ...(hasEnvelope ? [envelopeColumns(earthRadius)] : []),
    ...(transitPressurePa === undefined ? [] : [transitColumn(earthRadius, transitPressurePa)]),
    ...(observables ? [observableColumns] : []),
    ...(periodDays === undefined ? [] : [distortionColumns(earthRadius, periodDays * constants.day.value)]),
  ];
}

function warmOrGaseous(compositions: readonly Composition[]): Composition[] {
  return compositions.filter(({ temperature, envelope }) => temperature ?? envelope);
}

function nothingSolved(curves: readonly Curve[]): InputError {
  const first = curves[0].points[0].error?.message;
  return new InputError("nothing-solved", `None of the planets could be solved. The first: ${first}`);
}

function withSurfacePressure(composition: Composition, pressurePa: number | undefined): Composition {
  return pressurePa === undefined ? composition : { ...composition, surface: { ...composition.surface, pressurePa } };
}
