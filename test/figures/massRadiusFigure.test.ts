import { describe, expect, it } from "vitest";
import { massRadiusFigure, twoReadingsWarning } from "../../src/figures/massRadiusFigure.ts";
import type { CurveInput, MassRadiusInput } from "../../src/figures/massRadiusInput.ts";
import { inventedSurvey } from "./inventedSurvey.ts";

const point = (massEarth: number, radiusEarth: number | null, extrapolatedLayers: string[] = []) => ({
  massEarth,
  radiusEarth,
  extrapolatedLayers,
});

const curve: CurveInput = {
  composition: "earth-like",
  title: "Earth-like: iron core, silicate mantle",
  layers: [
    { name: "iron", massFraction: 0.325 },
    { name: "silicate", massFraction: 0.675 },
  ],
  points: [point(10, 1.8, ["iron"]), point(1, 0.98), point(5, 1.5), point(100, null)],
};

const small: MassRadiusInput = {
  title: "Two planets",
  curves: [curve],
  planets: [
    {
      name: "Reed b",
      mass: { value: 2, minus: 0.2, plus: 0.3 },
      radius: { value: 1.2, minus: 0.1, plus: 0.1 },
      verdict: "rocky",
      statement: null,
      reason: null,
      note: null,
      values: [0.9],
    },
    {
      name: "Reed c",
      mass: null,
      radius: { value: 1.4, minus: 0.1, plus: 0.1 },
      verdict: null,
      statement: null,
      reason: "no mass",
      note: null,
      values: [null],
    },
  ],
  columns: [{ title: "P(rocky)" }],
  verdicts: ["dense"],
  sources: [{ subject: "iron", citation: "A reference" }],
  warnings: ["Mind the gap."],
  earthRadiusKm: 6378.1,
  version: "1.2.3",
  command: "bulkwright classify two.csv --html two.html",
};

describe("massRadiusFigure", () => {
  it("is this data for two planets and a curve", () => {
    expect(massRadiusFigure(small)).toEqual({
      kind: "mass-radius",
      title: "Two planets",
      summary:
        "1 mass–radius curve computed from equations of state. Of 2 planets, 1 drawn and 1 in the table alone, with the reason.",
      axes: {
        mass: { title: "Planet mass", unit: "Earth masses", range: [0.912, 11] },
        radius: { title: "Planet radius", unit: "Earth radii", range: [0.681, 2.59] },
      },
      curves: [
        {
          composition: "earth-like",
          label: "Earth-like",
          title: "Earth-like: iron core, silicate mantle",
          mass: [1, 5, 10, 100],
          radius: [0.98, 1.5, 1.8, null],
          extrapolatedFrom: 10,
        },
      ],
      planets: small.planets,
      columns: small.columns,
      verdicts: ["dense", "rocky"],
      marks: [{ planet: 0, verdict: 1, fade: 0 }],
      density: null,
      caption: {
        warnings: [
          "Mind the gap.",
          "Dashed parts of curves lie beyond the data behind an equation of state (Earth masses): Earth-like from 10.",
        ],
        notes: [
          "Bars show one standard error, upwards and downwards as listed; a bar that reaches zero runs to the edge.",
        ],
        compositions: [
          {
            name: "earth-like",
            title: "Earth-like: iron core, silicate mantle",
            layers: "32.5 % iron, 67.5 % silicate (centre to surface)",
          },
        ],
        sources: small.sources,
        earthRadius: "1 Earth radius = 6378.1 km",
        version: "1.2.3",
        command: "bulkwright classify two.csv --html two.html",
      },
    });
  });

  it("is plain JSON", () => {
    const spec = massRadiusFigure(inventedSurvey);
    expect(JSON.parse(JSON.stringify(spec))).toEqual(spec);
  });

  it("gives curves whose titles begin alike the names of their compositions", () => {
    const twin = { ...curve, composition: "earth-like-other-iron", title: "Earth-like: another iron" };
    const labels = massRadiusFigure({ ...small, curves: [curve, twin] }).curves.map(({ label }) => label);
    expect(labels).toEqual(["earth-like", "earth-like-other-iron"]);
  });

  it("draws no planet without a verdict, whatever mass and radius its list claims", () => {
    const planets = small.planets.map((planet) => ({ ...planet, verdict: null, reason: "mass from a relation" }));
    const { marks, axes } = massRadiusFigure({ ...small, planets });
    expect(marks).toEqual([]);
    expect(axes).toEqual(massRadiusFigure({ ...small, planets: [] }).axes);
  });

  it("stands without curves and without planets", () => {
    expect(massRadiusFigure({ ...small, curves: [] }).caption.warnings).toEqual(["Mind the gap."]);
    expect(massRadiusFigure({ ...small, planets: [] }).summary).toBe(
      "1 mass–radius curve computed from equations of state.",
    );
  });

  it("names both curves where a planet has two readings", () => {
    expect(twoReadingsWarning("Earth-like", "Silicate")).toContain("“Earth-like” and “Silicate” has two readings");
  });
});
