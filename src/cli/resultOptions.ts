import { type Command, Option } from "commander";
import type { EarthRadius } from "./earthRadius.ts";
import type { Io } from "./io.ts";
import { writeOutputFile } from "./outputFile.ts";
import type { Provenance } from "./provenance.ts";
import { formatTable, type Table, type TableFormat } from "./table.ts";
import { escapeControls } from "./terminal.ts";

/** Options of the whole program, understood before and after the command's name. */
export interface GlobalOptions {
  readonly quiet?: boolean;
  readonly earthRadiusKm: EarthRadius;
}

/** Where and how a command's table goes. */
export interface ResultOptions {
  readonly format: TableFormat;
  readonly out?: string;
}

export function addResultOptions(command: Command): Command {
  return command
    .addOption(new Option("--format <format>", "of the table").choices(["csv", "json"]).default("csv"))
    .option("--out <file>", "write the table there instead of to standard output (`-`)", (path) =>
      path === "-" ? undefined : path,
    );
}

export async function emitTable(table: Table, provenance: Provenance, options: ResultOptions, io: Io): Promise<void> {
  const text = formatTable(table, provenance, options.format);
  if (options.out === undefined) io.out(text);
  else await writeOutputFile(options.out, text);
}

/** The files a run will write. */
export function destinations(options: { readonly out?: string; readonly html?: string }): string[] {
  return [options.out, options.html].filter((path) => path !== undefined);
}

/** What a person should know about a run, unless they asked for quiet. */
export function tell(notes: readonly string[], { quiet }: GlobalOptions, io: Io): void {
  if (!quiet) io.err(escapeControls(notes.map((note) => `note: ${note}\n`).join("")));
}
