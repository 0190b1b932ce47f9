import { describe, expect, it } from "vitest";
import { curveLabels } from "../../src/figures/curveLabels.ts";
import type { FigureSpec } from "../../src/figures/figureSpec.ts";
import { massRadiusFigure } from "../../src/figures/massRadiusFigure.ts";
import { inventedSurvey } from "./inventedSurvey.ts";

const frames = [
  { width: 500, height: 570, margin: 190 },
  { width: 1050, height: 570, margin: 190 },
];
const spec = massRadiusFigure(inventedSurvey);
const named = (figure: FigureSpec) => curveLabels(figure, frames).map(({ curve }) => figure.curves[curve]?.label);

describe("curveLabels", () => {
  it("names every curve that ends at the edge, outside it, from the top down", () => {
    expect(named(spec)).toEqual(["Pure water", "Half water", "Pure silicate", "Earth-like", "Pure iron"]);
    for (const { mass } of curveLabels(spec, frames)) expect(mass).toBe(spec.axes.mass.range[1]);
  });

  it("leaves a curve to the legend whose name would cover another name", () => {
    const [first] = spec.curves;
    const twin = { ...first, label: "Twin" } as FigureSpec["curves"][number];
    const labels = named({ ...spec, curves: [...spec.curves, twin, twin] });
    expect(labels.filter((label) => label === "Twin" || label === "Pure iron")).toHaveLength(1);
  });

  it("leaves a curve to the legend whose name would cover a planet or not fit", () => {
    const axes = { ...spec.axes, mass: { ...spec.axes.mass, range: [0.1, 1000] as const } };
    const end = spec.curves[0];
    const mass = (end?.mass.at(-1) ?? 0) * 1.3;
    const radius = end?.radius.at(-1) ?? 0;
    const exact = (value: number) => ({ value, minus: 0, plus: 0 });
    const planet = { ...spec.planets[0], mass: exact(mass), radius: exact(radius) } as FigureSpec["planets"][number];
    const covered = {
      ...spec,
      axes,
      planets: [...spec.planets, planet],
      marks: [{ planet: spec.planets.length, verdict: 0, fade: 0 as const }],
    };
    expect(named({ ...covered, marks: [] })).toContain("Pure iron");
    expect(named(covered)).not.toContain("Pure iron");
    const long = spec.curves.map((curve) => ({ ...curve, label: "x".repeat(40) }));
    expect(named({ ...spec, curves: long })).toEqual([]);
  });
});
