import * as z from "zod";
import { parseJson } from "../library/parseJson.ts";
import { strictObject } from "../library/strictObject.ts";
import { validate } from "../library/validate.ts";
import type { ColumnChoices } from "../planets/columnChoices.ts";
import { isThere, readText } from "./inputFile.ts";
import type { Io } from "./io.ts";

const schema = strictObject({
  columns: z.record(z.string(), z.string()).optional(),
  units: z.record(z.string(), z.string()).optional(),
});

/** What `--column` and `--unit` say, kept beside the list as `LIST.columns.json`. */
export interface ColumnMapping extends ColumnChoices {
  /** The file, where there is one. */
  readonly file?: string;
}

/** The mapping file of a list, if it has one; standard input has none. Throws InputError for one that cannot be used. */
export async function readColumnMapping(list: string, io: Io): Promise<ColumnMapping> {
  const file = `${list}.columns.json`;
  if (list === "-" || !(await isThere(file))) return {};
  const { value, problems } = validate(schema, file, parseJson(file, await readText(file, io)));
  if (problems) throw problems[0];
  return { file, columnChoices: value.columns, unitChoices: value.units };
}
