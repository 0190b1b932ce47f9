import { type Command, Option } from "commander";
import { InputError } from "../../errors.ts";
import { checkLibrary } from "../../library/checkLibrary.ts";
import { describe } from "../../library/describe.ts";
import { suggestion } from "../../library/nearest.ts";
import { shippedFiles } from "../../library/shipped.generated.ts";
import { solarScales } from "../../mineralogy/solarScales.ts";
import type { CommandContext } from "../commandContext.ts";
import type { Io } from "../io.ts";
import { openLibrary, readLibraryFolder } from "../libraryFolder.ts";
import { descriptionText, listingText } from "../libraryText.ts";
import { numberOption } from "../numberOptions.ts";
import { type StarPlanetOptions, writeStarPlanet } from "../starPlanet.ts";
import { escapeControls } from "../terminal.ts";

interface LibraryOptions {
  readonly library?: string;
}

interface FromAbundances extends StarPlanetOptions {
  readonly fromAbundances?: string;
}

export function define(command: Command, context: CommandContext): void {
  const { io } = context;
  const subcommand = (name: string, description: string, example: string) =>
    command.command(name).description(description).addHelpText("after", `\nExample:\n  ${example}`);
  const withFolder = (chosen: Command) => chosen.option("--library <folder>", "of your own compositions and materials");

  command
    .option("--from-abundances <list>", "of a star: Fe/Mg=0.81+-0.04,Si/Mg=0.91 or [Fe/H]=0.1,…; writes its planet")
    .addOption(
      new Option("--solar-scale <name>", "that [Fe/H] and the like refer to").choices(Object.keys(solarScales)),
    )
    .option("--mantle-iron-share <share>", "of the planet's iron atoms, kept in its mantle", ironShare, 0)
    .option("--name <name>", "of the composition written", "star-planet")
    .option("--out <folder>", "to write it and its material to, made if it is not there; else standard output")
    .addHelpText(
      "after",
      "\nExamples:\n  bulkwright library list\n  bulkwright library show earth-like" +
        "\n  bulkwright library --from-abundances Fe/Mg=0.81,Si/Mg=0.91 --out mine",
    )
    .allowExcessArguments()
    .action(() => {
      const { fromAbundances, ...options } = command.optsWithGlobals<FromAbundances>();
      const [unknown] = command.args;
      if (unknown !== undefined) {
        const known = command.commands.map((subcommand) => subcommand.name());
        return command.error(`error: unknown command '${unknown}'.${suggestion(unknown, known)}`);
      }
      if (fromAbundances === undefined) return command.help({ error: true });
      return writeStarPlanet(fromAbundances, options, context);
    });
  withFolder(
    subcommand("list", "names and titles of all compositions, materials and families", "bulkwright library list"),
  ).action((options: LibraryOptions) => list(options, io));
  withFolder(subcommand("show", "layers, forms, ranges, densities and sources", "bulkwright library show earth-like"))
    .argument("<name>", "of a composition or material")
    .action((name: string, options: LibraryOptions) => show(name, options, io));
  subcommand("check", "what is wrong with a folder of your own", "bulkwright library check my-compositions")
    .argument("<folder>", "laid out like compositions/, with the materials in materials/")
    .action((folder: string) => check(folder, io));
}

const ironShare = numberOption((share) => share >= 0 && share < 1, "a number from 0 to below 1");

async function list(options: LibraryOptions, io: Io): Promise<void> {
  const { library } = await openLibrary(options.library, io);
  io.out(escapeControls(listingText(library)));
}

async function show(name: string, options: LibraryOptions, io: Io): Promise<void> {
  const { library } = await openLibrary(options.library, io);
  io.out(escapeControls(descriptionText(describe(library, name))));
}

async function check(folder: string, io: Io): Promise<void> {
  const files = await readLibraryFolder(folder, io);
  const problems = checkLibrary(files, shippedFiles);
  if (problems.length === 0)
    io.out(escapeControls(`No problem found in ${files.map(({ path }) => path).join(", ")}\n`));
  else throw new InputError("library-problems", problems.map(({ message }) => message).join("\n"), { file: folder });
}
