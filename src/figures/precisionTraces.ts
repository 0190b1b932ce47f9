import { plainNumber } from "./formatValue.ts";
import { hoverText } from "./plotlyText.ts";
import type { PlotlyTrace } from "./plotlyTraces.ts";
import type { ErrorPair, PrecisionSpec, SeparationContour } from "./precisionSpec.ts";

/** Ground that darkens with every level passed, contour lines, and today's errors on top. */
export function precisionTraces({ contours, present }: PrecisionSpec): PlotlyTrace[] {
  const drawn = contours.filter(({ line }) => line.length > 0);
  return [
    ...contours.filter(({ region }) => region.length > 0).map(regionTrace),
    ...drawn.map(lineTrace),
    ...(present ? [presentTrace(present)] : []),
  ];
}

const coordinates = (pairs: readonly ErrorPair[]) => ({
  x: pairs.map(({ massError }) => massError),
  y: pairs.map(({ radiusError }) => radiusError),
});

function regionTrace({ region }: SeparationContour): PlotlyTrace {
  return {
    type: "scatter",
    mode: "lines",
    ...coordinates(region),
    fill: "toself",
    fillcolor: "var(--density-low)",
    line: { width: 0 },
    hoverinfo: "skip",
  };
}

/** Below two sigma, where nothing is told apart yet, lines are dashed. */
const dashedBelow = 2;

function lineTrace({ sigma, label, line }: SeparationContour): PlotlyTrace {
  return {
    type: "scatter",
    mode: "lines",
    ...coordinates(line),
    line: { color: "var(--ink)", width: 1.8, dash: sigma < dashedBelow ? "6px,4px" : "solid" },
    hoverinfo: "text",
    hovertext: line.map((pair) => hoverText([label, ...errorLines(pair)])),
  };
}

function presentTrace(present: ErrorPair): PlotlyTrace {
  return {
    type: "scatter",
    mode: "markers",
    ...coordinates([present]),
    marker: { symbol: "circle", size: 13, color: "var(--verdict-2)", line: { color: "var(--paper)", width: 1.5 } },
    hoverinfo: "text",
    hovertext: [hoverText(["today", ...errorLines(present)])],
  };
}

const errorLines = ({ massError, radiusError }: ErrorPair): string[] => [
  `mass error ${plainNumber(massError, 3)} %`,
  `radius error ${plainNumber(radiusError, 3)} %`,
];
