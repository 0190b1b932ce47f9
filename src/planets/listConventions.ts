import type { ColumnPlan, ListConventions } from "./columnPlan.ts";
import type { ListFormat, RawRecord } from "./formats/rawTable.ts";

/** Looks at a sample of the rows for conventions that single cells do not tell. */
export function findConventions(plan: ColumnPlan, sample: readonly RawRecord[], format: ListFormat): ListConventions {
  const sources = [...plan.quantities.values()].flat();
  const cells = (index: number | undefined): string[] =>
    index === undefined ? [] : sample.map((record) => record.cells[index]?.trim() ?? "");
  const nanIsMissing = sources.some((source) => cells(source.value).some((cell) => /^nan$/i.test(cell)));
  const isMinusOne = (cell: string): boolean => Number(cell) === -1;
  const minusOneIsMissing = sources.some(
    ({ value, minus, plus }) =>
      (plus !== minus && cells(plus).some(isMinusOne)) || (minus !== undefined && cells(value).some(isMinusOne)),
  );
  return { nanIsMissing, minusOneIsMissing, decimalComma: usesDecimalComma(format) };
}

/** A comma inside a cell can only be a decimal one where commas do not separate the cells. */
const usesDecimalComma = (format: ListFormat): boolean =>
  format === "semicolon-separated" || format === "tab-separated";
