import type { ColumnPlan, ListConventions, QuantitySource } from "./columnPlan.ts";
import { deriveQuantities } from "./deriveQuantities.ts";
import type { RawColumn, RawRecord } from "./formats/rawTable.ts";
import { type MeasureContext, measure } from "./measure.ts";
import { kindOfProvenance } from "./provenance.ts";
import type { MeasuredQuantity, Origin, PlanetRow, QuantityName, RowIssue, TextName } from "./quantity.ts";
import { siFactor } from "./unitTable.ts";

export interface RowReader {
  readonly file: string;
  readonly columns: readonly RawColumn[];
  readonly plan: ColumnPlan;
  readonly conventions: ListConventions;
  readonly decimalComma: boolean;
  /** [m] */
  readonly earthRadius: number;
}

type Mutable<T> = { -readonly [K in keyof T]: T[K] };

/** One record of a list as a planet row: every cell interpreted, nothing lost, problems noted as issues. */
export function readRow(record: RawRecord, row: number, reader: RowReader): PlanetRow {
  const { line, cells } = record;
  const issues: RowIssue[] = [];
  const place = (index: number): Origin => ({ file: reader.file, line, column: reader.columns[index]?.name ?? "" });
  const report = (code: string, index: number, message: string): void => {
    issues.push({ code, origin: place(index), found: cells[index] ?? "", message });
  };
  const texts = readTexts(cells, reader.plan.texts);
  const isShifted = checkWidth(cells, reader.columns.length, report);
  const found: FoundQuantities = { quantities: {}, twins: {} };
  if (!isShifted) {
    for (const [name, sources] of reader.plan.quantities) {
      const context = { ...reader.conventions, cells, place, issue: report, decimalComma: reader.decimalComma };
      readQuantity(name, sources, context, reader.earthRadius, found);
    }
    applyProvenance(found, texts);
    deriveQuantities(found.quantities, (name) => reader.plan.quantities.has(name));
  }
  return { row, line, name: nameOf(texts), quantities: found.quantities, twins: found.twins, texts, cells, issues };
}

interface FoundQuantities {
  readonly quantities: Partial<Record<QuantityName, MeasuredQuantity>>;
  readonly twins: Partial<Record<QuantityName, MeasuredQuantity[]>>;
}

function readQuantity(
  name: QuantityName,
  sources: readonly QuantitySource[],
  context: Omit<MeasureContext, "factor">,
  earthRadius: number,
  found: FoundQuantities,
): void {
  for (const source of sources) {
    const quantity = measure(source, { ...context, factor: siFactor(source.unit, earthRadius) });
    if (quantity === undefined) continue;
    if (found.quantities[name] === undefined) found.quantities[name] = quantity;
    else found.twins[name] = [...(found.twins[name] ?? []), quantity];
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

/** Lists without a name column give the host and the planet's letter. */
const nameOf = ({ name, host, letter }: PlanetRow["texts"]): string =>
  name ?? (host !== undefined && letter !== undefined ? `${host} ${letter}` : (host ?? ""));

/** Whether the numbers may stand in the wrong columns: more cells than columns, the extra ones not empty. */
function checkWidth(
  cells: readonly string[],
  width: number,
  report: (code: string, index: number, message: string) => void,
): boolean {
  if (cells.length === width) return false;
  const isShifted = cells.slice(width).some((cell) => cell.trim() !== "");
  if (cells.length > width && !isShifted) return false;
  const consequence = isShifted
    ? "its numbers may stand in the wrong columns and are not used"
    : "the rest counts as missing";
  report(
    "ragged-row",
    Math.min(cells.length, width) - 1,
    `the row has ${cells.length} cells, the header ${width}; ${consequence}`,
  );
  return isShifted;
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
