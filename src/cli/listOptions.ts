import { type Command, InvalidArgumentError, Option } from "commander";

/** What a user says about the columns of a planet list. */
export interface ListOptions {
  readonly column?: Readonly<Record<string, string>>;
  readonly unit?: Readonly<Record<string, string>>;
  readonly explainColumns?: boolean;
}

type Pairs = Readonly<Record<string, string>>;

export function addListOptions(command: Command): Command {
  return command
    .addOption(
      new Option("--column <ours=theirs>", "which column is which, e.g. mass_earth=M; repeatable").argParser(addPair),
    )
    .addOption(
      new Option("--unit <quantity=unit>", "the unit of a column, e.g. radius=jupiter; repeatable").argParser(addPair),
    )
    .option("--explain-columns", "print what each column is taken for, and end");
}

export function parseNames(text: string): readonly string[] {
  const names = text.split(",").map((name) => name.trim());
  if (names.every((name) => name !== "")) return names;
  throw new InvalidArgumentError("Give names separated by commas.");
}

function addPair(text: string, earlier: Pairs = {}): Pairs {
  const [, ours, theirs] = /^([^=]+)=(.+)$/.exec(text) ?? [];
  if (ours === undefined) throw new InvalidArgumentError("Give NAME=VALUE.");
  return { ...earlier, [ours]: theirs };
}
