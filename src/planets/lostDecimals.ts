import { InputError } from "../errors.ts";
import type { ColumnPlan } from "./columnPlan.ts";
import { quantityColumns } from "./columnTable.ts";
import type { RawColumn, RawRecord } from "./formats/rawTable.ts";
import type { QuantityName } from "./quantity.ts";

/** Medians in SI that no list of planets reaches; whole numbers beyond them have lost their decimal points. */
const impossibleMedians: Readonly<Partial<Record<QuantityName, number>>> = {
  radius: 2e8, // 3 Jupiter radii
  mass: 3e29, // 150 Jupiter masses
  eccentricity: 1,
  starMass: 2e32, // 100 solar masses
  starRadius: 7e10, // 100 solar radii
  density: 1e6,
};
const SMALLEST_SAMPLE = 5;
const FEWEST_COLUMNS = 2;

/**
 * Refuses a list whose numbers are whole throughout and impossible in at least two columns, as spreadsheets with another
 * decimal mark make them: 1.234 becomes 1234. Throws `lost-decimal-points` with the evidence.
 */
export function refuseLostDecimals(
  plan: ColumnPlan,
  columns: readonly RawColumn[],
  sample: readonly RawRecord[],
  file: string,
): void {
  const evidence: string[] = [];
  for (const [quantity, [source]] of plan.quantities) {
    const limit = impossibleMedians[quantity];
    if (limit === undefined || source === undefined) continue;
    const cells = sample.map((record) => record.cells[source.value]?.trim() ?? "").filter((cell) => Number(cell) > 0);
    if (cells.length < SMALLEST_SAMPLE) continue;
    if (cells.some((cell) => !/^\d+$/.test(cell))) return;
    const median = cells.map(Number).toSorted((a, b) => a - b)[Math.floor(cells.length / 2)] ?? 0;
    if (median * source.unit.factor > limit) {
      evidence.push(
        `half of column "${columns[source.value]?.name}" (${quantityColumns[quantity].title}) is above ${median}`,
      );
    }
  }
  if (evidence.length < FEWEST_COLUMNS) return;
  throw new InputError(
    "lost-decimal-points",
    `${file}: the numbers seem to have lost their decimal points: none has one, and ${evidence.join("; ")}. ` +
      "Fetch the list again and open it without letting a spreadsheet change the numbers",
    { file, found: evidence.join("; ") },
  );
}
