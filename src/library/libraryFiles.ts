import { InputError } from "../errors.ts";
import { nearest } from "./nearest.ts";
import { parseJson } from "./parseJson.ts";

/** A file of a library. A JSON file in a folder `materials` defines a material, any other a composition. */
export interface LibraryFile {
  readonly path: string;
  readonly text: string;
}

/** A file that says what it defines, not yet checked further. */
export interface Entry {
  readonly kind: "material" | "composition";
  readonly name: string;
  readonly title: string;
  readonly path: string;
  readonly content: unknown;
}

/** Tables stand among the files too, and are read when a material names them. */
export const isJson = ({ path }: LibraryFile): boolean => path.toLowerCase().endsWith(".json");

const folders = (path: string): string[] => path.split(/[\\/]/).slice(0, -1);

/** Throws InputError `json-syntax`, or `library-name` where the name or the title is missing. */
export function entryOf({ path, text }: LibraryFile): Entry {
  const kind = folders(path).at(-1) === "materials" ? "material" : "composition";
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
      "all others compositions.",
    { file: path, column: key },
  );
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
