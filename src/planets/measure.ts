import type { ListConventions, QuantitySource } from "./columnPlan.ts";
import { quantityColumns } from "./columnTable.ts";
import { isMissing, readPlainNumber, readTypedNumber, type TypedNumber } from "./numberCell.ts";
import type { LimitCoding, MeasuredQuantity, QuantityKind, QuantityName, RowIssue } from "./quantity.ts";

/** What `measure` needs to know beyond the cells. */
export interface MeasureContext extends ListConventions {
  readonly cells: readonly string[];
  readonly place: (index: number) => RowIssue["origin"];
  readonly issue: (code: string, index: number, message: string) => void;
  readonly decimalComma: boolean;
  /** SI per unit of the source, with the user's Earth radius. */
  readonly factor: number;
}

interface Reading {
  readonly value: number;
  readonly minus?: number;
  readonly plus?: number;
  readonly kind: QuantityKind;
  readonly limitCoding?: LimitCoding;
}

const mayBeNegative = new Set<QuantityName>(["starMetallicity", "rightAscension", "declination"]);
const mayBeZero = new Set<QuantityName>([
  "eccentricity",
  "inclination",
  "insolation",
  "starMetallicity",
  "rightAscension",
  "declination",
]);

/**
 * One quantity of one row, or undefined where the row has none. What lists mean by their cells, in order: a limit that
 * is typed or flagged; zero with an upper error only, an infinite error, errors equal to the value: limits too; errors on
 * both sides: measured; everything else: no uncertainty given. Provenance is added by the caller, who sees the whole row.
 */
export function measure(source: QuantitySource, context: MeasureContext): MeasuredQuantity | undefined {
  const text = context.cells[source.value];
  if (text === undefined) return undefined;
  const typed = readCell(text, source.value, source.quantity, context);
  if (typed === undefined) return undefined;
  const reading = interpret(typed, source, context);
  if (reading === undefined) return undefined;
  const origin = context.place(source.value);
  const { value, minus, plus, kind, limitCoding } = toSI(reading, source, context.factor);
  return { value, minus, plus, kind, limitCoding, written: text.trim(), origin };
}

function readCell(
  text: string,
  index: number,
  quantity: QuantityName,
  context: MeasureContext,
): TypedNumber | undefined {
  const value = readPlainNumber(text);
  if (value !== undefined) return { value };
  if (isMissing(text)) return undefined;
  const typed = readTypedNumber(text, context.decimalComma);
  if (typed !== undefined && Number.isFinite(typed.value)) return typed;
  const found = typed === undefined ? "is not a number" : "is not finite";
  context.issue(
    "not-a-number",
    index,
    `${quantityColumns[quantity].title} "${text.trim()}" ${found}; the cell is ignored`,
  );
  return undefined;
}

function interpret(typed: TypedNumber, source: QuantitySource, context: MeasureContext): Reading | undefined {
  const { value } = typed;
  const { plus, minus } = readErrors(typed, source, context);
  const isSigned = mayBeNegative.has(source.quantity) || source.unit.isLogarithm === true;
  const own = quantityColumns[source.quantity];
  if (value < 0 && !isSigned) {
    if (isSentinel(value) && plus === undefined && minus === undefined) return undefined;
    context.issue(
      `negative-${kebab(own.ownName)}`,
      source.value,
      `${own.title} ${value} is negative; the value is ignored`,
    );
    return undefined;
  }
  const flag = readFlag(source, context);
  const errors = { minus: finite(minus), plus: finite(plus) };
  if (value === 0 && !isSigned && plus !== undefined && plus > 0 && (minus === undefined || minus === 0)) {
    return { value: plus, ...errors, kind: "upper-limit", limitCoding: "zero-with-error" };
  }
  if (value === 0 && !isSigned && !mayBeZero.has(source.quantity)) {
    context.issue(`zero-${kebab(own.ownName)}`, source.value, `${own.title} is 0; the value is ignored`);
    return undefined;
  }
  if (typed.limit !== undefined) return { value, ...errors, kind: `${typed.limit}-limit`, limitCoding: "typed" };
  if (flag === "unknown") return { value, ...errors, kind: "no-uncertainty" };
  if (flag !== undefined) return { value, ...errors, kind: flag, limitCoding: "flag" };
  if (minus !== errors.minus || plus !== errors.plus) {
    // Unbounded upwards only: a lower limit. Both sides: lists write it for values that nothing bounds from below.
    const kind = minus === errors.minus && minus !== undefined ? "lower-limit" : "upper-limit";
    return { value, ...errors, kind, limitCoding: "infinite-error" };
  }
  if (value > 0 && minus === value && plus === value && !isSigned) {
    return { value, ...errors, kind: "upper-limit", limitCoding: "error-equals-value" };
  }
  const isMeasured = minus !== undefined && plus !== undefined && minus > 0 && plus > 0;
  return { value, ...errors, kind: isMeasured ? "measured" : "no-uncertainty" };
}

