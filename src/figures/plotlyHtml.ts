import { captionHtml } from "./captionHtml.ts";
import { drawFigure } from "./drawFigure.ts";
import { escapeHtml, jsonForScript } from "./escape.ts";
import type { FigureSpec } from "./figureSpec.ts";
import { figureStyle } from "./figureStyle.ts";
import { legendHtml } from "./legend.ts";
import { curveTable, planetTable } from "./massRadiusTables.ts";
import { pageHtml } from "./page.ts";
import { compactLayout, wideLayout } from "./plotlyLayout.ts";
import { plotlyTraces } from "./plotlyTraces.ts";
import { tableHtml } from "./table.ts";

/**
 * A figure as one self-contained page. `plotlySource` is the text of Plotly's script, which the page carries along.
 * Checked by test/figures/plotlyHtml.test.ts and, in a browser, test/browser/figurePage.test.ts.
 */
export async function plotlyHtml(spec: FigureSpec, plotlySource: string): Promise<string> {
  const figure = {
    traces: plotlyTraces(spec),
    wide: wideLayout(spec),
    compact: compactLayout(spec),
    config: plotlyConfig,
  };
  return pageHtml({
    title: spec.title,
    style: figureStyle,
    body: bodyHtml(spec),
    data: { "figure-data": jsonForScript(figure) },
    scripts: [plotlySource, `(${drawFigure})();`],
  });
}

/** No TeX, no logo, no links out; the export button saves a vector image. */
const plotlyConfig = {
  typesetMath: false,
  displaylogo: false,
  showLink: false,
  showSendToCloud: false,
  plotlyServerURL: "",
  topojsonURL: "",
  modeBarButtons: [["toImage"], ["zoom2d", "pan2d", "zoomIn2d", "zoomOut2d", "resetScale2d"]],
  toImageButtonOptions: { format: "svg", filename: "mass-radius" },
};

function bodyHtml(spec: FigureSpec): string {
  const tables = [
    ...(spec.planets.length > 0 ? [section("Planets", tableHtml(planetTable(spec)))] : []),
    ...(spec.curves.length > 0 ? [section("Curves", tableHtml(curveTable(spec)))] : []),
  ];
  return `<main>
<h1>${escapeHtml(spec.title)}</h1>
<p class="lead">${escapeHtml(spec.summary)}</p>
<figure>
<div id="diagram" class="diagram" role="group" aria-label="Mass–radius diagram; the tables below hold the same data"></div>
<noscript><p>The diagram needs JavaScript; the tables below hold the same data.</p></noscript>
${legendHtml(spec)}
${captionHtml(spec.caption)}
</figure>
${tables.join("\n")}
</main>`;
}

const section = (title: string, content: string): string => `<section>\n<h2>${title}</h2>\n${content}\n</section>`;
