import type { MeasuredQuantity, PlanetRow, QuantityName } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import { times } from "../ratioInWords.ts";
import type { RowRule } from "../rule.ts";
import { ASSUMED_RELATIVE_ERROR } from "../significance.ts";
import { unitSlips } from "../unitSlips.ts";
import { roundingError } from "../written.ts";

/** The mean and the equatorial radius of Jupiter differ by 2.3 %; the other twin units by less. */
const UNIT_DIFFERENCE = 0.025;

const relativeRounding = (quantity: MeasuredQuantity) =>
  quantity.written === undefined ? ASSUMED_RELATIVE_ERROR : roundingError(quantity.written);

function compareTwins(
  row: PlanetRow,
  name: QuantityName,
  used: MeasuredQuantity,
  twin: MeasuredQuantity,
): readonly Discrepancy[] {
  if (!(used.value > 0 && twin.value > 0)) return [];
  const logRatio = Math.log(used.value / twin.value);
  const rounding = relativeRounding(used) + relativeRounding(twin);
  if (Math.abs(logRatio) <= UNIT_DIFFERENCE + rounding) return [];
  const slips = unitSlips.filter(
    (slip) => slip.quantity === name && Math.abs(logRatio + Math.log(slip.factor)) < UNIT_DIFFERENCE + rounding,
  );
  const cause = slips.map((slip) => slip.words).join(", or if ");
  return [
    {
      row,
      quantity: name,
      value: used.value,
      expected: twin.value,
      explanation: `${times(logRatio)} the value in column ${twin.origin.column}; ${
        cause ? `would fit if ${cause}` : "one of the two was updated without the other"
      }`,
      remedy: `settle which of ${used.origin.column} and ${twin.origin.column} is the published value`,
      severity: Math.abs(logRatio) > Math.LN2 ? "error" : undefined,
    },
  ];
}

function test(row: PlanetRow): readonly Discrepancy[] {
  return Object.entries(row.twins ?? {}).flatMap(([name, twins]) => {
    const used = row.quantities[name as QuantityName];
    return used && twins ? twins.flatMap((twin) => compareTwins(row, name as QuantityName, used, twin)) : [];
  });
}

/** Twins are one measurement in two units, so that only rounding and the choice of unit may part them, not its error. */
export const twinColumns: RowRule = {
  id: "twin-columns",
  scope: "row",
  severity: "warning",
  claim: "Columns that give one quantity in two units agree",
  formula: "|ln(value / twin)| ≤ 2.5 % + rounding of both as typed",
  source: "definition; 2.5 % covers the mean against the equatorial radius of Jupiter",
  test,
};
