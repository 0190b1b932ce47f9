/** The digits of a number as typed that say something: `0.37200` has 372, `1.0e5` has 1. Empty where it is no number. */
export function significantDigits(written: string): string {
  const match = /^\s*[-+]?0*(\d*)\.?(\d*)(?:e[-+]?\d+)?\s*$/i.exec(written);
  if (!match) return "";
  return `${match[1]}${match[2]}`.replace(/^0+/, "").replace(/0+$/, "");
}

/** Relative error [half a unit of the last digit that is not a padding zero] of a number as typed. */
export function roundingError(written: string): number {
  const digits = significantDigits(written);
  return digits === "" ? 0.5 : 0.5 / Number(digits);
}
