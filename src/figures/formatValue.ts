import type { Estimate, FigureValue } from "./figureSpec.ts";

/** A count with its thousands apart. */
export const formatCount = (count: number): string => count.toLocaleString("en");

/** A value as people read it: an estimate to two digits of its smaller error, a number to `digits` significant ones. */
export function formatValue(value: FigureValue, digits = 4): string {
  if (value === null) return "";
  if (typeof value === "string") return value;
  if (typeof value === "number") return plainNumber(value, digits);
  return formatEstimate(value);
}

function formatEstimate({ value, minus, plus }: Estimate): string {
  const sizes = [minus, plus].filter((size): size is number => size !== null && size > 0);
  if (sizes.length === 0) return plainNumber(value, 4);
  const write = writerToTwoDigits(Math.min(...sizes));
  if (minus === null || plus === null) {
    return minus === null ? `${write(value)} +${write(plus ?? 0)}` : `${write(value)} −${write(minus)}`;
  }
  const [below, above] = [write(minus), write(plus)];
  return below === above ? `${write(value)} ± ${above}` : `${write(value)} +${above} −${below}`;
}

/** Writes numbers to the decimal at which `size` has two digits; a size too small for decimals keeps its exponent. */
function writerToTwoDigits(size: number): (value: number) => string {
  const decimals = Math.max(0, 1 - Math.floor(Math.log10(size)));
  return decimals <= 6 ? (value) => value.toFixed(decimals) : (value) => plainNumber(value, 7);
}

/** `digits` significant digits, without an exponent unless the number is far from 1. */
export function plainNumber(value: number, digits: number): string {
  const size = Math.abs(value);
  const rounded = Number(value.toPrecision(digits));
  const farFromOne = size !== 0 && (size < 1e-4 || size >= 1e7);
  return (farFromOne ? rounded.toExponential() : String(rounded)).replaceAll("-", "−");
}
