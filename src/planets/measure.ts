import type { QuantitySource } from "./columnPlan.ts";
import { quantityColumns } from "./columnTable.ts";
import { isMissing, numberAdvice, readPlainNumber, readTypedNumber, type TypedNumber } from "./numberCell.ts";
import type { LimitCoding, MeasuredQuantity, QuantityKind, QuantityName } from "./quantity.ts";
import { type Errors, readErrors } from "./readErrors.ts";
import type { RowContext } from "./rowContext.ts";
import { readSexagesimal } from "./sexagesimal.ts";

const positions = new Set<QuantityName>(["rightAscension", "declination"]);
const mayBeNegative = new Set<QuantityName>(["starMetallicity", ...positions]);
const mayBeZero = new Set<QuantityName>(["eccentricity", "inclination", "insolation", ...mayBeNegative]);

/** Whether the numbers of a column may be negative: logarithms, positions, metallicities. */
export const isSigned = ({ quantity, unit }: QuantitySource): boolean =>
  mayBeNegative.has(quantity) || unit.isLogarithm === true;

/**
 * One quantity of one row, or undefined where the row has none. What lists mean by their cells, in order: a limit that
 * is typed or flagged; zero with an upper error only, an infinite error, errors equal to the value: limits too; errors on
 * both sides: measured; everything else: no uncertainty given. Provenance is added by the caller, who sees the whole row.
 */
export function measure(source: QuantitySource, row: RowContext): MeasuredQuantity | undefined {
  const text = row.cells[source.value];
  if (text === undefined || text === "") return undefined;
  const typed = readCell(text, source, row);
  if (typed === undefined) return undefined;
  const { value } = typed;
  const errors = readErrors(typed, source, row);
  const signed = isSigned(source);
  if (!signed && value < 0) return refuseNegative(value, errors, source, row);
  if (!signed && value === 0) return measureZero(text, errors, source, row);
  const [kind, coding] = classifyValue(typed, errors, source, row);
  return toQuantity(value, errors, kind, coding, text, source, row);
}

function readCell(text: string, source: QuantitySource, row: RowContext): TypedNumber | undefined {
  const value = readPlainNumber(text);
  if (value !== undefined) return { value };
  if (isMissing(text)) return undefined;
  if (positions.has(source.quantity)) return readPosition(text, source);
  const typed = readTypedNumber(text, row.list.conventions.comma);
  if (typed !== undefined && Number.isFinite(typed.value)) return typed;
  const { title } = quantityColumns[source.quantity];
  const found = typed === undefined ? "is not a number" : "is not finite";
  row.report(
    "not-a-number",
    source.value,
    `${title} "${text.trim()}" ${found}; the cell is ignored${numberAdvice(text)}`,
  );
  return undefined;
}

/** Positions serve to find a planet in another list; one that cannot be read is no fault of the row. */
function readPosition(text: string, { quantity }: QuantitySource): TypedNumber | undefined {
  const value = readSexagesimal(text, quantity === "rightAscension" && !/[d°]/.test(text));
  return value === undefined ? undefined : { value };
}

/** Lists write -1, or a row of nines, for a missing value of something that cannot be negative. */
const isSentinel = (value: number): boolean => value === -1 || /^-9{2,}(\.[09]+)?$/.test(String(value));

function refuseNegative(value: number, { minus, plus }: Errors, source: QuantitySource, row: RowContext): undefined {
  if (isSentinel(value) && plus === undefined && minus === undefined) return;
  const { title, ownName } = quantityColumns[source.quantity];
  row.report(`negative-${kebab(ownName)}`, source.value, `${title} ${value} is negative; the value is ignored`);
}

/** Zero with an upper error only says "less than that error"; where zero is possible it is a value; else it is none. */
function measureZero(
  text: string,
  errors: Errors,
  source: QuantitySource,
  row: RowContext,
): MeasuredQuantity | undefined {
  const { minus, plus } = errors;
  if (plus !== undefined && plus > 0 && Number.isFinite(plus) && (minus === undefined || minus === 0)) {
    return toQuantity(plus, errors, "upper-limit", "zero-with-error", text, source, row);
  }
  if (mayBeZero.has(source.quantity)) return toQuantity(0, errors, kindByErrors(errors), undefined, text, source, row);
  const { title, ownName } = quantityColumns[source.quantity];
  row.report(`zero-${kebab(ownName)}`, source.value, `${title} is 0; the value is ignored`);
  return undefined;
}

const kebab = (name: string): string => name.replace(/_/g, "-");

function classifyValue(
  { value, limit }: TypedNumber,
  errors: Errors,
  source: QuantitySource,
  row: RowContext,
): [QuantityKind, LimitCoding | undefined] {
  if (limit !== undefined) return [`${limit}-limit`, "typed"];
  const flag = readFlag(source, row);
  if (flag === "unknown") return ["no-uncertainty", undefined];
  if (flag !== undefined) return [flag, "flag"];
  const { minus, plus } = errors;
  // Unbounded upwards only: a lower limit. Both sides: lists write it for values that nothing bounds from below.
  if (minus === Infinity) return ["upper-limit", "infinite-error"];
  if (plus === Infinity) return [minus === undefined ? "upper-limit" : "lower-limit", "infinite-error"];
  if (!isSigned(source) && minus === value && plus === value) return ["upper-limit", "error-equals-value"];
  return [kindByErrors(errors), undefined];
}

const kindByErrors = ({ minus, plus }: Errors): QuantityKind =>
  minus !== undefined && plus !== undefined && minus > 0 && plus > 0 ? "measured" : "no-uncertainty";

const upperFlag = /^(?:[<≤]|&lt;|ul?$|upper)/i;
const lowerFlag = /^(?:[>≥]|&gt;|ll?$|lower)/i;

function readFlag(source: QuantitySource, row: RowContext): "upper-limit" | "lower-limit" | "unknown" | undefined {
  if (source.limit === undefined) return undefined;
  const text = (row.cells[source.limit] ?? "").trim();
  if (text === "0" || text === "" || isMissing(text)) return undefined;
  const flag = Number(text);
  if (flag === 0) return undefined;
  if (flag === 1 || upperFlag.test(text)) return "upper-limit";
  if (flag === -1 || lowerFlag.test(text)) return "lower-limit";
  const message = `the limit flag "${text}" is neither 0, 1 (or <, upper) nor -1 (or >, lower); the value is not used as a measurement`;
  row.report("unknown-limit-flag", source.limit, message);
  return "unknown";
}

/** In SI; infinite errors, having said what they say, are left out. */
function toQuantity(
  value: number,
  errors: Errors,
  kind: QuantityKind,
  limitCoding: LimitCoding | undefined,
  text: string,
  { factor, unit, value: index }: QuantitySource,
  row: RowContext,
): MeasuredQuantity {
  const minus = errors.minus === Infinity ? undefined : errors.minus;
  const plus = errors.plus === Infinity ? undefined : errors.plus;
  const isLogarithm = unit.isLogarithm === true;
  const linear = isLogarithm ? factor * 10 ** value : value * factor;
  const below = isLogarithm ? (size: number) => linear * (1 - 10 ** -size) : (size: number) => size * factor;
  const above = isLogarithm ? (size: number) => linear * (10 ** size - 1) : (size: number) => size * factor;
  return {
    value: linear,
    minus: minus === undefined ? undefined : below(minus),
    plus: plus === undefined ? undefined : above(plus),
    kind,
    limitCoding,
    written: text.trim(),
    origin: row.place(index),
  };
}
