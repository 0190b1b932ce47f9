import { mkdir } from "node:fs/promises";
import { join } from "node:path";
import { InputError } from "../errors.ts";
import { checkLibrary } from "../library/checkLibrary.ts";
import type { LibraryFile } from "../library/libraryFiles.ts";
import { shippedFiles } from "../library/shipped.generated.ts";
import { starPlanetFiles } from "../library/starPlanetFiles.ts";
import { type Abundances, parseAbundances, pick, withSolarProportions } from "../mineralogy/abundances.ts";
import { type Interval, planetFromStar, type StarPlanet } from "../mineralogy/planetFromStar.ts";
import { type SolarScaleName, solarScales } from "../mineralogy/solarScales.ts";
import type { CommandContext } from "./commandContext.ts";
import { writeOutputFile } from "./outputFile.ts";
import { reproducingCommand, sourceText } from "./provenance.ts";
import { type GlobalOptions, summarise } from "./resultOptions.ts";
import { systemReason } from "./systemReason.ts";
import { version } from "./version.ts";

export interface StarPlanetOptions extends GlobalOptions {
  readonly solarScale?: SolarScaleName;
  readonly mantleIronShare: number;
  readonly name: string;
  /** A folder laid out like `compositions/`; standard output where there is none. */
  readonly out?: string;
}

/** Writes the composition that a star's abundances imply, and says how well they fix it. */
export async function writeStarPlanet(
  text: string,
  options: StarPlanetOptions,
  { io, args }: CommandContext,
): Promise<void> {
  const abundances = parseAbundances(text, options.solarScale);
  const planet = planetFromStar(abundances, options.mantleIronShare);
  const files = starPlanetFiles(planet, options.name, {
    citation: `abundances as given: ${text}`,
    note: [`core mass fraction ${intervalText(planet.coreMassFraction)}`, ...scaleText(options), madeBy(args)].join(
      "; ",
    ),
  });
  const [problem] = checkLibrary(files, shippedFiles);
  if (problem !== undefined) throw problem;
  const written = options.out === undefined ? [] : await writeFolder(options.out, files);
  if (options.out === undefined) io.out(asOneText(files));
  summarise(summary(planet, abundances, options.mantleIronShare, written), options, io);
}

/** Both files as one JSON object under their paths. */
function asOneText(files: readonly LibraryFile[]): string {
  const contents = Object.fromEntries(files.map(({ path, text }) => [path, JSON.parse(text)]));
  return `${JSON.stringify(contents, null, 2)}\n`;
}

/** The paths written. */
async function writeFolder(folder: string, files: readonly LibraryFile[]): Promise<string[]> {
  try {
    await mkdir(join(folder, "materials"), { recursive: true });
  } catch (error) {
    const message = `Cannot write into ${folder}: ${systemReason(error)}.`;
    throw new InputError("unwritable", message, { file: folder }, { cause: error });
  }
  for (const { path, text } of files) await writeOutputFile(join(folder, path), text);
  return files.map(({ path }) => join(folder, path));
}

function summary(planet: StarPlanet, abundances: Abundances, ironShare: number, written: readonly string[]): string {
  const { coreMassFraction, logCoreToMantle, mantle, magnesiumToSilicon } = planet;
  const lines = [
    `core mass fraction ${intervalText(coreMassFraction)}`,
    `ln(core mass / mantle mass) ${digits(logCoreToMantle.mean)} ± ${digits(logCoreToMantle.sigma)}`,
    `mantle Mg/Si ${intervalText(magnesiumToSilicon)}, Fe/(Mg + Fe) ${digits(mantle.ironNumber)}`,
    oxideComparison(abundances, ironShare),
    ...(written.length > 0 ? ["written:", ...written] : []),
  ];
  return lines.map((line) => `${line}\n`).join("");
}

/** The mantle's minor oxides take mass that a mantle of Mg, Si, Fe and O alone would not have. */
function oxideComparison(abundances: Abundances, ironShare: number): string {
  const coreOf = (chosen: Abundances) => digits(planetFromStar(chosen, ironShare).coreMassFraction.mean);
  const minor = ["Al", "Ca"];
  const missing = minor.filter((element) => !(element in abundances));
  const origin = missing.length === 0 ? "as given" : `${missing.join(" and ")} in the Sun's proportion to Mg`;
  const alone = coreOf(pick(abundances, ["Mg", "Si", "Fe"]));
  const all = coreOf(withSolarProportions(pick(abundances, ["Mg", "Si", "Fe", ...minor]), minor));
  return `core mass fraction with Mg, Si, Fe and O alone ${alone}; with Al and Ca ${all} (${origin})`;
}

function scaleText({ solarScale }: StarPlanetOptions): string[] {
  return solarScale === undefined ? [] : [`relative to the Sun of ${sourceText(solarScales[solarScale].source)}`];
}

function madeBy(args: readonly string[]): string {
  return `made by Bulkwright ${version}: ${reproducingCommand(args)}`;
}

function intervalText({ mean, low, high }: Interval): string {
  return low === high ? digits(mean) : `${digits(mean)} (68 % between ${digits(low)} and ${digits(high)})`;
}

function digits(value: number): string {
  return String(Number(value.toPrecision(4)));
}
