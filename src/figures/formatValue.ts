import type { Estimate, FigureValue } from "./figureSpec.ts";

/** A value as people read it: an estimate to two digits of its smaller error, a number to `digits` significant ones. */
export function formatValue(value: FigureValue, digits = 4): string {
  if (value === null) return "";
  if (typeof value === "string") return value;
  if (typeof value === "number") return plainNumber(value, digits);
  return formatEstimate(value);
}

function formatEstimate({ value, minus, plus }: Estimate): string {
  const sizes = [minus, plus].filter((size) => size !== null && size > 0) as number[];
  if (sizes.length === 0) return plainNumber(value, 4);
  const decimals = decimalsForTwoDigits(Math.min(...sizes));
  const text = value.toFixed(decimals);
  if (minus !== null && plus !== null) {
    const [below, above] = [minus.toFixed(decimals), plus.toFixed(decimals)];
    return below === above ? `${text} ± ${above}` : `${text} +${above} −${below}`;
  }
  return plus === null ? `${text} −${minus?.toFixed(decimals)}` : `${text} +${plus.toFixed(decimals)}`;
}

/** Six decimals at most: a planet's mass is never known better, and a list may claim absurd errors. */
function decimalsForTwoDigits(size: number): number {
  return Math.min(6, Math.max(0, 1 - Math.floor(Math.log10(size))));
}

/** `digits` significant digits, without an exponent unless the number is far from 1. */
export function plainNumber(value: number, digits: number): string {
  const size = Math.abs(value);
  if (size !== 0 && (size < 1e-4 || size >= 1e7)) return value.toExponential(digits - 1).replace("-", "−");
  const text = String(Number(value.toPrecision(digits)));
  return text.replace("-", "−");
}
