import type { MeasuredQuantity, PlanetRow, QuantityName } from "../planets/quantity.ts";
import type { Discrepancy } from "./finding.ts";
import { quantitiesOf } from "./quantitiesOf.ts";
import type { RowRule } from "./rule.ts";

interface QuantityRuleText extends Omit<RowRule, "scope" | "test"> {
  /** The quantities looked at; all where nothing is said. */
  readonly among?: readonly QuantityName[];
  /** What is wrong with one quantity taken by itself, or undefined. */
  readonly fault: (quantity: MeasuredQuantity, row: PlanetRow) => string | undefined;
  readonly remedy: string;
}

/** Makes a rule of a fault that a single quantity can have. */
export function quantityRule({ among, fault, remedy, ...record }: QuantityRuleText): RowRule {
  const test = (row: PlanetRow): readonly Discrepancy[] =>
    quantitiesOf(row).flatMap(([name, quantity]) => {
      const explanation = among?.includes(name) === false ? undefined : fault(quantity, row);
      return explanation ? [{ row, quantity: name, value: quantity.value, explanation, remedy }] : [];
    });
  return { ...record, scope: "row", test };
}
