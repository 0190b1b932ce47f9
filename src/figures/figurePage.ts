import { captionHtml } from "./captionHtml.ts";
import type { PlotlyLayout } from "./diagramLayout.ts";
import { drawFigure } from "./drawFigure.ts";
import { escapeHtml, jsonForScript } from "./escape.ts";
import type { FigureCaption } from "./figureSpec.ts";
import { figureStyle } from "./figureStyle.ts";
import { pageHtml } from "./page.ts";
import type { PlotlyTrace } from "./plotlyTraces.ts";
import { type PageTable, tableHtml } from "./table.ts";

/** A page with one diagram. `legend` is finished HTML; text is verbatim. */
export interface FigurePage {
  readonly title: string;
  readonly summary: string;
  /** What the diagram is, for those who cannot see it. */
  readonly diagram: string;
  /** Of the image it is exported to. */
  readonly fileName: string;
  readonly traces: readonly PlotlyTrace[];
  readonly wide: PlotlyLayout;
  readonly compact: PlotlyLayout;
  readonly legend: string;
  readonly caption: FigureCaption;
  /** Heading and content, the diagram's data among them. */
  readonly tables: readonly { readonly heading: string; readonly table: PageTable }[];
}

/** One self-contained page. `plotlySource` is the text of Plotly's script, which the page carries along. */
export async function figurePage(page: FigurePage, plotlySource: string): Promise<string> {
  const { traces, wide, compact, fileName } = page;
  return pageHtml({
    title: page.title,
    style: figureStyle,
    body: bodyHtml(page),
    data: { "figure-data": jsonForScript({ traces, wide, compact, config: plotlyConfig(fileName) }) },
    scripts: [plotlySource, `(${drawFigure})();`],
  });
}

/** No TeX, no logo, no links out; the export button saves a vector image. */
const plotlyConfig = (fileName: string) => ({
  typesetMath: false,
  displaylogo: false,
  showLink: false,
  showSendToCloud: false,
  plotlyServerURL: "",
  topojsonURL: "",
  modeBarButtons: [["toImage"], ["zoom2d", "pan2d", "zoomIn2d", "zoomOut2d", "resetScale2d"]],
  toImageButtonOptions: { format: "svg", filename: fileName },
});

function bodyHtml({ title, summary, diagram, legend, caption, tables }: FigurePage): string {
  const sections = tables.map(({ heading, table }) => section(heading, tableHtml(table)));
  return `<main>
<h1>${escapeHtml(title)}</h1>
<p class="lead">${escapeHtml(summary)}</p>
<figure>
<div id="diagram" class="diagram" role="group" aria-label="${escapeHtml(diagram)}; the tables below hold the same data"></div>
<noscript><p>The diagram needs JavaScript; the tables below hold the same data.</p></noscript>
${legend}
${captionHtml(caption)}
</figure>
${sections.join("\n")}
</main>`;
}

const section = (title: string, content: string): string => `<section>\n<h2>${title}</h2>\n${content}\n</section>`;
