import { median } from "simple-statistics";
import { InputError } from "../errors.ts";
import type { ColumnPlan, QuantitySource } from "./columnPlan.ts";
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
  semiMajorAxis: 1.5e15, // 10 000 au
  period: 3e12, // 100 000 years
};
/** Quantities hardly ever measured to whole numbers in a whole list; temperatures, for one, are. */
const fractional: readonly QuantityName[] = [
  "radius",
  "mass",
  "minimumMass",
  "eccentricity",
  "starMass",
  "starRadius",
  "density",
  "semiMajorAxis",
  "period",
  "insolation",
];
const SMALLEST_SAMPLE = 5;
const FEWEST_COLUMNS = 2;

/**
 * Refuses a list of which several columns are whole throughout that hardly ever are, one of them impossible, as
 * spreadsheets with another decimal mark make them: 1.234 becomes 1234. Whole numbers alone are no evidence: many honest
 * lists round their masses. Throws `lost-decimal-points` with the evidence.
 */
export function refuseLostDecimals(
  plan: ColumnPlan,
  columns: readonly RawColumn[],
  sample: readonly RawRecord[],
  file: string,
): void {
  const whole: string[] = [];
  const impossible: string[] = [];
  for (const quantity of fractional) {
    const source = plan.quantities.get(quantity)?.[0];
    const middle = source && wholeMedian(source, sample);
    if (source === undefined || middle === undefined) continue;
    const name = columns[source.value]?.name ?? "";
    whole.push(`"${name}"`);
    if (middle * source.factor > (impossibleMedians[quantity] ?? Infinity)) {
      impossible.push(`half of column "${name}" (${quantityColumns[quantity].title}) is above ${middle}`);
    }
  }
  if (impossible.length === 0 || whole.length < FEWEST_COLUMNS) return;
  const evidence = `none in ${whole.join(", ")} has one, and ${impossible.join("; ")}`;
  throw new InputError(
    "lost-decimal-points",
    `${file}: the numbers seem to have lost their decimal points: ${evidence}. ` +
      "Fetch the list again and open it without letting a spreadsheet change the numbers",
    { file, found: evidence },
  );
}

/** The median of a column whose numbers are whole without exception; undefined for other columns, and for few numbers. */
function wholeMedian({ value }: QuantitySource, sample: readonly RawRecord[]): number | undefined {
  const cells = sample.map((record) => record.cells[value]?.trim() ?? "").filter((cell) => Number(cell) > 0);
  if (cells.length < SMALLEST_SAMPLE || cells.some((cell) => !/^\d+$/.test(cell))) return undefined;
  return median(cells.map(Number));
}
