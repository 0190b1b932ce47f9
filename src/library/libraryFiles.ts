import { InputError } from "../errors.ts";
import { nearest } from "./nearest.ts";
import { parseJson } from "./parseJson.ts";

/** What a library's files can define. */
export type EntryKind = "material" | "composition" | "family";

/**
 * A file of a library. A JSON file in a folder `materials` defines a material, in a folder `families` a family, any other
 * a composition, unless `kind` says what it is.
 */
export interface LibraryFile {
  readonly path: string;
  readonly text: string;
  readonly kind?: EntryKind;
}

/** A file that says what it defines, not yet checked further. */
export interface Entry {
  readonly kind: EntryKind;
  readonly name: string;
  readonly title: string;
  readonly path: string;
  readonly content: unknown;
}

/** Tables stand among the files too, and are read when a material names them. */
export const isJson = ({ path }: LibraryFile): boolean => path.toLowerCase().endsWith(".json");

const folders = (path: string): string[] => path.split(/[\\/]/).slice(0, -1);

/** Throws InputError `json-syntax`, or `library-name` where the name or the title is missing. */
export function entryOf({ path, text, kind = kindByFolder(path) }: LibraryFile): Entry {
  const content = parseJson(path, text);
  const fields: Record<string, unknown> = typeof content === "object" && content !== null ? { ...content } : {};
  const { [kind]: name, title } = fields;
  if (typeof name === "string" && typeof title === "string") return { kind, name, title, path, content };
  const key = typeof name === "string" ? "title" : kind;
  const misspelt = nearest(key, Object.keys(fields));
  throw new InputError(
    "library-name",
    `${path}: "${key}" is missing or not text; a ${kind} file is an object with "${kind}" (its name) and "title".` +
      `${misspelt === undefined ? "" : ` Is "${misspelt}" meant for it?`} Files in a folder "materials" are materials, ` +
      'in a folder "families" families, all others compositions.',
    { file: path, column: key },
  );
}

function kindByFolder(path: string): EntryKind {
  const folder = folders(path).at(-1);
  if (folder === "materials") return "material";
  return folder === "families" ? "family" : "composition";
}

/** The path of a file named relative to another one. */
export function siblingPath(path: string, name: string): string {
  const parts = folders(path);
  for (const part of name.split(/[\\/]/)) {
    if (part === "..") parts.pop();
    else if (part !== ".") parts.push(part);
  }
  return parts.join("/");
}
