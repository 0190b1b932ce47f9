import { InputError } from "../errors.ts";
import type { ColumnChoices } from "./columnChoices.ts";
import type { Ambiguity, UnitSource } from "./columnPlan.ts";
import { quantityColumns } from "./columnTable.ts";
import type { ErrorColumns } from "./errorColumns.ts";
import type { RawColumn, RawRecord } from "./formats/rawTable.ts";
import type { KnownList } from "./knownLists.ts";
import type { QuantityName } from "./quantity.ts";
import { findUnit, type Unit, unitById, unitIds } from "./unitTable.ts";

/** A value that was found, or the reason why not. */
export interface Resolved<T> {
  readonly value?: T;
  readonly note?: string;
  readonly ambiguity?: Ambiguity;
}

interface UnitRequest {
  readonly column: RawColumn;
  readonly quantity: QuantityName;
  /** The unit in the column's name. */
  readonly stated: Unit | undefined;
  readonly known: KnownList | undefined;
  readonly sample: readonly RawRecord[];
  readonly index: number;
  readonly choices: ColumnChoices & { readonly file: string };
}

/** The unit of a column: the user's word, then the file's, then the name's; a guess never. */
export function resolveUnit(request: UnitRequest): Resolved<{ unit: Unit; unitSource: UnitSource }> {
  const { column, quantity, stated, known, sample, index } = request;
  const { dimension, usualUnit } = quantityColumns[quantity];
  const chosen = chosenUnit(request);
  if (chosen !== undefined && stated === undefined) return { value: { unit: chosen, unitSource: "option" } };
  const declared = column.unit === undefined ? undefined : findUnit(column.unit, dimension);
  if (declared !== undefined) return { value: { unit: declared, unitSource: "file" } };
  const note =
    column.unit === undefined || column.unit.trim() === ""
      ? undefined
      : `column "${column.name}": the unit "${column.unit}" that the file declares is not one of ${quantityColumns[quantity].title}`;
  if (stated !== undefined) return { value: { unit: stated, unitSource: "column name" }, note };
  const byList = known?.units[quantity];
  const listed = byList === undefined ? undefined : unitById(byList, dimension);
  const values = numbersOf(sample, index);
  if (listed !== undefined && isPossible(quantity, values, listed)) {
    return { value: { unit: listed, unitSource: "known list" }, note };
  }
  const usual = usualUnit === undefined ? undefined : unitById(usualUnit, dimension);
  if (usual !== undefined) return { value: { unit: usual, unitSource: "usual" }, note };
  const possible = ["earth", "jupiter"].flatMap((id) => unitById(id, dimension) ?? []);
  const fitting = possible.filter((unit) => isPossible(quantity, values, unit));
  if (fitting.length === 1 && fitting[0] !== undefined)
    return { value: { unit: fitting[0], unitSource: "values" }, note };
  return { ambiguity: unitAmbiguity(column, quantity, possible), note };
}

function chosenUnit({ quantity, choices }: UnitRequest): Unit | undefined {
  const { ownName, dimension } = quantityColumns[quantity];
  const given = choices.unitChoices?.[ownName] ?? choices.unitChoices?.[quantity];
  if (given === undefined) return undefined;
  const unit = unitById(given, dimension) ?? findUnit(given, dimension);
  if (unit !== undefined) return unit;
  throw new InputError(
    "unknown-unit",
    `"${given}" is no unit of ${quantityColumns[quantity].title}; use one of ${unitIds(dimension).join(", ")}`,
    { file: choices.file, found: given },
  );
}

const unitAmbiguity = (column: RawColumn, quantity: QuantityName, units: readonly Unit[]): Ambiguity => ({
  columns: [column.name],
  readings: units.map((unit) => ({
    meaning: `${quantityColumns[quantity].title} in ${unit.id === "earth" ? "Earth" : "Jupiter"} units`,
    option: `--unit ${quantityColumns[quantity].ownName}=${unit.id}`,
  })),
});

/**
 * Medians no list of planets can have, in Earth units: half of its radii beyond 2.5 Jupiter radii (the largest known are
 * about 2.2) or below a fifth of Mercury's; masses beyond 80 Jupiter masses, where stars begin, or below the Moon's.
 */
const medianRange = {
  radius: { earth: [0.08, 28], jupiter: [0.08 / 11.2, 2.5] },
  mass: { earth: [0.012, 25_000], jupiter: [0.012 / 317.8, 80] },
} as const;
const SMALLEST_SAMPLE = 5;

/** Whether values could be in that unit at all, judged by their median so that single slips do not count. */
function isPossible(quantity: QuantityName, values: readonly number[], unit: Unit): boolean {
  if (values.length < SMALLEST_SAMPLE || (unit.id !== "earth" && unit.id !== "jupiter")) return true;
  if (quantity !== "radius" && quantity !== "mass" && quantity !== "minimumMass") return true;
  const [low, high] = medianRange[quantity === "radius" ? "radius" : "mass"][unit.id];
  const median = values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN;
  return median >= low && median <= high;
}

const numbersOf = (sample: readonly RawRecord[], index: number): number[] =>
  sample.map((record) => Number.parseFloat(record.cells[index] ?? "")).filter((value) => value > 0);

/** Whether columns called upper and lower hold the interval's ends or the distances to them. */
export function resolveBounds(
  columns: readonly RawColumn[],
  sample: readonly RawRecord[],
  index: number,
  errors: ErrorColumns,
  own: string,
): Resolved<boolean> {
  const cell = (record: RawRecord, at: number | undefined): number =>
    at === undefined ? Number.NaN : Number.parseFloat(record.cells[at] ?? "");
  const rows = sample
    .map((record) => ({ value: cell(record, index), low: cell(record, errors.minus), high: cell(record, errors.plus) }))
    .filter(({ value, low, high }) => Number.isFinite(value + low + high));
  const enclosing = rows.filter(({ value, low, high }) => low <= value && value <= high && high > 0);
  if (rows.length === 0 || enclosing.length === 0) return { value: false };
  if (enclosing.length === rows.length && rows.length >= SMALLEST_SAMPLE) return { value: true };
  const name = columns[index]?.name ?? "";
  const plus = errors.plus === undefined ? name : (columns[errors.plus]?.name ?? "");
  return {
    ambiguity: {
      columns: [name, plus],
      readings: [
        { meaning: `"${plus}" is the size of the upper error`, option: `--column ${own}_plus=${plus}` },
        { meaning: `"${plus}" is the upper end of the interval`, option: `--column ${own}_upper_bound=${plus}` },
      ],
    },
  };
}
