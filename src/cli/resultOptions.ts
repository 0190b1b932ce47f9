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
  /** That of the extension of `out` where nothing is said. */
  readonly format?: TableFormat;
  readonly out?: string;
}

export function addResultOptions(command: Command): Command {
  return command
    .addOption(
      new Option("--format <format>", "of the table; else as the extension of --out, or csv").choices(["csv", "json"]),
    )
    .option("--out <file>", "write the table there instead of to standard output (`-`)", (path) =>
      path === "-" ? undefined : path,
    );
}

export async function emitTable(table: Table, provenance: Provenance, options: ResultOptions, io: Io): Promise<void> {
  const text = formatTable(table, provenance, formatOf(options));
  if (options.out === undefined) io.out(text);
  else await writeOutputFile(options.out, text);
}

function formatOf({ format, out }: ResultOptions): TableFormat {
  return format ?? (out?.toLowerCase().endsWith(".json") ? "json" : "csv");
}

/** The files a run will write. */
export function destinations(options: { readonly out?: string; readonly html?: string }): string[] {
  return [options.out, options.html].filter((path) => path !== undefined);
}

/** The run in short, for a person: on standard output if the table does not stand there. */
export function summarise(text: string, { out, quiet }: GlobalOptions & ResultOptions, io: Io): void {
  if (quiet) return;
  if (out === undefined) io.err(escapeControls(text));
  else io.out(escapeControls(text));
}

/** What a person should know about a run, unless they asked for quiet. */
export function tell(notes: readonly string[], { quiet }: GlobalOptions, io: Io): void {
  if (!quiet) io.err(escapeControls(notes.map((note) => `note: ${note}\n`).join("")));
}
