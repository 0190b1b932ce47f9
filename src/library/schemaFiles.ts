import * as z from "zod";
import type { LibraryFile } from "./libraryFiles.ts";
import { compositionSchema, materialSchema } from "./schemas.ts";

/**
 * The JSON Schemas of material and composition files, for editors. They say less than the validator: not that mass
 * fractions sum to 1, nor which phases need an end.
 */
export function schemaFiles(): LibraryFile[] {
  return [
    schemaFile("material", "A material: phases by rising pressure", materialSchema),
    schemaFile("composition", "A composition: layers from the centre outwards", compositionSchema),
  ];
}

function schemaFile(name: string, title: string, schema: z.ZodType): LibraryFile {
  const text = JSON.stringify({ title, ...z.toJSONSchema(schema) }, null, 2);
  return { path: `compositions/schema/${name}.schema.json`, text: `${text}\n` };
}
