import type { QuantitySource } from "./columnPlan.ts";
import { deriveQuantities } from "./deriveQuantities.ts";
import type { RawRecord } from "./formats/rawTable.ts";
import { measure } from "./measure.ts";
import { kindOfProvenance } from "./provenance.ts";
import type { MeasuredQuantity, PlanetRow, QuantityName, TextName } from "./quantity.ts";
import { type ListContext, RowContext } from "./rowContext.ts";

type Mutable<T> = { -readonly [K in keyof T]: T[K] };

interface FoundQuantities {
  readonly quantities: Partial<Record<QuantityName, MeasuredQuantity>>;
  readonly twins: Partial<Record<QuantityName, MeasuredQuantity[]>>;
}

/** One record of a list as a planet row: every cell interpreted, nothing lost, problems noted as issues. */
export function readRow(record: RawRecord, row: number, list: ListContext): PlanetRow {
  const context = new RowContext(record, list);
  const { line, cells, issues } = context;
  const texts = readTexts(cells, list.plan.texts);
  const found = readQuantities(context);
  if (found !== undefined) {
    applyProvenance(found, texts);
    deriveQuantities(found.quantities, (name) => list.plan.quantities.has(name));
  }
  return { row, line, name: nameOf(texts, list), ...(found ?? nothing), texts, cells, issues };
}

const nothing: FoundQuantities = { quantities: {}, twins: {} };

/** Undefined where the row's numbers may stand in the wrong columns. */
function readQuantities(row: RowContext): FoundQuantities | undefined {
  if (isShifted(row)) return undefined;
  const found: FoundQuantities = { quantities: {}, twins: {} };
  for (const [name, sources] of row.list.plan.quantities) readQuantity(name, sources, row, found);
  return isShiftedByBlank(row) ? undefined : found;
}

function readQuantity(
  name: QuantityName,
  sources: readonly QuantitySource[],
  row: RowContext,
  { quantities, twins }: FoundQuantities,
): void {
  for (const source of sources) {
    const quantity = measure(source, row);
    if (quantity === undefined) continue;
    if (quantities[name] === undefined) quantities[name] = quantity;
    else twins[name] = [...(twins[name] ?? []), quantity];
  }
}

function readTexts(
  cells: readonly string[],
  columns: ReadonlyMap<TextName, number>,
): Partial<Record<TextName, string>> {
  const texts: Mutable<PlanetRow["texts"]> = {};
  for (const [text, index] of columns) {
    const cell = cells[index];
    if (cell !== undefined && cell !== "") texts[text] = cell;
  }
  return texts;
}

/** Lists without a name column give the host and the planet's letter, or at least the host. */
function nameOf({ name, host, letter }: PlanetRow["texts"], { plan }: ListContext): string {
  if (name !== undefined) return name;
  if (host !== undefined && letter !== undefined) return `${host} ${letter}`;
  return plan.texts.has("name") ? "" : (host ?? "");
}

/**
 * Whether the numbers may stand in the wrong columns: more cells than columns, the extra ones not empty. Between blanks
 * no cell can be empty, so that there a missing cell shifts all that follow it.
 */
function isShifted(row: RowContext): boolean {
  const { cells } = row;
  const width = row.list.columns.length;
  if (cells.length === width) return false;
  const hasExtra = cells.slice(width).some((cell) => cell.trim() !== "");
  if (cells.length > width && !hasExtra) return false;
  const shifted = hasExtra || row.list.format === "blank-separated";
  const consequence = shifted ? "its numbers may be in the wrong columns and are not used" : "the rest are missing";
  const message = `the row has ${cells.length} cells, the header ${width}; ${consequence}`;
  row.report("ragged-row", Math.min(cells.length, width) - 1, message);
  return shifted;
}

/** Text among the numbers of a blank-separated row comes from a blank in its name, which shifted the numbers. */
function isShiftedByBlank(row: RowContext): boolean {
  const text = row.issues.find((issue) => issue.code === "not-a-number");
  if (row.list.format !== "blank-separated" || text === undefined) return false;
  const message =
    `"${text.found}" stands in the column of numbers "${text.origin.column}": the row seems shifted by a blank in a name, ` +
    "and its numbers are not used; quote names that hold blanks";
  row.issues.push({ ...text, code: "ragged-row", message });
  return true;
}

/** What the provenance columns, and a minimum mass repeated as the mass, say about what the numbers are. */
function applyProvenance({ quantities, twins }: FoundQuantities, texts: PlanetRow["texts"]): void {
  const mark = (name: "mass" | "radius", kind: MeasuredQuantity["kind"]): void => {
    if (kind === "measured") return;
    const quantity = quantities[name];
    if (quantity !== undefined) quantities[name] = { ...quantity, kind };
    twins[name] = twins[name]?.map((twin) => ({ ...twin, kind }));
  };
  mark("mass", kindOfProvenance(texts.massProvenance ?? ""));
  mark("radius", kindOfProvenance(texts.radiusProvenance ?? ""));
  const { kind } = quantities.mass ?? {};
  if ((kind === "measured" || kind === "no-uncertainty") && isMinimumInDisguise(quantities)) mark("mass", "minimum");
}

/** Nearly edge-on, M sin i is the mass within this; then the list may rightly give one number for both. */
const EDGE_ON_TOLERANCE = 0.01;

function isMinimumInDisguise({ mass, minimumMass, inclination }: FoundQuantities["quantities"]): boolean {
  if (mass === undefined || minimumMass === undefined || mass.value !== minimumMass.value) return false;
  return inclination === undefined || 1 - Math.sin(inclination.value) > EDGE_ON_TOLERANCE;
}
