/**
 * The three ways a computation can fail. `code` and `data` are stable and are what tests and callers rely on;
 * the wording of `message` is for people: quantity, value received, what is allowed, what to do.
 */
export abstract class BulkwrightError extends Error {
  readonly code: string;

  constructor(code: string, message: string, options?: ErrorOptions) {
    super(message, options);
    this.code = code;
    this.name = new.target.name;
  }
}

/** Where in a user's input something stands; lines and columns count from 1. */
export interface Place {
  readonly file?: string;
  readonly line?: number;
  /** Column number, or the name of the column or key. */
  readonly column?: number | string;
}

/** Something the user gave cannot be used: a file, a key, a cell, an option. */
export class InputError extends BulkwrightError {
  readonly place: Place;
  /** The offending text, verbatim. */
  readonly found?: string;
  /** What to do about it. */
  readonly remedy?: string;

  constructor(
    code: string,
    message: string,
    details: Place & { found?: string; remedy?: string } = {},
    options?: ErrorOptions,
  ) {
    super(code, message, options);
    const { found, remedy, ...place } = details;
    this.place = place;
    this.found = found;
    this.remedy = remedy;
  }
}

/** A model was asked for something outside the range where it means anything. All values SI. */
export class ModelRangeError extends BulkwrightError {
  readonly quantity: string;
  readonly value: number;
  readonly minimum: number;
  readonly maximum: number;

  constructor(
    code: string,
    message: string,
    range: { quantity: string; value: number; minimum?: number; maximum?: number },
  ) {
    super(code, message);
    this.quantity = range.quantity;
    this.value = range.value;
    this.minimum = range.minimum ?? Number.NEGATIVE_INFINITY;
    this.maximum = range.maximum ?? Number.POSITIVE_INFINITY;
  }
}

/** An iteration ended without meeting its tolerance; `best` is the best estimate so far, if there is one. */
export class ConvergenceError extends BulkwrightError {
  readonly best?: unknown;

  constructor(code: string, message: string, best?: unknown) {
    super(code, message);
    this.best = best;
  }
}
