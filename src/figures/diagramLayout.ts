import type { LogAxis } from "./figureSpec.ts";
import { tickCount } from "./tickCount.ts";

export type PlotlyLayout = Readonly<Record<string, unknown>>;

export interface DiagramAxes {
  readonly x: LogAxis;
  readonly y: LogAxis;
}

export const wideHeight = 660;
export const compactHeight = 440;

/** What every diagram has in common; `plot` is the size in pixels that ticks are chosen for. */
export function diagramLayout({ x, y }: DiagramAxes, plot: { width: number; height: number }): PlotlyLayout {
  return {
    xaxis: axisLayout(x, plot.width, 30),
    yaxis: axisLayout(y, plot.height, 16),
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
