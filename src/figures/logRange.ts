const paddingDecades = 0.04;
const leastSpanDecades = 0.5;

/**
 * Ends of a logarithmic axis that shows all positive finite `values`, with room at both ends; one decade around 1 when
 * there are none. Rounded to three digits, so that a last-bit change of a curve does not change the page.
 */
export function logRange(values: Iterable<number>): readonly [number, number] {
  let low = Number.POSITIVE_INFINITY;
  let high = 0;
  for (const value of values) {
    if (!(value > 0) || value === Number.POSITIVE_INFINITY) continue;
    low = Math.min(low, value);
    high = Math.max(high, value);
  }
  if (high === 0) return [10 ** -0.5, 10 ** 0.5].map(threeDigits) as [number, number];
  const missing = Math.max(0, leastSpanDecades - Math.log10(high / low));
  const factor = 10 ** (paddingDecades + missing / 2);
  return [threeDigits(low / factor), threeDigits(high * factor)];
}

const threeDigits = (value: number): number => Number(value.toPrecision(3));
