import { distance } from "fastest-levenshtein";
import { InputError } from "../errors.ts";
import { camelKey, columnKey } from "./columnKey.ts";
import { type QuantityMeaning, quantityMeanings, textMeaning } from "./columnMeaning.ts";
import { quantityColumns, textColumns } from "./columnTable.ts";
import type { QuantityName, TextName } from "./quantity.ts";

/** What the user settled: `--column mass_earth=M` and `--unit radius=jupiter`, or the same in a mapping file. */
export interface ColumnChoices {
  readonly columnChoices?: Readonly<Record<string, string>>;
  readonly unitChoices?: Readonly<Record<string, string>>;
}

export interface ChosenColumns {
  readonly quantities: ReadonlyMap<number, readonly QuantityMeaning[]>;
  readonly errors: ReadonlyMap<number, ChosenErrors>;
  readonly texts: ReadonlyMap<TextName, number>;
  /** Quantities for which no other column is considered. */
  readonly settled: ReadonlySet<QuantityName>;
  /** Columns that already have a meaning. */
  readonly taken: ReadonlySet<number>;
}

interface ChosenErrors {
  readonly minus?: number;
  readonly plus?: number;
  readonly areBounds?: boolean;
}

/** The columns that a name of ours may end in, for the errors of a quantity. */
const errorEndings = {
  _minus: { side: "minus", areBounds: false },
  _plus: { side: "plus", areBounds: false },
  _lower_bound: { side: "minus", areBounds: true },
  _upper_bound: { side: "plus", areBounds: true },
} as const;
const endings = Object.keys(errorEndings) as (keyof typeof errorEndings)[];

/** Throws `unknown-column-choice` for a name that is not ours, `column-not-found` for one the list does not have. */
export function chosenColumns(names: readonly string[], choices: ColumnChoices & { file: string }): ChosenColumns {
  const quantities = new Map<number, QuantityMeaning[]>();
  const errors = new Map<number, ChosenErrors>();
  const texts = new Map<TextName, number>();
  const settled = new Set<QuantityName>();
  const taken = new Set<number>();
  const values = new Map<QuantityName, number>();
  const sides: { quantity: QuantityName; ending: keyof typeof errorEndings; index: number }[] = [];
  for (const [ours, theirs] of Object.entries(choices.columnChoices ?? {})) {
    const index = findColumn(theirs, names, choices.file);
    const ending = endings.find((candidate) => ours.endsWith(candidate));
    const [meaning] = quantityMeanings(ending === undefined ? ours : ours.slice(0, -ending.length));
    const text = textMeaning(ours);
    if (meaning !== undefined && ending !== undefined) sides.push({ quantity: meaning.quantity, ending, index });
    else if (meaning !== undefined) {
      quantities.set(index, [meaning]);
      settled.add(meaning.quantity);
      values.set(meaning.quantity, index);
    } else if (text !== undefined) texts.set(text.text, index);
    else throw unknownChoice(ours, choices.file);
    taken.add(index);
  }
  for (const { quantity, ending, index } of sides) {
    const value = values.get(quantity) ?? names.findIndex((name) => quantityMeanings(name)[0]?.quantity === quantity);
    const { side, areBounds } = errorEndings[ending];
    errors.set(value, { ...errors.get(value), [side]: index, areBounds });
  }
  return { quantities, errors, texts, settled, taken };
}

/** By exact name, by `#3` for the third column, or by the name in other case and punctuation. */
function findColumn(wanted: string, names: readonly string[], file: string): number {
  const byNumber = /^#(\d+)$/.exec(wanted)?.[1];
  const candidates = [
    byNumber === undefined ? -1 : Number(byNumber) - 1,
    names.indexOf(wanted),
    names.findIndex((name) => columnKey(name) === columnKey(wanted)),
  ];
  const found = candidates.find((index) => index >= 0 && index < names.length);
  if (found !== undefined) return found;
  const nearest = nearestName(wanted, names);
  throw new InputError(
    "column-not-found",
    `${file}: there is no column "${wanted}"${nearest === undefined ? "" : `; the nearest name is "${nearest}"`}. ` +
      `The list has: ${names.join(", ")}`,
    { file, found: wanted },
  );
}

/** The known word nearest to `wanted`, if it is near enough to be a slip of the keyboard. */
export function nearestName(wanted: string, names: readonly string[]): string | undefined {
  const ranked = names
    .map((name) => ({ name, steps: distance(wanted.toLowerCase(), name.toLowerCase()) }))
    .toSorted((a, b) => a.steps - b.steps);
  const best = ranked[0];
  return best !== undefined && best.steps <= Math.max(1, wanted.length / 4) ? best.name : undefined;
}

function unknownChoice(ours: string, file: string): InputError {
  const known = [
    ...Object.values(quantityColumns).map((columns) => columns.ownName),
    ...Object.keys(textColumns).map(camelKey),
  ];
  const nearest = nearestName(camelKey(ours), known);
  const hint = nearest === undefined ? "" : ` (did you mean ${nearest}?)`;
  return new InputError(
    "unknown-column-choice",
    `"${ours}" is no column Bulkwright knows, so no column can be chosen for it${hint}; use one of ${known.join(", ")}, ` +
      "with its unit, e.g. mass_earth, and with _minus or _plus for the errors",
    { file, found: ours },
  );
}
