import { Command, CommanderError, Option } from "commander";
import { BulkwrightError, InputError } from "../errors.ts";
import type { CommandContext } from "./commandContext.ts";
import { commands } from "./commands.ts";
import { parseEarthRadius } from "./earthRadius.ts";
import type { Io } from "./io.ts";
import { escapeControls } from "./terminal.ts";
import { version } from "./version.ts";

const nominalRadiusKm = "6378.1";

/** Errors that an option mends, found only once the list or the compositions are open. */
const usageErrors = ["ambiguous-column", "unknown-column-choice", "unknown-unit", "envelope-options"];

/**
 * Runs one command line. Resolves to the exit code: 0 a result was produced, 1 nothing could be read, solved or
 * written, 2 wrong usage. (130, interrupted, is given by main.ts.)
 */
export async function run(args: readonly string[], io: Io): Promise<number> {
  try {
    await program({ args, io }).parseAsync(args, { from: "user" });
    return 0;
  } catch (error) {
    if (error instanceof CommanderError) return error.exitCode === 0 ? 0 : 2;
    io.err(`${errorLabel(io)} ${escapeControls(messageOf(error))}\n`);
    return error instanceof InputError && usageErrors.includes(error.code) ? 2 : 1;
  }
}

function program(context: CommandContext): Command {
  const { io } = context;
  const root = new Command("bulkwright")
    .exitOverride()
    .helpCommand(false)
    .configureOutput({
      writeOut: (text) => io.out(text),
      writeErr: (text) => io.err(text),
      outputError: (text, write) => write(escapeControls(text).replace(/^error:/, errorLabel(io))),
    })
    .configureHelp({ showGlobalOptions: true })
    .description("Mass–radius curves from equations of state, and what a measured planet can be made of.")
    .version(version, "--version", "print the version")
    .option("--quiet", "print results and errors only")
    .addOption(
      new Option("--earth-radius-km <km>", "the unit of radii read and written: a length, or `mean` for 6371.0")
        .argParser(parseEarthRadius)
        .default(parseEarthRadius(nominalRadiusKm), nominalRadiusKm),
    )
    .addHelpText("after", "\nExample:\n  bulkwright curve earth-like --masses 0.1:10:5");

  // A command's own options and code are loaded only once it is chosen: start-up stays short.
  for (const { name, summary } of commands) root.command(name).description(summary);
  return root.hook("preSubcommand", async (_, chosen) => {
    const entry = commands.find(({ name }) => name === chosen.name());
    (await entry?.load())?.define(chosen, context);
  });
}

function messageOf(error: unknown): string {
  if (error instanceof InputError) return withRemedy(error);
  if (error instanceof BulkwrightError) return error.message;
  return `This is a fault of Bulkwright; please report it with the command line: ${error}`;
}

/** A remedy of several lines may stand in the message already, each line where it belongs. */
function withRemedy({ message, remedy = "" }: InputError): string {
  return remedy.split("\n").every((line) => message.includes(line)) ? message : `${message} ${remedy}`;
}

function errorLabel(io: Io): string {
  return io.useColor ? "\u001b[31merror:\u001b[39m" : "error:";
}
