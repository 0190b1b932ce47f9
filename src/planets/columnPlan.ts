import type { QuantityName, TextName } from "./quantity.ts";
import type { Unit } from "./unitTable.ts";

/** Where a unit was learnt; the surest first. */
export type UnitSource = "option" | "file" | "column name" | "known list" | "values" | "usual";

/** The columns, by position, from which one quantity is read. */
export interface QuantitySource {
  readonly quantity: QuantityName;
  readonly value: number;
  /** The same position twice where one column gives an error for both sides. */
  readonly minus?: number;
  readonly plus?: number;
  /** `minus` and `plus` hold the ends of the interval instead of the distances to them. */
  readonly errorsAreBounds: boolean;
  readonly limit?: number;
  readonly unit: Unit;
  readonly unitSource: UnitSource;
  /** SI per unit, with the Earth radius the user has chosen. */
  readonly factor: number;
}

/** How to read every row of a list. */
export interface ColumnPlan {
  /** Sources of each quantity in order of preference: the first that has a value in a row is used there. */
  readonly quantities: ReadonlyMap<QuantityName, readonly QuantitySource[]>;
  readonly texts: ReadonlyMap<TextName, number>;
  /** What the reader wants the user to know about the columns, one sentence each. */
  readonly notes: readonly string[];
}

/**
 * What a comma inside a number is: `decimal` where `5,2` and `1,234` are numbers between their neighbours; `unclear`
 * where decimal points stand elsewhere, so that `1,234` could be a thousand and more; `none` where it is no part of one.
 */
export type CommaMeaning = "decimal" | "unclear" | "none";

/** How the list at hand writes what lists write in different ways; found from a sample of its rows. */
export interface ListConventions {
  /** `nan` stands for a missing value, so that as an error it cannot also mean "this is a limit". */
  readonly nanIsMissing: boolean;
  /** -1 stands for a missing value or upper error, so that as a lower error it is no signed 1. */
  readonly minusOneIsMissing: boolean;
  readonly comma: CommaMeaning;
}

/** A place where the reader could only guess. */
export interface Ambiguity {
  /** The column or columns, as written. */
  readonly columns: readonly string[];
  /** Each possible reading with the option that settles for it. */
  readonly readings: readonly { readonly meaning: string; readonly option: string }[];
}
