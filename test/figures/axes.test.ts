import { describe, expect, it } from "vitest";
import { logRange } from "../../src/figures/logRange.ts";
import { tickCount } from "../../src/figures/tickCount.ts";

describe("logRange", () => {
  it("leaves room at both ends", () => {
    expect(logRange([0.1, 20, 3])).toEqual([0.0912, 21.9]);
  });

  it("spans half a decade around a single value", () => {
    const [low, high] = logRange([2]);
    expect(high / low).toBeGreaterThan(10 ** 0.5);
    expect(low * high).toBeCloseTo(4, 1);
  });

  it("ignores what a logarithmic axis cannot show", () => {
    expect(logRange([0, -1, Number.NaN, Number.POSITIVE_INFINITY, 0.1, 20])).toEqual([0.0912, 21.9]);
    expect(logRange([0])).toEqual([0.316, 3.16]);
  });
});

describe("tickCount", () => {
  /** Decades to a tick, from which Plotly chooses: every digit up to 0.3, then 1, 2, 5 up to 0.7, then decades. */
  const decadesPerTick = (span: number, pixels: number, label: number) => span / tickCount(span, pixels, label);

  it("labels every digit where they fit, then 1, 2 and 5, then decades", () => {
    expect(decadesPerTick(1.05, 600, 16)).toBeLessThan(0.3);
    for (const span of [1, 1.3, 2, 3, 4, 5]) {
      expect(decadesPerTick(span, 560, 30)).toBeGreaterThan(0.3);
      expect(decadesPerTick(span, 560, 30)).toBeLessThan(0.7);
    }
    expect(decadesPerTick(7, 560, 30)).toBeGreaterThan(0.7);
  });
});
