import { InputError } from "../errors.ts";
import type { DensityTable } from "../interior/densityTable.ts";
import { parseNamedColumns } from "./namedColumns.ts";

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
  const samples = parseNamedColumns<Sample>(text, file, needed, {
    comment: "#",
    on_record: (record, { lines: line }) => ({
      radius: 1e3 * cellNumber(record.radius_km, { file, line, column: "radius_km" }),
      density: cellNumber(record.density_kg_m3, { file, line, column: "density_kg_m3" }),
    }),
  });
  if (samples.length > 0) {
    return { radius: samples.map(({ radius }) => radius), density: samples.map(({ density }) => density) };
  }
  throw new InputError("empty-table", `${file} has no rows. Needed: a header and rows of ${needed.join(", ")}.`, {
    file,
  });
}

function cellNumber(text: string, place: { file: string; line: number; column: string }): number {
  const value = text === "" ? Number.NaN : Number(text);
  if (Number.isFinite(value)) return value;
  const where = `${place.file}, line ${place.line}, column ${place.column}`;
  throw new InputError("not-a-number", `${where}: found "${text}", a number is needed.`, { ...place, found: text });
}
