import { CsvError, type Options, parse } from "csv-parse/sync";
import { InputError } from "../errors.ts";

/**
 * Records of a small CSV file that must have the `needed` columns; further ones are ignored.
 * Throws InputError `csv-syntax` or `missing-columns`, with the file.
 */
export function parseNamedColumns<Row>(
  text: string,
  file: string,
  needed: readonly string[],
  options: Options<Row, Record<string, string>> = {},
): Row[] {
  const checkedHeader = (header: string[]): string[] => {
    if (needed.every((name) => header.includes(name))) return header;
    const message = `${file} has the columns ${header.join(", ")}. Needed: ${needed.join(", ")}.`;
    throw new InputError("missing-columns", message, { file });
  };
  try {
    return parse<Row, Record<string, string>>(text, {
      bom: true,
      trim: true,
      skip_empty_lines: true,
      ...options,
      columns: checkedHeader,
    });
  } catch (error) {
    if (!(error instanceof CsvError)) throw error;
    throw new InputError("csv-syntax", `${file}: ${error.message}.`, { file }, { cause: error });
  }
}
