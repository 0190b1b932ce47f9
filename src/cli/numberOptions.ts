import { InvalidArgumentError } from "commander";

/** Makes a parser of one number for commander; a bad one is a usage error that states `allowed`. */
export function numberOption(isAllowed: (value: number) => boolean, allowed: string): (text: string) => number {
  return (text) => {
    const value = parseNumber(text);
    if (!isAllowed(value)) throw new InvalidArgumentError(`Allowed: ${allowed}.`);
    return value;
  };
}

export const positiveNumber = numberOption((value) => value > 0 && value < Infinity, "a number above 0");
export const pressurePa = numberOption((value) => value >= 0 && value < Infinity, "a pressure of 0 or more, in Pa");
export const pointCount = numberOption(
  (n) => Number.isInteger(n) && n >= 2 && n <= 1e6,
  "a whole number from 2 to 1000000",
);

const maximumPoints = 1e6;

/**
 * Masses in Earth masses: `0.1:20:60` is 60 points evenly spaced in the logarithm, both ends included; `0.5,1,2` is
 * just these, in their order.
 */
export function parseMasses(text: string): readonly number[] {
  return parseList(text, { what: "masses above 0", unit: "in Earth masses", maximumCount: maximumPoints });
}

/** Percentages, written like masses. */
export function parsePercentages(text: string): readonly number[] {
  return parseList(text, { what: "percentages above 0", unit: "without the sign", maximumCount: 100 });
}

/** Numbers of standard errors, written like masses. */
export function parseSigmas(text: string): readonly number[] {
  return parseList(text, { what: "numbers above 0", unit: "in sigma", maximumCount: 20 });
}

function parseList(
  text: string,
  { what, unit, maximumCount }: { what: string; unit: string; maximumCount: number },
): readonly number[] {
  const numbers = text.split(text.includes(":") ? ":" : ",").map(parseNumber);
  if (!text.includes(":")) {
    if (numbers.length <= maximumCount && numbers.every((x) => x > 0 && x < Infinity)) return numbers;
    throw new InvalidArgumentError(`Give ${what}, ${unit}, separated by commas.`);
  }
  const [first, last, count] = numbers;
  const isRange = numbers.length === 3 && first > 0 && last > 0 && first < Infinity && last < Infinity;
  if (!isRange || !Number.isInteger(count) || !(count >= 2 && count <= maximumCount)) {
    throw new InvalidArgumentError(
      `Give from:to:count, ${what} and a whole number of points from 2 to ${maximumCount}.`,
    );
  }
  return geometricPoints(first, last, count);
}

/** Evenly spaced in the logarithm, both ends exactly included. */
export function geometricPoints(first: number, last: number, count: number): number[] {
  return Array.from({ length: count }, (_, i) =>
    i === count - 1 ? last : first * (last / first) ** (i / (count - 1)),
  );
}

/** A value with its one-sigma error, one size for both sides or minus and plus. */
export interface ValueWithErrors {
  readonly value: number;
  readonly minus: number;
  readonly plus: number;
}

/** Parses `5.6,0.19` or `1.73,0.02,0.03` (value, minus, plus). */
export function parseValueWithErrors(text: string): ValueWithErrors {
  const numbers = text.split(",").map(parseNumber);
  const [value, minus, plus = minus] = numbers;
  const isUsable = numbers.length >= 2 && numbers.length <= 3 && numbers.every((x) => x > 0 && x < Infinity);
  if (!isUsable) throw new InvalidArgumentError("Give VALUE,ERROR or VALUE,MINUS,PLUS, all above 0.");
  return { value, minus, plus };
}

/** NaN for anything but a plain decimal number: `Number` alone would take "", "0x10" and " 1 ". */
function parseNumber(text: string): number {
  return /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(text) ? Number(text) : Number.NaN;
}
