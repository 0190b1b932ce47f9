import { InputError } from "../errors.ts";
import { suggestion } from "../library/nearest.ts";

/** A column of the user's own that is carried along: its place in the list, and what it is called in the output. */
export interface KeptColumn {
  readonly index: number;
  readonly name: string;
}

/** Finds the columns to keep. One with a name of ours gets a suffix, so that the output has no name twice. */
export function keptColumns(
  wanted: readonly string[],
  header: readonly string[],
  ours: readonly string[],
  file: string,
): KeptColumn[] {
  return wanted.map((name) => {
    const index = header.indexOf(name);
    if (index >= 0) return { index, name: ours.includes(name) ? `${name}_in_list` : name };
    const message = `${file} has no column "${name}" to keep.${suggestion(name, header)} It has: ${header.join(", ")}.`;
    throw new InputError("column-not-found", message, { file, found: name });
  });
}
