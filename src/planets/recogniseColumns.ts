import { type ColumnChoices, chosenColumns } from "./columnChoices.ts";
import { columnKey } from "./columnKey.ts";
import { type QuantityMeaning, quantityMeanings, splitUnitText, textMeaning } from "./columnMeaning.ts";
import type { Ambiguity, ColumnPlan, QuantitySource } from "./columnPlan.ts";
import { quantityColumns } from "./columnTable.ts";
import { attachErrorColumns, type ErrorColumns } from "./errorColumns.ts";
import type { RawColumn, RawRecord } from "./formats/rawTable.ts";
import { type KnownList, knownLists } from "./knownLists.ts";
import { ownColumn } from "./ownColumn.ts";
import type { QuantityName, TextName } from "./quantity.ts";
import { type Resolved, resolveBounds, resolveUnit } from "./resolveUnit.ts";
import { findUnit, siFactor } from "./unitTable.ts";

export interface RecogniserOptions extends ColumnChoices {
  readonly file: string;
  /** [m] */
  readonly earthRadius: number;
}

export interface Recognised {
  readonly plan: ColumnPlan;
  readonly ambiguities: readonly Ambiguity[];
}

/**
 * Decides from names, declared units and, where only they can tell, the values of a sample, what every column means.
 * What could be read in two ways is returned as an ambiguity and left out of the plan.
 */
export function recogniseColumns(
  columns: readonly RawColumn[],
  sample: readonly RawRecord[],
  choices: RecogniserOptions,
): Recognised {
  const names = columns.map((column) => column.name);
  const chosen = chosenColumns(names, choices);
  const known = knownList(names);
  const meanings = new Map<number, readonly QuantityMeaning[]>(chosen.quantities);
  names.forEach((name, index) => {
    if (chosen.taken.has(index)) return;
    const readings = quantityMeanings(name, known).filter((reading) => !chosen.settled.has(reading.quantity));
    if (readings.length > 0) meanings.set(index, ofUnitsBody(readings, columns[index]?.unit));
  });
  const stems = new Map(
    [...meanings].map(([index, readings]) => [index, stemsOf(names[index] ?? "", readings)] as const),
  );
  const errors = attachErrorColumns(names, stems);
  for (const [index, given] of chosen.errors) errors.set(index, { ...errors.get(index), ...given, mayBeBounds: false });

  const { certain, ambiguities } = eliminate(meanings, names);
  const quantities = new Map<QuantityName, QuantitySource[]>();
  const notes: string[] = [];
  for (const [quantity, indices] of certain) {
    const resolved = indices.map((index) => {
      const meaning = meanings.get(index)?.find((reading) => reading.quantity === quantity);
      return resolveSource({ columns, sample, choices, known, index, quantity, meaning, errors: errors.get(index) });
    });
    notes.push(...resolved.flatMap((result) => result.note ?? []));
    ambiguities.push(...resolved.flatMap((result) => result.ambiguity ?? []));
    const sources = resolved.flatMap((result) => result.value ?? []);
    const { used, clash } = preferred(quantity, sources, names);
    if (clash !== undefined) ambiguities.push(clash);
    else if (used.length > 0) quantities.set(quantity, used);
  }
  const texts = textColumnsOf(names, chosen.texts, (index) => meanings.has(index));
  return { plan: { quantities, texts, notes }, ambiguities };
}

export function knownList(names: readonly string[]): KnownList | undefined {
  const keys = new Set(names.map(columnKey));
  return knownLists.find((list) => list.signature.split(" ").every((key) => keys.has(key)));
}

/** The keys under which a column's errors may be named: its own, without a bracketed unit, without any unit. */
function stemsOf(name: string, readings: readonly QuantityMeaning[]): string[] {
  return [columnKey(name), columnKey(splitUnitText(name).base), ...readings.map((reading) => reading.stem)];
}

/** The body whose own mass or radius is the unit; kilograms and kilometres tell nothing. */
const bodyOfUnit: Readonly<Record<string, "planet" | "star">> = { earth: "planet", jupiter: "planet", sun: "star" };

/** Of two readings, the one for the body in whose units the column is: `R [Rjup]` is a planet's. */
function ofUnitsBody(readings: readonly QuantityMeaning[], declared: string | undefined): readonly QuantityMeaning[] {
  if (readings.length < 2) return readings;
  const left = readings.filter(({ quantity, unit }) => {
    const { body, dimension } = quantityColumns[quantity];
    const known = unit ?? findUnit(declared ?? "", dimension);
    return known !== undefined && bodyOfUnit[known.id] === body;
  });
  return left.length > 0 ? left : readings;
}

