import { type CurveLabel, curveLabels, labelGap, labelWidth } from "./curveLabels.ts";
import { compactHeight, type DiagramAxes, diagramLayout, type PlotlyLayout, wideHeight } from "./diagramLayout.ts";
import type { FigureSpec } from "./figureSpec.ts";
import { plotlyText } from "./plotlyText.ts";
import { curveGroup } from "./seriesStyle.ts";

const widestMargin = 190;
/** Plotting widths at which labels must be clear: the narrowest page that shows them, and the widest. */
const labelledWidths = [500, 1050];

/** With curve names beside the curves; for pages that have the room. */
export function wideLayout(spec: FigureSpec): PlotlyLayout {
  const height = wideHeight - 90;
  const frames = labelledWidths.map((width) => ({ width, height, margin: widestMargin }));
  const labels = curveLabels(spec, frames);
  const widest = Math.max(0, ...labels.map(({ curve }) => labelWidth(spec.curves[curve]?.label ?? "")));
  return {
    ...diagramLayout(diagramAxes(spec), { width: 560, height }),
    height: wideHeight,
    margin: { l: 64, r: Math.min(widestMargin, widest + 12) || 16, t: 34, b: 56 },
    annotations: labels.map((label) => annotation(spec, label)),
    dragmode: "zoom",
  };
}

/** For a telephone: names in the legend only, and a finger that scrolls the page, not the axes. */
export function compactLayout(spec: FigureSpec): PlotlyLayout {
  return {
    ...diagramLayout(diagramAxes(spec), { width: 330, height: compactHeight - 58 }),
    height: compactHeight,
    margin: { l: 50, r: 10, t: 10, b: 48 },
    annotations: [],
    dragmode: false,
  };
}

const diagramAxes = ({ axes }: FigureSpec): DiagramAxes => ({ x: axes.mass, y: axes.radius });

function annotation(spec: FigureSpec, { curve, mass, radius, shift }: CurveLabel): PlotlyLayout {
  return {
    name: curveGroup(curve),
    x: Math.log10(mass),
    y: Math.log10(radius),
    xref: "x",
    yref: "y",
    xanchor: "left",
    yanchor: "middle",
    xshift: labelGap - 2,
    yshift: -shift,
    text: plotlyText(spec.curves[curve]?.label ?? ""),
    showarrow: false,
    font: { size: 13, color: "var(--ink)" },
  };
}
