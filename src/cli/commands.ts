import type { Command } from "commander";
import type { CommandContext } from "./commandContext.ts";

interface CommandEntry {
  readonly name: string;
  readonly summary: string;
  load(): Promise<{ define(command: Command, context: CommandContext): void }>;
}

export const commands: readonly CommandEntry[] = [
  { name: "curve", summary: "mass–radius curves of compositions", load: () => import("./commands/curve.ts") },
  {
    name: "profile",
    summary: "the inside of one planet, centre to surface",
    load: () => import("./commands/profile.ts"),
  },
  { name: "classify", summary: "what measured planets can be made of", load: () => import("./commands/classify.ts") },
  {
    name: "crosscheck",
    summary: "what is wrong with a planet list, or where lists disagree",
    load: () => import("./commands/crosscheck.ts"),
  },
  {
    name: "precision",
    summary: "what to measure next, and how well",
    load: () => import("./commands/precision.ts"),
  },
  { name: "library", summary: "the compositions and materials at hand", load: () => import("./commands/library.ts") },
  { name: "demo", summary: "classify an invented survey and draw it", load: () => import("./commands/demo.ts") },
];
