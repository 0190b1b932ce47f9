import { CsvError, parse } from "csv-parse/sync";
import { InputError } from "../errors.ts";
import type { DensityTable } from "../interior/densityTable.ts";

/** One row of the file, SI. */
interface Sample {
  readonly radius: number;
  readonly density: number;
}

const needed = ["radius_km", "density_kg_m3"];

/**
 * Reads a density table: CSV with the columns radius_km and density_kg_m3; `#` comments and further columns are ignored.
 * Throws InputError `empty-table`, `csv-syntax`, `missing-columns` or `not-a-number`, with file and line.
 */
export function parseDensityTable(text: string, file: string): DensityTable {
  const samples = parseRecords(text, file);
  if (samples.length > 0) {
    return { radius: samples.map(({ radius }) => radius), density: samples.map(({ density }) => density) };
  }
  throw new InputError("empty-table", `${file} has no rows. Needed: a header and rows of ${needed.join(", ")}.`, {
    file,
  });
}

function parseRecords(text: string, file: string): Sample[] {
  try {
    return parse<Sample, Record<string, string>>(text, {
      bom: true,
      comment: "#",
      trim: true,
      skip_empty_lines: true,
      columns: (header: string[]) => checkedHeader(header, file),
      on_record: (record, { lines: line }) => ({
        radius: 1e3 * cellNumber(record.radius_km, { file, line, column: "radius_km" }),
        density: cellNumber(record.density_kg_m3, { file, line, column: "density_kg_m3" }),
      }),
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

function cellNumber(text: string, place: { file: string; line: number; column: string }): number {
  const value = text === "" ? Number.NaN : Number(text);
  if (Number.isFinite(value)) return value;
  const where = `${place.file}, line ${place.line}, column ${place.column}`;
  throw new InputError("not-a-number", `${where}: found "${text}", a number is needed.`, { ...place, found: text });
}
