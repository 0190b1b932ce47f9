import { nameKey } from "../crosscheck/planetName.ts";
import { InputError } from "../errors.ts";
import { parseNamedColumns } from "./namedColumns.ts";

const needed = ["name", "alias"] as const;

/**
 * Reads further names of planets, alias → name: CSV with the columns name and alias, a line for each alias.
 * Throws InputError `csv-syntax`, `missing-columns`, or `alias-of-two` for an alias that stands for two planets.
 */
export function parseAliases(text: string, file: string): Map<string, string> {
  const aliases = new Map<string, string>();
  for (const { name = "", alias = "" } of parseNamedColumns<Partial<Record<string, string>>>(text, file, needed)) {
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
