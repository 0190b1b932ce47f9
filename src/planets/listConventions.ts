import type { ColumnPlan, CommaMeaning, ListConventions, QuantitySource } from "./columnPlan.ts";
import type { ListFormat, RawRecord } from "./formats/rawTable.ts";
import { isSigned } from "./measure.ts";
import { readPlainNumber } from "./numberCell.ts";

/** Looks at a sample of the rows for conventions that single cells do not tell. */
export function findConventions(plan: ColumnPlan, sample: readonly RawRecord[], format: ListFormat): ListConventions {
  const sources = [...plan.quantities.values()].flat();
  const cells = (index: number | undefined): string[] =>
    index === undefined ? [] : sample.map((record) => record.cells[index]?.trim() ?? "");
  const numbersOf = ({ value, minus, plus }: QuantitySource): string[] => [value, minus, plus].flatMap(cells);
  const nanIsMissing = sources.some((source) => cells(source.value).some((cell) => /^nan$/i.test(cell)));
  const isMinusOne = (cell: string): boolean => Number(cell) === -1;
  const minusOneIsMissing = sources
    .filter((source) => !isSigned(source))
    .some(
      ({ value, minus, plus }) =>
        (plus !== minus && cells(plus).some(isMinusOne)) || (minus !== undefined && cells(value).some(isMinusOne)),
    );
  return { nanIsMissing, minusOneIsMissing, comma: commaMeaning(format, sources.flatMap(numbersOf)) };
}

/** A comma inside a cell can only be a decimal one where commas do not separate the cells. */
function commaMeaning(format: ListFormat, numbers: readonly string[]): CommaMeaning {
  if (format !== "semicolon-separated" && format !== "tab-separated") return "none";
  const hasPoints = numbers.some((cell) => cell.includes(".") && readPlainNumber(cell) !== undefined);
  return hasPoints ? "unclear" : "decimal";
}
