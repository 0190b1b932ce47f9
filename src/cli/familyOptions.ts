import { type Command, Option } from "commander";
import type { MassPrior } from "../inference/composition/likelihood.ts";
import type { Family } from "../library/family.ts";
import type { Library } from "../library/library.ts";
import type { LibraryFile } from "../library/libraryFiles.ts";
import { entryOf } from "../library/libraryFiles.ts";
import { readText } from "./inputFile.ts";
import type { Io } from "./io.ts";
import { parseNames } from "./listOptions.ts";

/** What a user says about families of compositions. */
export interface FamilyOptions {
  /** Names, or files that end in `.json`. */
  readonly family?: readonly string[];
  readonly massPrior: MassPrior;
  readonly correlation?: string;
  /** A folder; false for none; true where nothing is said. */
  readonly cache: string | boolean;
}

export function addFamilyOptions(command: Command): Command {
  return command
    .option("--family <file|name>", "families to infer mass fractions in; several separated by commas", parseNames)
    .addOption(
      new Option("--mass-prior <prior>", "of true masses, for families").choices(["flat", "log-flat"]).default("flat"),
    )
    .option("--correlation <column>", "of the errors of mass and radius, -1 to 1, for families")
    .addOption(new Option("--cache <folder>", "where solved families are kept between runs").default(true, "yours"))
    .option("--no-cache", "keep and use none");
}

/** The files among the families asked for. */
export async function familyFiles({ family = [] }: FamilyOptions, io: Io): Promise<LibraryFile[]> {
  const paths = family.filter(isFile);
  return Promise.all(paths.map(async (path) => ({ path, text: await readText(path, io), kind: "family" as const })));
}

/** The families asked for, in their order. */
export function chosenFamilies(
  { family = [] }: FamilyOptions,
  files: readonly LibraryFile[],
  library: Library,
): Family[] {
  const nameIn = (path: string): string => {
    const file = files.find((candidate) => candidate.path === path);
    return file === undefined ? path : entryOf(file).name;
  };
  return family.map((name) => library.family(isFile(name) ? nameIn(name) : name));
}

function isFile(name: string): boolean {
  return name.toLowerCase().endsWith(".json");
}
