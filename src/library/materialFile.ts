import { unknownName } from "./libraryErrors.ts";
import type { Entry } from "./libraryFiles.ts";
import { type MaterialFile, materialSchema } from "./schemas.ts";
import { validate } from "./validate.ts";

/**
 * The file of a material as written, checked. Apart from `Library`, whose types must stand without the validator's.
 * Throws InputError `unknown-material`, or the first problem of the file
 */
export function materialFile(materials: readonly Entry[], name: string): MaterialFile {
  const { path, content } = materialEntry(materials, name);
  const { value, problems } = validate(materialSchema, path, content);
  if (problems) throw problems[0];
  return value;
}

/** Throws InputError `unknown-material` */
export function materialEntry(materials: readonly Entry[], name: string): Entry {
  const entry = materials.find((material) => material.name === name);
  if (entry !== undefined) return entry;
  throw unknownName(
    "material",
    name,
    materials.map((material) => material.name),
  );
}
