import type { QuantitySource } from "./columnPlan.ts";
import { isMissing, numberAdvice, readPlainNumber, readTypedNumber, type TypedNumber } from "./numberCell.ts";
import type { RowContext } from "./rowContext.ts";

/** Errors as positive sizes; undefined where missing, infinite where the list says that there is no bound. */
export interface Errors {
  readonly minus: number | undefined;
  readonly plus: number | undefined;
}

const none: Errors = { minus: undefined, plus: undefined };

/** The errors typed into the cell itself or, without those, the ones of the error columns. */
export function readErrors(typed: TypedNumber, source: QuantitySource, row: RowContext): Errors {
  if (typed.minus !== undefined || typed.plus !== undefined) return { minus: typed.minus, plus: typed.plus };
  if (source.minus === undefined && source.plus === undefined) return none;
  let plus = readError(source.plus, row);
  let minus = source.minus === source.plus ? plus : readError(source.minus, row);
  if (source.errorsAreBounds) return distancesToBounds(typed.value, minus, plus, source, row);
  // No upper error is negative; a lower one may be, in lists that sign it.
  if (plus === -1) plus = undefined;
  if (minus === -1 && (plus === undefined || row.list.conventions.minusOneIsMissing)) minus = undefined;
  if (plus !== undefined && plus < 0 && minus !== undefined && minus > 0) {
    const message = `the upper error ${plus} is negative and the lower one ${minus} positive; they may be swapped`;
    row.report("error-signs-swapped", source.plus ?? source.value, message);
  }
  return { minus: minus && Math.abs(minus), plus: plus && Math.abs(plus) };
}

function distancesToBounds(
  value: number,
  lower: number | undefined,
  upper: number | undefined,
  source: QuantitySource,
  row: RowContext,
): Errors {
  if ((lower ?? value) <= value && value <= (upper ?? value)) {
    return {
      minus: lower === undefined ? undefined : value - lower,
      plus: upper === undefined ? undefined : upper - value,
    };
  }
  const message = `the value ${value} is not between its bounds ${lower ?? ""} and ${upper ?? ""}, which are ignored`;
  row.report("value-outside-bounds", source.value, message);
  return none;
}

function readError(index: number | undefined, row: RowContext): number | undefined {
  const text = index === undefined ? undefined : row.cells[index];
  if (index === undefined || text === undefined || text === "") return undefined;
  const value = readPlainNumber(text);
  if (value !== undefined) return value;
  const { nanIsMissing, comma } = row.list.conventions;
  if (!nanIsMissing && /^[+-]?nan$/i.test(text.trim())) return Infinity;
  if (isMissing(text)) return undefined;
  const typed = readTypedNumber(text, comma);
  if (typed !== undefined && typed.limit === undefined) return typed.value;
  row.report(
    "not-a-number",
    index,
    `the error "${text.trim()}" is not a number; the cell is ignored${numberAdvice(text)}`,
  );
  return undefined;
}
