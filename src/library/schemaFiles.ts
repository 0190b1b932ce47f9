import * as z from "zod";
import { familySchema } from "./familySchema.ts";
import type { LibraryFile } from "./libraryFiles.ts";
import { compositionSchema, materialSchema } from "./schemas.ts";

/** How the files of each kind are made. */
export const schemas = { material: materialSchema, composition: compositionSchema, family: familySchema } as const;

/**
 * The JSON Schemas of material, composition and family files, for editors. They say less than the validator: not that mass
 * fractions sum to 1, nor which phases need an end.
 */
export function schemaFiles(): LibraryFile[] {
  return [
    schemaFile("material", "A material: phases by rising pressure", materialSchema),
    schemaFile("composition", "A composition: layers from the centre outwards", compositionSchema),
    schemaFile(
      "family",
      "A family of compositions: components from the centre outwards, in any proportion",
      familySchema,
    ),
  ];
}

function schemaFile(name: string, title: string, schema: z.ZodType): LibraryFile {
  const text = JSON.stringify({ title, ...z.toJSONSchema(schema, { io: "input" }) }, null, 2);
  return { path: `compositions/schema/${name}.schema.json`, text: `${text}\n` };
}
