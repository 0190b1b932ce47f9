import { CsvError, parse } from "csv-parse/sync";
import { nameKey } from "../crosscheck/planetName.ts";
import { InputError } from "../errors.ts";

const needed = ["name", "alias"] as const;

/**
 * Reads further names of planets, alias → name: CSV with the columns name and alias, a line for each alias.
 * Throws InputError `csv-syntax`, `missing-columns`, or `alias-of-two` for an alias that stands for two planets.
 */
export function parseAliases(text: string, file: string): Map<string, string> {
  const aliases = new Map<string, string>();
  for (const { name = "", alias = "" } of parseRecords(text, file)) {
    if (name === "" || alias === "") continue;
    const known = aliases.get(alias);
    if (known !== undefined && nameKey(known) !== nameKey(name)) {
      const message = `${file}: "${alias}" is given as an alias of "${known}" and of "${name}". Keep one of the two.`;
      throw new InputError("alias-of-two", message, { file, found: alias });
    }
    aliases.set(alias, name);
  }
  return aliases;
}

function parseRecords(text: string, file: string): Partial<Record<string, string>>[] {
  try {
    return parse(text, {
      bom: true,
      trim: true,
      skip_empty_lines: true,
      columns: (header: string[]) => checkedHeader(header, file),
    });
  } catch (error) {
    if (!(error instanceof CsvError)) throw error;
    throw new InputError("csv-syntax", `${file}: ${error.message}.`, { file }, { cause: error });
  }
}

function checkedHeader(header: string[], file: string): string[] {
  if (needed.every((name) => header.includes(name))) return header;
  const message = `${file} has the columns ${header.join(", ")}. Needed: ${needed.join(", ")}.`;
  throw new InputError("missing-columns", message, { file });
}
