import type { Command } from "commander";
import type { CommandContext } from "../commandContext.ts";
export function define(_command: Command, _context: CommandContext): void {}
