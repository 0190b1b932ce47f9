import { EARTH_RADIUS } from "../units/constants.ts";
import { displayName, inDisplayUnit } from "./displayUnits.ts";
import type { Finding } from "./finding.ts";

/** Columns of findings, in order; version 1. Later versions only add columns at the end. */
export const findingColumns = [
  "row",
  "name",
  "rule",
  "severity",
  "quantity",
  "value",
  "expected",
  "significance_sigma",
  "explanation",
  "remedy",
  "line",
] as const;

type Cell = string | number | undefined;
export type FindingRecord = Readonly<Record<(typeof findingColumns)[number], Cell>>;

/** A finding as plain cells, in the unit that the `quantity` cell names; `earthRadius` [m] where the user chose another. */
export function findingRecord(finding: Finding, earthRadius = EARTH_RADIUS): FindingRecord {
  const { row, quantity, value, expected } = finding;
  const shown = (x: number | undefined) => (x === undefined ? undefined : inDisplayUnit(quantity, x, earthRadius));
  return {
    row: row.row,
    name: row.name,
    rule: finding.rule,
    severity: finding.severity,
    quantity: displayName(quantity),
    value: typeof value === "string" ? value : shown(value),
    expected: shown(expected),
    significance_sigma: finding.significanceSigma,
    explanation: finding.explanation,
    remedy: finding.remedy,
    line: row.line,
  };
}