/** Lists write -1, or a row of nines, for a missing value of something that cannot be negative. */
const isSentinel = (value: number): boolean => value === -1 || /^-9{2,}(\.[09]+)?$/.test(String(value));

const kebab = (name: string): string => name.replace(/_/g, "-");
const finite = (error: number | undefined): number | undefined => (Number.isFinite(error) ? error : undefined);

/** Errors as positive sizes; undefined where missing, infinite where the list says that there is no bound. */
function readErrors(
  typed: TypedNumber,
  source: QuantitySource,
  context: MeasureContext,
): { minus?: number; plus?: number } {
  if (typed.minus !== undefined || typed.plus !== undefined) return { minus: typed.minus, plus: typed.plus };
  if (source.minus === undefined && source.plus === undefined) return {};
  let plus = readError(source.plus, context);
  let minus = source.minus === source.plus ? plus : readError(source.minus, context);
  if (source.errorsAreBounds) {
    if (plus !== undefined) plus -= typed.value;
    if (minus !== undefined) minus = typed.value - minus;
  }
  if (plus === -1) plus = undefined;
  if (minus === -1 && (plus === undefined || !context.lowerErrorsAreSigned)) minus = undefined;
  if (plus !== undefined && plus < 0 && minus !== undefined && minus > 0) {
    const message = `the upper error ${plus} is negative and the lower one ${minus} positive; they may be swapped`;
    context.issue("error-signs-swapped", source.plus ?? source.value, message);
  }
  return {
    plus: plus === undefined ? undefined : Math.abs(plus),
    minus: minus === undefined ? undefined : Math.abs(minus),
  };
}

function readError(index: number | undefined, context: MeasureContext): number | undefined {
  const text = index === undefined ? undefined : context.cells[index];
  if (index === undefined || text === undefined || text === "") return undefined;
  const value = readPlainNumber(text);
  if (value !== undefined) return value;
  if (/^[+-]?nan$/i.test(text.trim()) && !context.nanIsMissing) return Infinity;
  if (isMissing(text)) return undefined;
  const typed = readTypedNumber(text, context.decimalComma);
  if (typed !== undefined && typed.limit === undefined) return typed.value;
  context.issue("not-a-number", index, `the error "${text.trim()}" is not a number; the cell is ignored`);
  return undefined;
}

function readFlag(
  source: QuantitySource,
  context: MeasureContext,
): "upper-limit" | "lower-limit" | "unknown" | undefined {
  const text = source.limit === undefined ? "" : (context.cells[source.limit] ?? "").trim();
  if (text === "0" || text === "" || isMissing(text)) return undefined;
  const flag = Number(text);
  if (flag === 0) return undefined;
  if (flag === 1 || text.startsWith("<")) return "upper-limit";
  if (flag === -1 || text.startsWith(">")) return "lower-limit";
  context.issue(
    "unknown-limit-flag",
    source.limit ?? source.value,
    `the limit flag "${text}" is neither 0, 1 (upper limit) nor -1 (lower limit); the value is not used as a measurement`,
  );
  return "unknown";
}

function toSI(reading: Reading, source: QuantitySource, factor: number): Reading {
  const { value, minus, plus } = reading;
  if (source.unit.isLogarithm === true) {
    const linear = factor * 10 ** value;
    return {
      ...reading,
      value: linear,
      minus: minus === undefined ? undefined : linear * (1 - 10 ** -minus),
      plus: plus === undefined ? undefined : linear * (10 ** plus - 1),
    };
  }
  return {
    ...reading,
    value: value * factor,
    minus: minus === undefined ? undefined : minus * factor,
    plus: plus === undefined ? undefined : plus * factor,
  };
}
