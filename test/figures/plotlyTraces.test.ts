import { describe, expect, it } from "vitest";
import type { FigurePlanet } from "../../src/figures/figureSpec.ts";
import { massRadiusFigure } from "../../src/figures/massRadiusFigure.ts";
import { plotlyTraces } from "../../src/figures/plotlyTraces.ts";
import { inventedSurvey } from "./inventedSurvey.ts";

const [first] = inventedSurvey.planets as [FigurePlanet];
const planet = (changes: Partial<FigurePlanet>): FigurePlanet => ({ ...first, ...changes });

const traces = (changes: Partial<typeof inventedSurvey>) =>
  plotlyTraces(massRadiusFigure({ ...inventedSurvey, curves: [], planets: [], ...changes }));

describe("plotlyTraces", () => {
  it("draws the lower error downwards and the upper error upwards", () => {
    const mass = { value: 5, minus: 1, plus: 2 };
    const radius = { value: 2, minus: 0.1, plus: 0.3 };
    const [trace] = traces({ planets: [planet({ mass, radius })] });
    expect(trace).toMatchObject({ x: [5], error_x: { symmetric: false, array: [2], arrayminus: [1] } });
    expect(trace).toMatchObject({ y: [2], error_y: { symmetric: false, array: [0.3], arrayminus: [0.1] } });
  });

  it("keeps a bar that reaches zero on the logarithmic axis", () => {
    const [bar] = traces({ planets: [planet({ mass: { value: 5, minus: 7, plus: 2 } })] }).map(
      ({ error_x }) => (error_x as { arrayminus: number[] }).arrayminus[0],
    );
    expect(bar).toBeGreaterThan(4.99);
    expect(bar).toBeLessThan(5);
  });

  it("gives each verdict its own symbol", () => {
    const verdicts = ["a", "b", "c", "d", "e", "f"];
    const drawn = traces({ planets: verdicts.map((verdict) => planet({ verdict })), verdicts: [] });
    const symbols = drawn.map(({ marker }) => (marker as { symbol: string }).symbol);
    expect(new Set(symbols).size).toBe(verdicts.length);
  });

  it("says name, values, verdict and note on hover", () => {
    const [trace] = traces({
      planets: [planet({ name: "Reed b", values: [0.98], note: "blended", statement: "rock and iron" })],
      columns: [{ title: "Chance" }],
    });
    expect(trace?.hovertext).toEqual([
      "<b>Reed b</b><br>0.420 &#177; 0.050 Earth masses<br>0.540 &#177; 0.020 Earth radii<br>rock and iron<br>Chance&#58; 0.98<br>blended",
    ]);
  });

  it("dashes a curve from its last mass within the data, and keeps its gaps", () => {
    const point = (massEarth: number, radiusEarth: number | null, beyond = false) => ({
      massEarth,
      radiusEarth,
      extrapolatedLayers: beyond ? ["core"] : [],
    });
    const points = [point(1, 1), point(2, null), point(3, 1.4), point(4, 1.5, true), point(5, 1.6, true)];
    const curves = [{ composition: "x", title: "X", layers: [], points }];
    const drawn = traces({ curves }).map(({ x, y, line }) => ({ x, y, dash: (line as { dash: string }).dash }));
    expect(drawn).toEqual([
      { x: [1, 2, 3], y: [1, null, 1.4], dash: "solid" },
      { x: [3, 4, 5], y: [1.4, 1.5, 1.6], dash: "7px,3px" },
    ]);
  });

  it("lays the curves over a crowd of planets", () => {
    const kinds = (count: number) => {
      const planets = Array.from({ length: count }, (_, i) =>
        planet({ mass: { value: 1, minus: i / 100, plus: i / 100 } }),
      );
      return traces({ planets, curves: inventedSurvey.curves }).map(({ mode }) => mode);
    };
    expect(kinds(20).at(-1)).toBe("markers");
    expect(kinds(100).at(-1)).toBe("lines");
  });
});
