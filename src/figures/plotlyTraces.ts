import type { DensityMap, Estimate, FigureCurve, FigurePlanet, FigureSpec, PlanetMark } from "./figureSpec.ts";
import { formatValue, plainNumber } from "./formatValue.ts";
import { hoverText } from "./plotlyText.ts";
import { curveColour, curveGroup, densityGroup, symbolScale, verdictGroup, verdictStyle } from "./seriesStyle.ts";

/** A Plotly trace; colours are CSS variables that the drawing script resolves. */
export type PlotlyTrace = Readonly<Record<string, unknown>>;

/**
 * Everything drawn, from the back to the front: shading, curves, faint planets, precise planets. Where planets crowd,
 * the curves come last, with a margin of paper, or they would be buried.
 */
export function plotlyTraces(spec: FigureSpec): PlotlyTrace[] {
  const crowded = spec.marks.some(({ fade }) => fade > 0);
  const shading = spec.density ? [densityTrace(spec.density)] : [];
  const planets = ([2, 1, 0] as const).flatMap((fade) => planetTraces(spec, fade));
  const curves = spec.curves.flatMap(curveTraces);
  if (!crowded) return [...shading, ...curves, ...planets];
  return [...shading, ...planets, ...spec.curves.map(curveMargin), ...curves];
}

/** A curve of few points shows where they are. */
const sparse = 8;

function curveTraces(curve: FigureCurve, index: number): PlotlyTrace[] {
  const { mass, extrapolatedFrom } = curve;
  const beyond = extrapolatedFrom === null ? mass.length : mass.indexOf(extrapolatedFrom);
  const shared = {
    type: "scatter",
    mode: mass.length > sparse ? "lines" : "lines+markers",
    legendgroup: curveGroup(index),
    marker: { size: 4, color: `var(--${curveColour(index)})` },
    hoverinfo: "text",
  };
  const part = (from: number, to: number, dash: string) => ({
    ...shared,
    x: mass.slice(from, to),
    y: curve.radius.slice(from, to),
    hovertext: mass.slice(from, to).map((_, i) => curveHover(curve, from + i)),
    line: { color: `var(--${curveColour(index)})`, width: 2, dash },
  });
  const solid = beyond > 0 ? [part(0, beyond, "solid")] : [];
  const dashed = beyond < mass.length ? [part(Math.max(0, beyond - 1), mass.length, "7px,3px")] : [];
  return [...solid, ...dashed];
}

function curveMargin({ mass, radius }: FigureCurve, index: number): PlotlyTrace {
  const line = { color: "var(--paper)", width: 5 };
  return {
    type: "scatter",
    mode: "lines",
    legendgroup: curveGroup(index),
    x: mass,
    y: radius,
    line,
    hoverinfo: "skip",
  };
}

function curveHover({ label, mass, radius, extrapolatedFrom }: FigureCurve, i: number): string {
  const [m, r] = [mass[i] ?? 0, radius[i] ?? 0];
  const place = `${plainNumber(m, 3)} Earth masses, ${plainNumber(r, 4)} Earth radii`;
  const beyond = extrapolatedFrom !== null && m >= extrapolatedFrom;
  return hoverText([label, place, ...(beyond ? ["beyond the data behind an equation of state"] : [])]);
}

/** The whole group fades at once, so that crossing bars of faint planets do not add up to a dark one. */
const opacities = [1, 0.5, 0.2] as const;

function planetTraces(spec: FigureSpec, fade: 0 | 1 | 2): PlotlyTrace[] {
  const marks = spec.marks.filter((mark) => mark.fade === fade);
  return spec.verdicts.flatMap((_, verdict) => {
    const own = marks.filter((mark) => mark.verdict === verdict);
    return own.length > 0 ? [planetTrace(spec, own, verdict, opacities[fade])] : [];
  });
}

function planetTrace(spec: FigureSpec, marks: PlanetMark[], verdict: number, opacity: number): PlotlyTrace {
  const { colour, symbol, open } = verdictStyle(verdict);
  const color = `var(--${colour})`;
  const planets = marks.map((mark) => spec.planets[mark.planet] as FigurePlanet);
  const masses = planets.map((planet) => planet.mass as Estimate);
  const radii = planets.map((planet) => planet.radius as Estimate);
  return {
    type: "scatter",
    mode: "markers",
    legendgroup: verdictGroup(verdict),
    x: masses.map(({ value }) => value),
    y: radii.map(({ value }) => value),
    error_x: errorBars(masses, color),
    error_y: errorBars(radii, color),
    opacity,
    marker: {
      symbol: open ? `${symbol}-open` : symbol,
      size: markSize(spec.marks.length) * symbolScale[symbol],
      color,
      opacity: 1,
      line: open ? { color, width: 1.6 } : { color: "var(--paper)", width: 0.8 },
    },
    hoverinfo: "text",
    hovertext: planets.map((planet) => planetHover(planet, spec)),
  };
}

function markSize(count: number): number {
  if (count <= 60) return 10;
  return count <= 400 ? 8 : 6;
}

/** A bar that would reach zero or below runs off the logarithmic axis instead. */
function errorBars(estimates: readonly Estimate[], color: string): PlotlyTrace {
  const nearlyAll = 1 - 1e-6;
  return {
    type: "data",
    symmetric: false,
    array: estimates.map(({ plus }) => plus ?? 0),
    arrayminus: estimates.map(({ minus, value }) => Math.min(minus ?? 0, value * nearlyAll)),
    color,
    thickness: 1.2,
    width: 0,
  };
}

function planetHover({ name, mass, radius, verdict, statement, note, values }: FigurePlanet, spec: FigureSpec): string {
  const lines = values.flatMap((value, i) => {
    const column = spec.columns[i];
    if (value === null || value === "" || !column) return [];
    return [`${column.title}: ${formatValue(value)}${column.unit ? ` ${column.unit}` : ""}`];
  });
  return hoverText([
    name,
    `${formatValue(mass)} ${spec.axes.mass.unit}`,
    `${formatValue(radius)} ${spec.axes.radius.unit}`,
    statement ?? verdict ?? "",
    ...lines,
    ...(note ? [note] : []),
  ]);
}

function densityTrace({ massEdges, radiusEdges, counts }: DensityMap): PlotlyTrace {
  return {
    type: "heatmap",
    legendgroup: densityGroup,
    x: massEdges,
    y: radiusEdges,
    z: counts.map((row) => row.map((count) => (count > 0 ? Math.log10(count) : null))),
    colorscale: [
      [0, "var(--density-low)"],
      [1, "var(--density-high)"],
    ],
    showscale: false,
    hoverinfo: "skip",
  };
}
