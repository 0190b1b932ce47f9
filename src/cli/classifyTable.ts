import type { Classification } from "../inference/classifier.ts";
import type { FamilyModel } from "../inference/composition/compositionPosterior.ts";
import type { FractionEstimate } from "../inference/fractionPosterior.ts";
import type { PlanetRow } from "../planets/quantity.ts";
import { EARTH_MASS } from "../units/constants.ts";
import type { Cell } from "./csv.ts";
import { familyCells, familyColumns, familyDetails } from "./familyColumns.ts";
import type { FamilyResult } from "./familyInference.ts";
import type { KeptColumn } from "./keptColumns.ts";
import type { Table } from "./table.ts";

/** A row of the user's list and what could be said about it. */
export interface ClassifiedRow {
  readonly row: PlanetRow;
  readonly result: Classification;
  /** Where families were asked for. */
  readonly families?: readonly FamilyResult[];
}

export const classifyColumns = [
  "name",
  "verdict",
  "reasons",
  "mass_earth",
  "radius_earth",
  "p_denser_than_iron",
  "p_iron_silicate",
  "p_silicate_water",
  "p_lighter_than_water",
  "core_mass_fraction",
  "core_mass_fraction_minus",
  "core_mass_fraction_plus",
  "water_mass_fraction",
  "water_mass_fraction_minus",
  "water_mass_fraction_plus",
  "mass_earth_if_silicate",
  "mass_earth_if_iron",
  "radius_earth_if_iron",
  "radius_earth_if_silicate",
  "radius_earth_if_water",
  "statement",
];

/** Verdicts or reasons, one row a row of the list, in its order. */
export function classifyTable(
  rows: readonly ClassifiedRow[],
  earthRadius: number,
  kept: readonly KeptColumn[] = [],
  families: readonly FamilyModel[] = [],
): Table {
  const withFamilies = families.length > 0;
  return {
    columns: [...classifyColumns, ...kept.map(({ name }) => name), ...(withFamilies ? familyColumns(families) : [])],
    ...(withFamilies && { details: rows.map((row) => ({ families: familyDetails(row.families ?? []) })) }),
    rows: rows.map(({ row, result, families: results = [] }) => [
      row.name,
      result.verdict?.code,
      result.reasons?.join(";"),
      inUnit(row.quantities.mass?.value, EARTH_MASS),
      inUnit(row.quantities.radius?.value, earthRadius),
      ...resultCells(result, earthRadius),
      result.verdict?.statement,
      ...kept.map(({ index }) => row.cells[index]),
      ...(withFamilies ? familyCells(families, results) : []),
    ]),
  };
}

/** From the first probability to the allowed radii. */
function resultCells(result: Classification, earthRadius: number): Cell[] {
  if (result.verdict) {
    return [
      result.pDenserThanIron,
      result.pIronSilicate,
      result.pSilicateWater,
      result.pLighterThanWater,
      ...estimateCells(result.coreMassFraction),
      ...estimateCells(result.waterMassFraction),
      ...blank(5),
    ];
  }
  return [
    ...blank(10),
    inUnit(result.massIfSilicate, EARTH_MASS),
    inUnit(result.massIfIron, EARTH_MASS),
    inUnit(result.radiusIfIron, earthRadius),
    inUnit(result.radiusIfSilicate, earthRadius),
    inUnit(result.radiusIfWater, earthRadius),
  ];
}

function estimateCells({ median, minus, plus }: FractionEstimate): Cell[] {
  return [median, minus, plus];
}

function blank(count: number): Cell[] {
  return Array<Cell>(count).fill(undefined);
}

function inUnit(value: number | undefined, unit: number): number | undefined {
  return value === undefined ? undefined : value / unit;
}
