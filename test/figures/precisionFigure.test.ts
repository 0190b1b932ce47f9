import { describe, expect, it } from "vitest";
import { precisionFigure } from "../../src/figures/precisionFigure.ts";
import { precisionHtml } from "../../src/figures/precisionHtml.ts";
import { precisionTraces } from "../../src/figures/precisionTraces.ts";
import { expectClose } from "../support/expectClose.ts";
import { hostileForecast, inventedForecast } from "./inventedForecast.ts";

const spec = precisionFigure(inventedForecast);
const { massError, radiusError } = spec.axes;

describe("precisionFigure", () => {
  it("draws the levels asked for and the one of degeneracy, lowest first", () => {
    expect(spec.contours.map(({ sigma, label }) => [sigma, label])).toEqual([
      [1, "1 sigma"],
      [2, "2 sigma"],
      [3, "3 sigma"],
      [5, "5 sigma"],
    ]);
  });

  it("puts every point of a line where the formula says, within the axes, from end to end", () => {
    for (const { sigma, line } of spec.contours) {
      for (const point of line) {
        const separation = 10 / Math.hypot(point.radiusError, 0.25 * point.massError);
        expectClose(separation, sigma, { rel: 1e-12, because: "round-off" });
      }
      const [first, last] = [line[0], line[line.length - 1]];
      const reaches = (value: number, end: number) => Math.abs(value / end - 1) < 1e-9;
      expect(reaches(first.massError, massError.range[0]) || reaches(first.radiusError, radiusError.range[1])).toBe(
        true,
      );
      expect(reaches(last.massError, massError.range[1]) || reaches(last.radiusError, radiusError.range[0])).toBe(true);
    }
  });

  it("shades the whole map where even its largest errors do, and nothing where its smallest do not", () => {
    const near = precisionFigure({ ...inventedForecast, gap: 0.3 }).contours;
    expect(near.map(({ line, region }) => line.length + region.length)).toEqual([0, 0, 0, 0]);
    const far = precisionFigure({ ...inventedForecast, gap: 1000 }).contours;
    expect(far.map(({ line, region }) => [line.length, region.length])).toEqual(Array(4).fill([0, 4]));
  });

  it.each([
    [0.3, "On all of this map fudge and toffee are degenerate"],
    [10, "Above and right of the line of 1 sigma fudge and toffee are degenerate"],
    [1000, "All errors of this map separate the two by more than 1 sigma"],
  ])("says where a gap of %d %% is degenerate", (gap, words) => {
    expect(precisionFigure({ ...inventedForecast, gap }).caption.notes[0]).toContain(words);
  });

  it("holds the same separations as numbers", () => {
    expectClose(spec.grid.separation[2][1], 10 / Math.SQRT2, { rel: 1e-14, because: "round-off" });
    expect(spec.grid.separation.map((row) => row.length)).toEqual(Array(6).fill(6));
  });

  it("keeps today's errors in sight, wherever they lie", () => {
    const { axes } = precisionFigure({ ...inventedForecast, present: { massError: 70, radiusError: 0.01 } });
    expect(axes.massError.range[1]).toBeGreaterThan(70);
    expect(axes.radiusError.range[0]).toBeLessThan(0.01);
  });
});

describe("precisionTraces", () => {
  it("stand in order: ground, lines, today's errors", () => {
    const traces = precisionTraces(spec);
    expect(traces.map(({ fill, mode }) => fill ?? mode)).toEqual([
      ...Array(4).fill("toself"),
      ...Array(4).fill("lines"),
      "markers",
    ]);
    expect(precisionTraces({ ...spec, present: null })).toHaveLength(8);
  });
});

describe("precisionHtml", () => {
  const plotly = "window.Plotly = {};";

  it("has the map's numbers and the steps as tables, without empty columns", async () => {
    const html = await precisionHtml(spec, plotly);
    expect(html).toContain(`<title>${inventedForecast.title}</title>`);
    expect(html).toContain("Radius 0.5 %");
    expect(html).toContain("fudge and toffee differ by 3.0 sigma");
    expect(html).not.toContain("Never filled");
  });

  it("shows hostile text as text alone", async () => {
    const html = await precisionHtml(precisionFigure(hostileForecast), plotly);
    expect(html).not.toContain("<img");
    expect(html.match(/<script/g)).toHaveLength(3);
  });
});
