import { figurePage } from "./figurePage.ts";
import type { FigureSpec } from "./figureSpec.ts";
import { legendHtml } from "./legend.ts";
import { curveTable, planetTable } from "./massRadiusTables.ts";
import { compactLayout, wideLayout } from "./plotlyLayout.ts";
import { plotlyTraces } from "./plotlyTraces.ts";

/**
 * A mass–radius figure as one self-contained page. `plotlySource` is the text of Plotly's script, which the page carries
 * along.
 * Checked by test/figures/plotlyHtml.test.ts and, in a browser, test/browser/figurePage.test.ts.
 */
export function plotlyHtml(spec: FigureSpec, plotlySource: string): Promise<string> {
  const planets = { heading: "Planets", table: planetTable(spec) };
  const curves = { heading: "Curves", table: curveTable(spec) };
  return figurePage(
    {
      title: spec.title,
      summary: spec.summary,
      diagram: "Mass–radius diagram",
      fileName: "mass-radius",
      traces: plotlyTraces(spec),
      wide: wideLayout(spec),
      compact: compactLayout(spec),
      legend: legendHtml(spec),
      caption: spec.caption,
      tables: [...(spec.planets.length > 0 ? [planets] : []), ...(spec.curves.length > 0 ? [curves] : [])],
    },
    plotlySource,
  );
}
