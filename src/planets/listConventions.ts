import type { ColumnPlan, ListConventions } from "./columnPlan.ts";
import type { ListFormat, RawRecord } from "./formats/rawTable.ts";

/** Looks at a sample of the rows for conventions that single cells do not tell. */
export function findConventions(plan: ColumnPlan, sample: readonly RawRecord[]): ListConventions {
  const sources = [...plan.quantities.values()].flat();
  const cells = (index: number | undefined): string[] =>
    index === undefined ? [] : sample.map((record) => record.cells[index]?.trim() ?? "");
  const nanIsMissing = sources.some((source) => cells(source.value).some((cell) => /^nan$/i.test(cell)));
  const lowerErrors = sources
    .filter((source) => source.minus !== source.plus)
    .flatMap((source) => cells(source.minus))
    .map(Number);
  const lowerErrorsAreSigned = lowerErrors.some((error) => error < 0 && error !== -1);
  return { nanIsMissing, lowerErrorsAreSigned };
}

/** A comma inside a cell can only be a decimal one where commas do not separate the cells. */
export const usesDecimalComma = (format: ListFormat): boolean =>
  format === "semicolon-separated" || format === "tab-separated";
