import type { MeasuredQuantity, PlanetRow, QuantityName } from "../planets/quantity.ts";
import { logErrors, SIGNIFICANT } from "./significance.ts";

/**
 * A law between columns of one row, as a product of powers:
 *   quantity = factor · correction(row) · Π input^power
 * Most laws a planet list can be checked with have this form, and errors are then combined in logarithms.
 */
export interface Relation {
  readonly quantity: QuantityName;
  readonly factor: number;
  readonly powers: Readonly<Partial<Record<QuantityName, number>>>;
  /** What is left of the law beyond powers, e.g. the planet's mass in Kepler's third law. */
  readonly correction?: (row: PlanetRow) => number;
  /** Lowest and highest true ratio of value to formula, where the formula assumes something the list does not say. */
  readonly allowed?: (row: PlanetRow) => readonly [lowest: number, highest: number];
}

/** How a row stands to a relation. */
export interface Comparison {
  readonly value: number;
  /** The relation's value; with an allowed range, its end nearest to the value. */
  readonly expected: number;
  /** ln(value / expected), 0 inside the allowed range. */
  readonly logRatio: number;
  /** Combined error of `logRatio`, independent inputs assumed; on the side that would reduce it. */
  readonly logError: number;
  readonly significanceSigma: number;
}

/** Relative disagreement that units alone can cause: density by the equatorial or the mean radius of Jupiter differs by 7 %. */
const UNIT_TOLERANCE = 0.1;

/** A value of the row that a law may be tested with; limits satisfy any law on one side and minimum masses are none. */
export function testable(row: PlanetRow, name: QuantityName): MeasuredQuantity | undefined {
  const quantity = row.quantities[name];
  if (!quantity || !(quantity.value > 0)) return undefined;
  if (quantity.kind === "upper-limit" || quantity.kind === "lower-limit") return undefined;
  return quantity.kind === "minimum" && name !== "minimumMass" ? undefined : quantity;
}

/** Compares a row with a relation; undefined where the row lacks a quantity. */
export function compare(relation: Relation, row: PlanetRow): Comparison | undefined {
  const subject = testable(row, relation.quantity);
  if (!subject) return undefined;
  let logFormula = Math.log(relation.factor * (relation.correction?.(row) ?? 1));
  const inputs: { input: MeasuredQuantity; power: number }[] = [];
  for (const [name, power] of Object.entries(relation.powers) as [QuantityName, number][]) {
    const input = testable(row, name);
    if (!input) return undefined;
    logFormula += power * Math.log(input.value);
    inputs.push({ input, power });
  }
  const [lowest, highest] = relation.allowed?.(row) ?? [1, 1];
  const ratio = Math.log(subject.value) - logFormula;
  const nearest = Math.min(Math.max(ratio, Math.log(lowest)), Math.log(highest));
  const logRatio = ratio - nearest;
  const logError = combine(logRatio > 0, subject, inputs);
  return {
    value: subject.value,
    expected: Math.exp(logFormula + nearest),
    logRatio,
    logError,
    significanceSigma: Math.abs(logRatio) / logError,
  };
}

function combine(
  tooHigh: boolean,
  subject: MeasuredQuantity,
  inputs: readonly { input: MeasuredQuantity; power: number }[],
): number {
  const own = tooHigh ? logErrors(subject).minus : logErrors(subject).plus;
  const others = inputs.map(({ input, power }) => {
    const { minus, plus } = logErrors(input);
    return power * (power > 0 === tooHigh ? plus : minus);
  });
  return Math.hypot(own, ...others);
}

/** Whether the disagreement is beyond chance and beyond what a choice of unit radius can do. */
export function isViolated(comparison: Comparison): boolean {
  return comparison.significanceSigma >= SIGNIFICANT && Math.abs(comparison.logRatio) > Math.log1p(UNIT_TOLERANCE);
}
