import { InputError } from "../errors.ts";
import { type Library, loadLibrary } from "./library.ts";
import { type Entry, entryOf, isJson, type LibraryFile } from "./libraryFiles.ts";
import { materialFile } from "./materialFile.ts";
import { schemas } from "./schemaFiles.ts";
import { validate } from "./validate.ts";

/**
 * All that is wrong with the files of a library which may use what `base` defines: first every file on its own, then,
 * once each is well formed, what they make together. Empty if nothing is wrong.
 */
export function checkLibrary(files: readonly LibraryFile[], base: readonly LibraryFile[] = []): InputError[] {
  const entries: Entry[] = [];
  const problems = files.filter(isJson).flatMap((file) => {
    try {
      const entry = entryOf(file);
      entries.push(entry);
      return validate(schemas[entry.kind], file.path, entry.content).problems ?? [];
    } catch (error) {
      return [asProblem(error)];
    }
  });
  if (problems.length > 0) return problems;
  const library = loadLibrary([...base, ...files]);
  const failures = entries.flatMap((entry) => build(library, entry));
  // A material that cannot be built fails again in every composition that holds it.
  return [...new Map(failures.map((failure) => [failure.message, failure])).values()];
}

function build(library: Library, { kind, name }: Entry): InputError[] {
  try {
    library[kind](name);
    if (kind === "material") {
      for (const other of materialFile(library.materials, name).alternatives ?? []) library.material(other);
    }
    return [];
  } catch (error) {
    return [asProblem(error)];
  }
}

function asProblem(error: unknown): InputError {
  if (error instanceof InputError) return error;
  throw error;
}
