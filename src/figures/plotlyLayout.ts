import { type CurveLabel, curveLabels, labelGap, labelWidth } from "./curveLabels.ts";
import type { FigureSpec, LogAxis } from "./figureSpec.ts";
import { plotlyText } from "./plotlyText.ts";
import { curveGroup } from "./seriesStyle.ts";
import { tickCount } from "./tickCount.ts";

export type PlotlyLayout = Readonly<Record<string, unknown>>;

const wideHeight = 660;
const compactHeight = 440;
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
    ...sharedLayout(spec, { width: 560, height }),
    height: wideHeight,
    margin: { l: 64, r: Math.min(widestMargin, widest + 12) || 16, t: 34, b: 56 },
    annotations: labels.map((label) => annotation(spec, label)),
    dragmode: "zoom",
  };
}

/** For a telephone: names in the legend only, and a finger that scrolls the page, not the axes. */
export function compactLayout(spec: FigureSpec): PlotlyLayout {
  return {
    ...sharedLayout(spec, { width: 330, height: compactHeight - 58 }),
    height: compactHeight,
    margin: { l: 50, r: 10, t: 10, b: 48 },
    annotations: [],
    dragmode: false,
  };
}

function sharedLayout({ axes }: FigureSpec, plot: { width: number; height: number }): PlotlyLayout {
  return {
    xaxis: axisLayout(axes.mass, plot.width, 30),
    yaxis: axisLayout(axes.radius, plot.height, 16),
    font: {
      family: "Source Sans 3, Noto Sans, Segoe UI, Liberation Sans, Helvetica Neue, Arial, sans-serif",
      size: 13,
      color: "var(--ink)",
    },
    paper_bgcolor: "var(--paper)",
    plot_bgcolor: "var(--paper)",
    hovermode: "closest",
    hoverdistance: 12,
    hoverlabel: {
      bgcolor: "var(--panel)",
      bordercolor: "var(--rule)",
      font: { color: "var(--ink)", size: 13 },
      align: "left",
    },
    modebar: { bgcolor: "rgba(0,0,0,0)", color: "var(--ink-soft)", activecolor: "var(--accent)" },
    showlegend: false,
    uirevision: "keep",
  };
}

/** Ticks as plain numbers; only their count is fixed, so that they stay readable when a reader zooms in. */
function axisLayout({ title, unit, range }: LogAxis, pixels: number, labelPixels: number): PlotlyLayout {
  const [low, high] = [Math.log10(range[0]), Math.log10(range[1])];
  return {
    type: "log",
    title: { text: `${title} (${unit})`, standoff: 12, font: { size: 14 } },
    range: [low, high],
    nticks: tickCount(high - low, pixels, labelPixels),
    tickformat: ".6~r",
    tickangle: 0,
    ticks: "outside",
    ticklen: 5,
    tickcolor: "var(--ink-soft)",
    minor: { ticks: "outside", ticklen: 3, dtick: "D1", tickcolor: "var(--rule)" },
    gridcolor: "var(--grid)",
    showline: true,
    mirror: true,
    linecolor: "var(--ink-soft)",
    zeroline: false,
  };
}

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
