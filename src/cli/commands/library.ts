import type { Command } from "commander";
import { InputError } from "../../errors.ts";
import { checkLibrary } from "../../library/checkLibrary.ts";
import { describe } from "../../library/describe.ts";
import { shippedFiles } from "../../library/shipped.generated.ts";
import type { CommandContext } from "../commandContext.ts";
import type { Io } from "../io.ts";
import { openLibrary, readLibraryFolder } from "../libraryFolder.ts";
import { descriptionText, listingText } from "../libraryText.ts";
import { escapeControls } from "../terminal.ts";

interface LibraryOptions {
  readonly library?: string;
}

export function define(command: Command, { io }: CommandContext): void {
  const subcommand = (name: string, description: string, example: string) =>
    command.command(name).description(description).addHelpText("after", `\nExample:\n  ${example}`);
  const withFolder = (chosen: Command) => chosen.option("--library <folder>", "of your own compositions and materials");

  command.addHelpText("after", "\nExamples:\n  bulkwright library list\n  bulkwright library show earth-like");
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
