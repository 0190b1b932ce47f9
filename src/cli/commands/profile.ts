import type { Command } from "commander";
import { integrateDensityTable } from "../../interior/densityTable.ts";
import { fluidLoveNumber } from "../../interior/loveNumber.ts";
import { coreRadiusFraction, escapeSpeed, planetLoveNumber } from "../../interior/observables.ts";
import type { Planet } from "../../interior/planet.ts";
import { solveProfile } from "../../interior/profile.ts";
import { EARTH_MASS, GIGAYEAR, GPA } from "../../units/constants.ts";
import type { CommandContext } from "../commandContext.ts";
import { compositionNotes } from "../compositionNotes.ts";
import { parseDensityTable } from "../densityTableFile.ts";
import { addEnvelopeOptions, type EnvelopeOptions, requireEnvelope, withEnvelopeOptions } from "../envelopeOptions.ts";
import { inputName, readText } from "../inputFile.ts";
import { openLibrary } from "../libraryFolder.ts";
import { pointCount, positiveNumber } from "../numberOptions.ts";
import { checkDestinations } from "../outputFile.ts";
import { profileTable } from "../profileTable.ts";
import { provenanceOf } from "../provenance.ts";
import {
  addResultOptions,
  destinations,
  emitTable,
  type GlobalOptions,
  type ResultOptions,
  tell,
} from "../resultOptions.ts";

interface ProfileOptions extends GlobalOptions, ResultOptions, EnvelopeOptions {
  readonly mass?: number;
  readonly points: number;
  readonly library?: string;
  readonly densityTable?: string;
}

export function define(command: Command, context: CommandContext): void {
  addResultOptions(command)
    .argument("[name]", "composition, as `bulkwright library` lists it")
    .option("--mass <mass>", "of the planet, in Earth masses", positiveNumber)
    .option("--points <n>", "evenly spaced in radius, centre and surface included", pointCount, 100)
    .option("--library <folder>", "of your own compositions and materials")
    .option("--density-table <file>", "CSV of radius_km,density_kg_m3 to integrate instead; `-` reads standard input")
    .addHelpText(
      "after",
      "\nExamples:\n  bulkwright profile earth-like --mass 1\n  bulkwright profile --density-table rho.csv",
    )
    .action(async (name: string | undefined) => {
      const options = command.optsWithGlobals<ProfileOptions>();
      const { densityTable, mass } = options;
      if (densityTable !== undefined && name === undefined && mass === undefined) {
        return profileOfTable(densityTable, options, context);
      }
      if (densityTable === undefined && name !== undefined && mass !== undefined) {
        return profileOfComposition(name, mass, options, context);
      }
      return command.error("error: give either a composition with --mass, or --density-table alone");
    });
  addEnvelopeOptions(command);
}

async function profileOfComposition(
  name: string,
  mass: number,
  options: ProfileOptions,
  { io, args }: CommandContext,
): Promise<void> {
  const { library, inputs } = await openLibrary(options.library, io);
  await checkDestinations(destinations(options), inputs);
  tell(library.notes, options, io);
  const composition = withEnvelopeOptions(library.composition(name), options);
  requireEnvelope([composition], options);
  const { planet, points } = solveProfile(composition, mass * EARTH_MASS, options.points);
  const provenance = provenanceOf({
    args,
    earthRadius: options.earthRadiusKm,
    compositions: [composition],
    notes: [...library.notes, ...compositionNotes(composition), ...planetNotes(planet, options)],
  });
  await emitTable(profileTable(points), provenance, options, io);
}

async function profileOfTable(file: string, options: ProfileOptions, { io, args }: CommandContext): Promise<void> {
  await checkDestinations(destinations(options), [file]);
  const table = parseDensityTable(await readText(file, io), inputName(file));
  const planet = integrateDensityTable(table);
  const provenance = provenanceOf({
    args,
    earthRadius: options.earthRadiusKm,
    notes: [
      bulkNote(planet, options),
      loveNote(fluidLoveNumber(table)),
      `density as given in ${inputName(file)}, linear between its rows`,
    ],
  });
  await emitTable(profileTable(planet.points), provenance, options, io);
}

function planetNotes(planet: Planet, options: ProfileOptions): string[] {
  const extrapolated = planet.extrapolatedLayers.map((layer) => `${layer} is used beyond the data behind it`);
  const accuracy = `radius good to ${planet.radiusRelativeError.toExponential(1)}`;
  return [
    bulkNote(planet, options),
    observableNote(planet),
    accuracy,
    ...envelopeNote(planet, options),
    ...extrapolated,
    ...planet.notes,
  ];
}

function observableNote(planet: Planet): string {
  const loveNumber = planetLoveNumber(planet);
  const coreRadius = coreRadiusFraction(planet);
  return [
    ...(loveNumber === undefined ? [] : [loveNote(loveNumber)]),
    ...(coreRadius === undefined ? [] : [`core radius ${coreRadius.toPrecision(6)} of the planet's`]),
    `escape speed ${escapeSpeed(planet).toPrecision(6)} m/s`,
    ...(planet.bindingEnergy === undefined ? [] : [`binding energy ${planet.bindingEnergy.toPrecision(6)} J`]),
  ].join(", ");
}

function loveNote(loveNumber: number): string {
  return `fluid Love number k2 ${loveNumber.toPrecision(4)}`;
}

/** The rows end where the gas begins, and the bulk values are those of the whole. */
function envelopeNote({ envelope }: Planet, { earthRadiusKm }: ProfileOptions): string[] {
  if (envelope === undefined) return [];
  const { core, convectiveRadius, escapeParameter, massLossTime } = envelope;
  const inRadii = (radius: number): string => `${(radius / earthRadiusKm.value).toPrecision(12)} Earth radii`;
  return [
    `the gas begins at ${inRadii(core.radius)}, where these rows end, and convects up to ${inRadii(convectiveRadius)}; ` +
      `escape parameter ${escapeParameter.toPrecision(4)}, lost in ${(massLossTime / GIGAYEAR).toPrecision(3)} Gyr ` +
      "at the present rate",
  ];
}

function bulkNote(
  bulk: Pick<Planet, "mass" | "radius" | "centralPressure" | "inertiaFactor">,
  { earthRadiusKm }: ProfileOptions,
): string {
  return [
    `mass ${(bulk.mass / EARTH_MASS).toPrecision(12)} Earth masses`,
    `radius ${(bulk.radius / earthRadiusKm.value).toPrecision(12)} Earth radii`,
    `central pressure ${(bulk.centralPressure / GPA).toPrecision(12)} GPa`,
    ...(bulk.inertiaFactor === undefined ? [] : [`I / (M R²) ${bulk.inertiaFactor.toPrecision(12)}`]),
  ].join(", ");
}
