import { InputError } from "../errors.ts";
import type { EntryKind } from "./libraryFiles.ts";
import { suggestion } from "./nearest.ts";

/** Runs `action`; an error that does not yet say in which file it arose is given this one, and the key there. */
export function inFile<Result>(file: string, action: () => Result, key?: string): Result {
  try {
    return action();
  } catch (error) {
    if (!(error instanceof InputError) || error.place.file !== undefined) throw error;
    const { place, found, remedy } = error;
    const message = `${file}: ${key === undefined ? "" : `${key}: `}${error.message}`;
    throw new InputError(
      error.code,
      message,
      { ...place, file, column: key ?? place.column, found, remedy },
      { cause: error },
    );
  }
}

export function unknownName(kind: EntryKind, name: string, known: readonly string[]): InputError {
  return new InputError(
    `unknown-${kind}`,
    `no ${kind} is named "${name}".${suggestion(name, known)} Known: ${[...known].sort().join(", ")}.`,
    { found: name },
  );
}
