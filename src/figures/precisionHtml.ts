import { compactHeight, type DiagramAxes, diagramLayout, type PlotlyLayout, wideHeight } from "./diagramLayout.ts";
import { figurePage } from "./figurePage.ts";
import type { LogAxis } from "./figureSpec.ts";
import { plotlyText } from "./plotlyText.ts";
import type { ErrorPair, PrecisionSpec, SeparationContour } from "./precisionSpec.ts";
import { gridTable, stepTable } from "./precisionTables.ts";
import { precisionTraces } from "./precisionTraces.ts";

/**
 * A precision figure as one self-contained page.
 * Checked by test/figures/precisionFigure.test.ts and, in a browser, test/browser/precisionPage.test.ts.
 */
export function precisionHtml(spec: PrecisionSpec, plotlySource: string): Promise<string> {
  return figurePage(
    {
      title: spec.title,
      summary: spec.summary,
      diagram: "Contour map of the separation over the errors of mass and radius",
      fileName: "precision",
      traces: precisionTraces(spec),
      wide: {
        ...layout(spec, { width: 1000, height: wideHeight - 72 }),
        height: wideHeight,
        margin: { l: 64, r: 16, t: 16, b: 56 },
        dragmode: "zoom",
      },
      compact: {
        ...layout(spec, { width: 330, height: compactHeight - 58 }),
        height: compactHeight,
        margin: { l: 50, r: 10, t: 10, b: 48 },
        dragmode: false,
      },
      legend: "",
      caption: spec.caption,
      tables: [
        { heading: "Errors and what they buy", table: stepTable(spec) },
        { heading: "The map as numbers", table: gridTable(spec) },
      ],
    },
    plotlySource,
  );
}

function layout(spec: PrecisionSpec, plot: { width: number; height: number }): PlotlyLayout {
  const axes: DiagramAxes = { x: spec.axes.massError, y: spec.axes.radiusError };
  const labels = spec.contours.filter(({ line }) => line.length > 0).map(contourLabel);
  return {
    ...diagramLayout(axes, plot),
    annotations: [...labels, ...(spec.present ? [presentLabel(spec.present, axes.x)] : [])],
  };
}

/** On the line, interrupting it: where it is level, so that labels stand above each other. */
function contourLabel({ label, line }: SeparationContour): PlotlyLayout {
  return {
    ...placed(line[Math.floor(line.length / 4)]),
    text: plotlyText(label),
    bgcolor: "var(--paper)",
    borderpad: 1,
  };
}

/** Beside the mark, on the side where there is room. */
function presentLabel(present: ErrorPair, { range: [left, right] }: LogAxis): PlotlyLayout {
  const side =
    present.massError ** 2 < left * right ? { xanchor: "left", xshift: 10 } : { xanchor: "right", xshift: -10 };
  return { ...placed(present), ...side, text: "today", bgcolor: "var(--paper)", borderpad: 1 };
}

function placed({ massError, radiusError }: ErrorPair): PlotlyLayout {
  return {
    x: Math.log10(massError),
    y: Math.log10(radiusError),
    showarrow: false,
    font: { size: 13, color: "var(--ink)" },
  };
}