/** Names with two readings lose one where another column already certainly is that quantity. */
function eliminate(
  meanings: ReadonlyMap<number, readonly QuantityMeaning[]>,
  names: readonly string[],
): { certain: Map<QuantityName, number[]>; ambiguities: Ambiguity[] } {
  const certain = new Map<QuantityName, number[]>();
  const add = (quantity: QuantityName, index: number): void => {
    certain.set(quantity, [...(certain.get(quantity) ?? []), index]);
  };
  for (const [index, [first, second]] of meanings) if (first && !second) add(first.quantity, index);
  const taken = new Set(certain.keys());
  const ambiguities: Ambiguity[] = [];
  for (const [index, readings] of meanings) {
    if (readings.length < 2) continue;
    const left = readings.filter((reading) => !taken.has(reading.quantity));
    if (left.length === 1 && left[0]) add(left[0].quantity, index);
    else ambiguities.push(twoQuantities(names[index] ?? "", left.length > 0 ? left : readings));
  }
  return { certain, ambiguities };
}

const twoQuantities = (name: string, readings: readonly QuantityMeaning[]): Ambiguity => ({
  columns: [name],
  readings: readings.map(({ quantity }) => ({
    meaning: quantityColumns[quantity].title,
    option: `--column ${ownColumn(quantity)}=${name}`,
  })),
});

interface SourceRequest {
  readonly columns: readonly RawColumn[];
  readonly sample: readonly RawRecord[];
  readonly choices: RecogniserOptions;
  readonly known: KnownList | undefined;
  readonly index: number;
  readonly quantity: QuantityName;
  readonly meaning: QuantityMeaning | undefined;
  readonly errors: ErrorColumns | undefined;
}

function resolveSource(request: SourceRequest): Resolved<QuantitySource> {
  const { columns, sample, choices, known, index, quantity, meaning, errors } = request;
  const column = columns[index] ?? { name: "" };
  const unit = resolveUnit({ column, quantity, stated: meaning?.unit, known, sample, index, choices });
  if (unit.value === undefined) return { note: unit.note, ambiguity: unit.ambiguity };
  const bounds: Resolved<boolean> = errors?.mayBeBounds
    ? resolveBounds(columns, sample, index, errors, ownColumn(quantity))
    : { value: errors?.areBounds ?? false };
  if (bounds.value === undefined) return { note: bounds.note, ambiguity: bounds.ambiguity };
  const { minus, plus, limit } = errors ?? {};
  const factor = siFactor(unit.value.unit, choices.earthRadius);
  const source = { quantity, value: index, minus, plus, limit, errorsAreBounds: bounds.value, ...unit.value, factor };
  return { value: source, note: unit.note };
}

/** One column per unit is fine, Earth before Jupiter; two in the same unit clash unless the table ranks them. */
function preferred(
  quantity: QuantityName,
  sources: readonly QuantitySource[],
  names: readonly string[],
): { used: QuantitySource[]; clash?: Ambiguity } {
  const groups = quantityColumns[quantity].preference ?? [];
  const rank = (source: QuantitySource): number => {
    const at = groups.findIndex((group) => group.split(" ").includes(columnKey(names[source.value] ?? "")));
    return at === -1 ? groups.length : at;
  };
  const best = Math.min(...sources.map(rank));
  const ranked = sources.filter((source) => rank(source) === groups.length || rank(source) === best);
  const order = ["earth", "jupiter"];
  const place = (source: QuantitySource): number =>
    (order.indexOf(source.unit.id) + order.length + 1) % (order.length + 1);
  const used = ranked.toSorted((a, b) => place(a) - place(b));
  const unitsDiffer = new Set(used.map((source) => source.unit.id)).size === used.length;
  if (unitsDiffer) return { used };
  const columns = used.map((source) => names[source.value] ?? "");
  const readings = used.map((source) => ({
    meaning: `${quantityColumns[quantity].title} from column ${source.value + 1}, "${names[source.value] ?? ""}"`,
    option: `--column ${ownColumn(quantity, source.unit.id)}=${distinct(names, source.value)}`,
  }));
  return { used: [], clash: { columns, readings } };
}

/** A name, or `#3` where several columns share it. */
const distinct = (names: readonly string[], index: number): string =>
  names.filter((name) => name === names[index]).length > 1 ? `#${index + 1}` : (names[index] ?? "");

function textColumnsOf(
  names: readonly string[],
  chosen: ReadonlyMap<TextName, number>,
  isQuantity: (index: number) => boolean,
): Map<TextName, number> {
  const texts = new Map<TextName, number>();
  const ranks = new Map<TextName, number>();
  names.forEach((name, index) => {
    const meaning = textMeaning(name);
    if (meaning === undefined || isQuantity(index) || meaning.rank >= (ranks.get(meaning.text) ?? Infinity)) return;
    texts.set(meaning.text, index);
    ranks.set(meaning.text, meaning.rank);
  });
  for (const [text, index] of chosen) texts.set(text, index);
  return texts;
}
