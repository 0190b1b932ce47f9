import { markPlanets, type PlacedPlanet } from "./crowding.ts";
import type { FigureCaption, FigureCurve, FigurePlanet, FigureSpec } from "./figureSpec.ts";
import { formatCount } from "./formatValue.ts";
import { logRange } from "./logRange.ts";
import { extrapolationWarning, figureCurves, layersInWords } from "./massRadiusCurves.ts";
import type { MassRadiusInput } from "./massRadiusInput.ts";

/**
 * The mass–radius diagram of curves and planets as data.
 * Checked by test/figures/massRadiusFigure.test.ts.
 */
export function massRadiusFigure(input: MassRadiusInput): FigureSpec {
  const curves = figureCurves(input.curves);
  const verdicts = allVerdicts(input);
  const placed = input.planets.flatMap((planet, index) => placePlanet(planet, index, verdicts));
  const axes = axesAround(curves, placed);
  const { marks, density } = markPlanets(placed, axes);
  const spec = { kind: "mass-radius", title: input.title, axes, curves, verdicts, marks, density } as const;
  return {
    ...spec,
    planets: input.planets,
    columns: input.columns,
    summary: summary(curves.length, input.planets.length, placed.length),
    caption: caption(input, curves, { faded: marks.some(({ fade }) => fade > 0), shaded: density?.total ?? 0 }),
  };
}

/** A planet between these two curves can be read in both families; the page says so. */
export function twoReadingsWarning(earthLike: string, silicate: string): string {
  return (
    `A planet between the curves “${earthLike}” and “${silicate}” has two readings: ` +
    "iron and silicate without water, or water on an Earth-like interior. Both fractions are given, each on its own assumption."
  );
}

function allVerdicts({ verdicts, planets }: MassRadiusInput): string[] {
  const found = planets.flatMap(({ verdict }) => (verdict === null ? [] : [verdict]));
  return [...new Set([...verdicts, ...found])];
}

/** Only a planet with a verdict is a pair of measurements; the others may hold a limit or a value from a relation. */
function placePlanet(planet: FigurePlanet, index: number, verdicts: readonly string[]): PlacedPlanet[] {
  const { mass, radius, verdict } = planet;
  if (verdict === null || mass === null || radius === null) return [];
  return [{ planet: index, verdict: verdicts.indexOf(verdict), mass, radius }];
}

function axesAround(curves: readonly FigureCurve[], placed: readonly PlacedPlanet[]): FigureSpec["axes"] {
  const solved = curves.flatMap(({ mass, radius }) =>
    mass.flatMap((m, i) => (typeof radius[i] === "number" ? [{ mass: m, radius: radius[i] }] : [])),
  );
  const values = (quantity: "mass" | "radius") => [
    ...solved.map((point) => point[quantity]),
    ...placed.map((planet) => planet[quantity].value),
  ];
  return {
    mass: { title: "Planet mass", unit: "Earth masses", range: logRange(values("mass")) },
    radius: { title: "Planet radius", unit: "Earth radii", range: logRange(values("radius")) },
  };
}

function summary(curves: number, planets: number, drawn: number): string {
  const first = `${count(curves, "mass–radius curve")} computed from equations of state`;
  if (planets === 0) return `${first}.`;
  if (drawn === planets) return `${first}, and ${count(planets, "planet")}.`;
  const rest = formatCount(planets - drawn);
  return `${first}. Of ${count(planets, "planet")}, ${formatCount(drawn)} drawn and ${rest} in the table alone, with the reason.`;
}

const count = (n: number, noun: string): string => `${formatCount(n)} ${noun}${n === 1 ? "" : "s"}`;

function caption(
  input: MassRadiusInput,
  curves: readonly FigureCurve[],
  crowding: { faded: boolean; shaded: number },
): FigureCaption {
  const extrapolation = extrapolationWarning(curves);
  return {
    warnings: [...input.warnings, ...(extrapolation ? [extrapolation] : [])],
    notes: notes(input.planets.length > 0, crowding),
    compositions: input.curves.map(({ composition, title, layers }) => ({
      name: composition,
      title,
      layers: layersInWords(layers),
    })),
    sources: input.sources,
    earthRadius: `1 Earth radius = ${input.earthRadiusKm} km`,
    version: input.version,
    command: input.command,
  };
}

function notes(planets: boolean, { faded, shaded }: { faded: boolean; shaded: number }): string[] {
  if (!planets) return [];
  return [
    "Bars show one standard error, upwards and downwards as listed; a bar that reaches zero runs to the edge.",
    ...(faded
      ? [
          "Fainter planets are less precise: relative errors of mass and radius, added in quadrature, above 15 % and above 35 %.",
        ]
      : []),
    ...(shaded > 0
      ? [`Shading counts the ${formatCount(shaded)} least precise planets, which are not drawn one by one.`]
      : []),
  ];
}
