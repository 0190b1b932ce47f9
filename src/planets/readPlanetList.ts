import { InputError } from "../errors.ts";
import type { ColumnChoices } from "./columnChoices.ts";
import type { Ambiguity, ColumnPlan } from "./columnPlan.ts";
import { quantityColumns } from "./columnTable.ts";
import { decodeText } from "./decodeText.ts";
import { type ColumnExplanation, explainColumns, misspellings } from "./explainColumns.ts";
import type { ListFormat, RawColumn, RawRecord, RawTable } from "./formats/rawTable.ts";
import { readTable } from "./formats/readTable.ts";
import { findConventions } from "./listConventions.ts";
import { refuseLostDecimals } from "./lostDecimals.ts";
import { readRow } from "./planetRow.ts";
import type { PlanetRow, QuantityName } from "./quantity.ts";
import { recogniseColumns } from "./recogniseColumns.ts";
import type { ListContext } from "./rowContext.ts";

export interface ListOptions extends ColumnChoices {
  /** Named in messages and origins. */
  readonly file: string;
  /** [m], the unit behind Earth radii in the list. */
  readonly earthRadius: number;
  /** The list must have a column of at least one of these; mass, minimum mass or radius where nothing is said. */
  readonly needs?: readonly QuantityName[];
}

export interface PlanetList {
  readonly file: string;
  readonly format: ListFormat;
  readonly columns: readonly RawColumn[];
  readonly plan: ColumnPlan;
  /** What the user should know about columns and file, one sentence each; complete once the rows have been read. */
  readonly notes: readonly string[];
  /** One row per row of the list, in order. Can be walked through once. */
  readonly rows: AsyncIterable<PlanetRow>;
}

/**
 * Reads a planet list of any of the known formats, found from its content, in constant memory.
 * Throws InputError: `empty-file`, `no-header`, `no-data`, `missing-columns`, `ambiguous-column`, and those of the format's reader;
 * what is wrong with one row only is an issue of that row.
 * Checked by test/planets/.
 */
export async function readPlanetList(chunks: AsyncIterable<Uint8Array>, options: ListOptions): Promise<PlanetList> {
  const { file, table, sample, batches } = await openTable(chunks, options);
  if (sample.length === 0) throw noData(file, table.columns);
  const { plan, ambiguities } = recogniseColumns(table.columns, sample, options);
  if (ambiguities.length > 0) throw ambiguousColumns(file, ambiguities);
  refuseLostDecimals(plan, table.columns, sample, file);
  requireColumns(file, table.columns, plan, options.needs ?? ["mass", "minimumMass", "radius"]);
  const conventions = findConventions(plan, sample, table.format);
  const context: ListContext = { file, format: table.format, columns: table.columns, plan, conventions };
  const notes = [...plan.notes, ...misspellings(explainColumns(table.columns, plan, [], sample))];
  return {
    file,
    format: table.format,
    columns: table.columns,
    plan,
    get notes() {
      return [...notes, ...(table.notes ?? [])];
    },
    rows: readRows(batches, context),
  };
}

/**
 * What `readPlanetList` would take every column of a list for; columns it could only guess at are marked ambiguous, and
 * `ambiguities` says how to settle them.
 */
export async function explainPlanetList(
  chunks: AsyncIterable<Uint8Array>,
  options: ListOptions,
): Promise<{
  format: ListFormat;
  columns: ColumnExplanation[];
  notes: readonly string[];
  ambiguities: readonly Ambiguity[];
}> {
  const { table, sample } = await openTable(chunks, options);
  const { plan, ambiguities } = recogniseColumns(table.columns, sample, options);
  const columns = explainColumns(table.columns, plan, ambiguities, sample);
  return { format: table.format, columns, notes: [...plan.notes, ...misspellings(columns)], ambiguities };
}

const SAMPLE_RECORDS = 500;

interface OpenTable {
  readonly file: string;
  readonly table: RawTable;
  /** The first records, which are also the first of `batches`. */
  readonly sample: readonly RawRecord[];
  readonly batches: AsyncIterable<readonly RawRecord[]>;
}

async function openTable(chunks: AsyncIterable<Uint8Array>, { file }: ListOptions): Promise<OpenTable> {
  const table = await readTable(decodeText(chunks, file), file);
  const iterator = table.batches[Symbol.asyncIterator]();
  const head: RawRecord[] = [];
  while (head.length < SAMPLE_RECORDS) {
    const next = await iterator.next();
    if (next.done) break;
    head.push(...next.value);
  }
  async function* batches(): AsyncGenerator<readonly RawRecord[]> {
    yield head;
    yield* { [Symbol.asyncIterator]: () => iterator };
  }
  return { file, table, sample: head.slice(0, SAMPLE_RECORDS), batches: batches() };
}

async function* readRows(batches: AsyncIterable<readonly RawRecord[]>, list: ListContext): AsyncGenerator<PlanetRow> {
  let row = 0;
  for await (const batch of batches) for (const record of batch) yield readRow(record, ++row, list);
}

const noData = (file: string, columns: readonly RawColumn[]): InputError =>
  new InputError(
    "no-data",
    `${file}: no row of data follows the header (${columns.map((column) => column.name).join(", ")}); ` +
      "the list needs one line per planet",
    { file },
  );

function requireColumns(
  file: string,
  columns: readonly RawColumn[],
  plan: ColumnPlan,
  needs: readonly QuantityName[],
): void {
  if (needs.some((quantity) => plan.quantities.has(quantity)) || canBeDerived(plan)) return;
  const wanted = needs.map((quantity) => quantityColumns[quantity].title).join(" or ");
  throw new InputError(
    "missing-columns",
    `${file}: no column of ${wanted} was recognised; the columns found are ${columns.map((column) => column.name).join(", ")}. ` +
      "Needed are columns such as name, mass_earth, mass_earth_minus, mass_earth_plus, radius_earth, radius_earth_minus, " +
      "radius_earth_plus; say which column is which with --column mass_earth=COLUMN",
    { file, found: columns.map((column) => column.name).join(",") },
  );
}

const canBeDerived = ({ quantities }: ColumnPlan): boolean =>
  (quantities.has("radiusRatio") && quantities.has("starRadius")) ||
  (quantities.has("velocityAmplitude") && quantities.has("period") && quantities.has("starMass"));

/** The error of a list with columns that could only be guessed at: every reading, with the option that settles for it. */
export function ambiguousColumns(file: string, ambiguities: readonly Ambiguity[]): InputError {
  const lines = ambiguities.flatMap(({ columns, readings }) => [
    `  ${columns.map((name) => `"${name}"`).join(", ")} could be`,
    ...readings.map(({ meaning, option }) => `    ${meaning}: ${quoted(option)}`),
  ]);
  return new InputError(
    "ambiguous-column",
    `${file}: some columns can be read in more than one way; say which with the option behind the right reading\n${lines.join("\n")}`,
    {
      file,
      column: ambiguities[0]?.columns[0],
      found: ambiguities.flatMap(({ columns }) => columns).join(","),
      remedy: ambiguities.flatMap(({ readings }) => readings.map(({ option }) => quoted(option))).join("\n"),
    },
  );
}

/** An option as a shell takes it where a column's name has blanks or signs in it. */
function quoted(option: string): string {
  const [name = "", value = ""] = option.split(/ (.*)/s);
  return /^[\w=.#-]*$/.test(value) ? option : `${name} '${value.replaceAll("'", "'\\''")}'`;
}
