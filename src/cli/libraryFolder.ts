import { readdir } from "node:fs/promises";
import { join } from "node:path";
import { InputError } from "../errors.ts";
import { type Library, loadLibrary } from "../library/library.ts";
import type { LibraryFile } from "../library/libraryFiles.ts";
import { shippedFiles } from "../library/shipped.generated.ts";
import { readText } from "./inputFile.ts";
import type { Io } from "./io.ts";
import { systemReason } from "./systemReason.ts";

export interface OpenLibrary {
  readonly library: Library;
  /** Files of the user's folder, which a run must not overwrite. */
  readonly inputs: readonly string[];
}

/** The shipped compositions, materials and families with those of a folder, if one is given, and `more` files; the later win. */
export async function openLibrary(
  folder: string | undefined,
  io: Io,
  more: readonly LibraryFile[] = [],
): Promise<OpenLibrary> {
  const own = [...(folder === undefined ? [] : await readLibraryFolder(folder, io)), ...more];
  return { library: loadLibrary([...shippedFiles, ...own]), inputs: own.map(({ path }) => path) };
}

/**
 * The files of a folder laid out like `compositions/`: JSON files and the CSV tables they name, there and in
 * `materials/` and `families/`. Throws InputError `unreadable`, or `empty-library` if there are none.
 */
export async function readLibraryFolder(folder: string, io: Io): Promise<LibraryFile[]> {
  const inside = await Promise.all(
    ["materials", "families"].map((name) => filesIn(join(folder, name), { mayBeMissing: true })),
  );
  const paths = [...(await filesIn(folder)), ...inside.flat()];
  const files = await Promise.all(paths.map(async (path) => ({ path, text: await readText(path, io) })));
  if (files.length > 0) return files;
  throw new InputError(
    "empty-library",
    `${folder} holds no .json files. Needed: compositions there and materials in ${join(folder, "materials")}.`,
    { file: folder },
  );
}

async function filesIn(folder: string, options: { mayBeMissing?: boolean } = {}): Promise<string[]> {
  try {
    const entries = await readdir(folder, { withFileTypes: true });
    const names = entries
      .filter((entry) => !entry.isDirectory() && /\.(json|csv)$/i.test(entry.name))
      .map(({ name }) => name);
    return names.sort().map((name) => join(folder, name));
  } catch (error) {
    if (options.mayBeMissing && (error as NodeJS.ErrnoException).code === "ENOENT") return [];
    throw new InputError(
      "unreadable",
      `Cannot read ${folder}: ${systemReason(error)}.`,
      { file: folder },
      { cause: error },
    );
  }
}
