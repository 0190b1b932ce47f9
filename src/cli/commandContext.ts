import type { Io } from "./io.ts";

/** What every command is given. */
export interface CommandContext {
  readonly io: Io;
  /** The command line as typed, for the reproducing command in every output. */
  readonly args: readonly string[];
}
