import { nearestName } from "./columnChoices.ts";
import { columnKey } from "./columnKey.ts";
import type { Ambiguity, ColumnPlan, QuantitySource, UnitSource } from "./columnPlan.ts";
import { quantityColumns } from "./columnTable.ts";
import type { RawColumn, RawRecord } from "./formats/rawTable.ts";
import { ownColumn } from "./ownColumn.ts";
import type { QuantityName, TextName } from "./quantity.ts";

/** What the reader takes one column of a list for. */
export interface ColumnExplanation {
  /** From 1. */
  readonly number: number;
  readonly column: string;
  readonly role: "value" | "error" | "lower error" | "upper error" | "limit flag" | "text" | "ambiguous" | "not used";
  readonly meaning?: QuantityName | TextName;
  /** Option name of the unit, e.g. `earth`, and how it was learnt. */
  readonly unit?: string;
  readonly unitSource?: UnitSource;
  /** A recognised name that an unrecognised one resembles. */
  readonly perhaps?: string;
  /** The first cell that holds something. */
  readonly sample: string;
}

/** The plan of a list as plain data, one entry per column, for `--explain-columns`. */
export function explainColumns(
  columns: readonly RawColumn[],
  plan: ColumnPlan,
  ambiguities: readonly Ambiguity[],
  sample: readonly RawRecord[],
): ColumnExplanation[] {
  const roles = new Map<number, Pick<ColumnExplanation, "role" | "meaning" | "unit" | "unitSource">>();
  for (const [text, index] of plan.texts) roles.set(index, { role: "text", meaning: text });
  for (const source of [...plan.quantities.values()].flat()) explainSource(source, roles);
  const unclear = new Set(ambiguities.flatMap((ambiguity) => ambiguity.columns));
  return columns.map(({ name }, index): ColumnExplanation => {
    const role = roles.get(index) ?? { role: unclear.has(name) ? "ambiguous" : "not used" };
    const perhaps = role.role === "not used" ? nearestOwnName(name) : undefined;
    const filled = sample.find((record) => record.cells[index]?.trim());
    return { number: index + 1, column: name, ...role, perhaps, sample: filled?.cells[index]?.trim() ?? "" };
  });
}

function explainSource(
  { quantity, value, minus, plus, limit, unit, unitSource }: QuantitySource,
  roles: Map<number, Pick<ColumnExplanation, "role" | "meaning" | "unit" | "unitSource">>,
): void {
  roles.set(value, { role: "value", meaning: quantity, unit: unit.id, unitSource });
  if (minus !== undefined) roles.set(minus, { role: "lower error", meaning: quantity });
  if (plus !== undefined) roles.set(plus, { role: plus === minus ? "error" : "upper error", meaning: quantity });
  if (limit !== undefined) roles.set(limit, { role: "limit flag", meaning: quantity });
}

const ownNames = (Object.keys(quantityColumns) as QuantityName[]).map((quantity) => ownColumn(quantity));

/** A sentence for each column that is not used although its name is nearly one of ours. */
export const misspellings = (columns: readonly ColumnExplanation[]): string[] =>
  columns.flatMap(({ column, perhaps }) =>
    perhaps === undefined ? [] : `column "${column}" is not used; did you mean ${perhaps}?`,
  );

/** Our name that a column nearly has, such as `mass_eath`; short names resemble too much to be worth a hint. */
function nearestOwnName(name: string): string | undefined {
  const key = columnKey(name);
  if (key.length < 5 || key.length > 60) return undefined;
  return nearestName(key, ownNames);
}
