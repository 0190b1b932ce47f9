import type { MeasuredQuantity, PlanetRow, QuantityName, RowIssue } from "../../src/planets/quantity.ts";

const origin = { file: "invented.csv", line: 2, column: "x" };

export function quantity(value: number, rest: Partial<MeasuredQuantity> = {}): MeasuredQuantity {
  return { value, kind: "measured", origin, ...rest };
}

/** A row as a list reader makes it. */
export function rowWith(
  quantities: Partial<Record<QuantityName, MeasuredQuantity>>,
  issueCodes: readonly string[] = [],
): PlanetRow {
  const issues = issueCodes.map((code): RowIssue => ({ code, origin, found: "?", message: "invented" }));
  return { row: 1, line: 2, name: "Invented b", quantities, texts: {}, cells: [], issues };
}
