import type { MeasuredQuantity, PlanetRow, QuantityName } from "../planets/quantity.ts";
import { isSet } from "./flag.ts";
import { groupBy } from "./groupBy.ts";
import { nameKey } from "./planetName.ts";
import { positive } from "./significance.ts";
import { weightedMean } from "./weightedMean.ts";

export const publicationRules = ["preferred", "newest", "most-precise", "combine"] as const;
export type PublicationRule = (typeof publicationRules)[number];

/** One row a planet, and how it was come by. */
export interface ChosenRow {
  readonly row: PlanetRow;
  /** Rows of the list that name the planet. */
  readonly from: readonly PlanetRow[];
  /** For people: `newest of 3 (2021-05)`. */
  readonly choice: string;
}

/**
 * One row for each planet, by a stated rule; planets in order of first appearance, rows without a name each on its own.
 *   preferred     the row that the list marks; the first where it marks none
 *   newest        the latest publication date, or year in the reference; the first where there is none
 *   most-precise  the smallest sum of squared relative errors of mass and radius
 *   combine       the weighted mean of each measured quantity, publications taken as independent
 * Checked by test/crosscheck/choosePublication.test.ts
 */
export function choosePublications(rows: readonly PlanetRow[], rule: PublicationRule): ChosenRow[] {
  const groups = groupBy(rows, (row) => nameKey(row.name) || `row ${row.row}`);
  return [...groups.values()].map((from) => {
    const [first] = from as [PlanetRow];
    return from.length === 1 ? { row: first, from, choice: "only publication" } : { ...choosers[rule](from), from };
  });
}

type Choice = Pick<ChosenRow, "row" | "choice">;

const choosers: Readonly<Record<PublicationRule, (rows: readonly PlanetRow[]) => Choice>> = {
  preferred(rows) {
    const [first] = rows as [PlanetRow];
    const marked = rows.find(({ texts }) => isSet(texts.preferred));
    const choice = marked ? `preferred of ${rows.length}` : `first of ${rows.length}, none is marked as preferred`;
    return { row: marked ?? first, choice };
  },
  newest(rows) {
    const row = best(rows, (a, b) => publicationDate(a) > publicationDate(b));
    const date = publicationDate(row);
    return { row, choice: date ? `newest of ${rows.length} (${date})` : `first of ${rows.length}, none is dated` };
  },
  "most-precise"(rows) {
    const row = best(rows, (a, b) => imprecision(a) < imprecision(b));
    const known = Number.isFinite(imprecision(row));
    return { row, choice: known ? `most precise of ${rows.length}` : `first of ${rows.length}, none has errors` };
  },
  combine(rows) {
    const names = new Set(rows.flatMap((row) => Object.keys(row.quantities) as QuantityName[]));
    const quantities = Object.fromEntries([...names].flatMap((name) => combineQuantity(rows, name)));
    const [first] = rows as [PlanetRow];
    return { row: { ...first, quantities }, choice: `combined from rows ${rows.map(({ row }) => row).join(", ")}` };
  },
};

/** The first row that no other beats. */
function best(rows: readonly PlanetRow[], beats: (a: PlanetRow, b: PlanetRow) => boolean): PlanetRow {
  return rows.reduce((leader, row) => (beats(row, leader) ? row : leader));
}

/** The stated date or, failing that, the year in the reference; empty where neither is known. */
function publicationDate({ texts }: PlanetRow): string {
  return texts.publicationDate?.trim() || (/\b(?:19|20)\d\d(?!\d)/.exec(texts.reference ?? "")?.[0] ?? "");
}

/** Sum of squared relative errors of mass and radius; infinite where either lacks one. */
function imprecision({ quantities: { mass, radius } }: PlanetRow): number {
  const relative = (quantity: MeasuredQuantity | undefined) => {
    const minus = positive(quantity?.minus);
    const plus = positive(quantity?.plus);
    const usable = quantity?.kind === "measured" && minus && plus && quantity.value > 0;
    return usable ? (minus + plus) / (2 * quantity.value) : Number.POSITIVE_INFINITY;
  };
  return relative(mass) ** 2 + relative(radius) ** 2;
}

/** The mean of the measured values; where none is measured, whatever the first row that has the quantity says. */
function combineQuantity(rows: readonly PlanetRow[], name: QuantityName): [QuantityName, MeasuredQuantity][] {
  const given = rows.flatMap((row) => row.quantities[name] ?? []);
  const [first] = given;
  if (!first) return [];
  const mean = weightedMean(given);
  if (!mean) return [[name, first]];
  const origin = given.find(({ kind }) => kind === "measured")?.origin ?? first.origin;
  return [[name, { value: mean.value, minus: mean.error, plus: mean.error, kind: "measured", origin }]];
}
