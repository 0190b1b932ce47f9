import { expect } from "vitest";

/** Relative comparison; `because` says where the tolerance comes from. */
export function expectClose(actual: number, expected: number, tolerance: { rel: number; because: string }): void {
  const difference = Math.abs(actual - expected) / Math.abs(expected);
  expect(
    difference,
    `${actual} against ${expected}: relative difference ${difference}; allowed ${tolerance.rel} because ${tolerance.because}`,
  ).toBeLessThanOrEqual(tolerance.rel);
}
