import type { DensityMap, Estimate, LogAxis, PlanetMark } from "./figureSpec.ts";

/** Drawn one by one at most; beyond this a page becomes slow to open and to move about in. */
export const singlePlanetLimit = 3000;

/** Up to here every planet has room for its error bars. */
const fadeAbove = 60;

const cellsPerAxis = 60;

/** A planet with a place on the diagram. */
export interface PlacedPlanet {
  readonly planet: number;
  readonly verdict: number;
  readonly mass: Estimate;
  readonly radius: Estimate;
}

/**
 * Who is drawn how on a crowded diagram: the most precise planets one by one, less precise ones fainter so that their
 * long error bars do not bury the others, and what exceeds `singlePlanetLimit` as a map of counts.
 */
export function markPlanets(
  placed: readonly PlacedPlanet[],
  axes: { readonly mass: LogAxis; readonly radius: LogAxis },
): { marks: PlanetMark[]; density: DensityMap | null } {
  const byPrecision = [...placed].sort((a, b) => relativeError(a) - relativeError(b) || a.planet - b.planet);
  const singles = byPrecision.slice(0, singlePlanetLimit).sort((a, b) => a.planet - b.planet);
  const rest = byPrecision.slice(singlePlanetLimit);
  const crowded = placed.length > fadeAbove;
  const marks = singles.map((one) => ({
    planet: one.planet,
    verdict: one.verdict,
    fade: crowded ? fadeOf(relativeError(one)) : (0 as const),
  }));
  return { marks, density: rest.length > 0 ? densityMap(rest, axes) : null };
}

/** Length of the error cross relative to the values; infinite where an error is missing. */
function relativeError({ mass, radius }: PlacedPlanet): number {
  return Math.hypot(halfWidth(mass), halfWidth(radius));
}

function halfWidth({ value, minus, plus }: Estimate): number {
  return minus === null || plus === null ? Number.MAX_VALUE : (minus + plus) / (2 * value);
}

function fadeOf(error: number): 0 | 1 | 2 {
  if (error <= 0.15) return 0;
  return error <= 0.35 ? 1 : 2;
}

function densityMap(
  planets: readonly PlacedPlanet[],
  axes: { readonly mass: LogAxis; readonly radius: LogAxis },
): DensityMap {
  const massEdges = logEdges(axes.mass.range);
  const radiusEdges = logEdges(axes.radius.range);
  const counts = Array.from({ length: cellsPerAxis }, () => new Array<number>(cellsPerAxis).fill(0));
  for (const { mass, radius } of planets) {
    const row = counts[cellOf(radius.value, axes.radius.range)];
    const column = cellOf(mass.value, axes.mass.range);
    if (row) row[column] = (row[column] ?? 0) + 1;
  }
  return { massEdges, radiusEdges, counts, total: planets.length };
}

function logEdges([low, high]: readonly [number, number]): number[] {
  return Array.from({ length: cellsPerAxis + 1 }, (_, i) => low * (high / low) ** (i / cellsPerAxis));
}

function cellOf(value: number, [low, high]: readonly [number, number]): number {
  const fraction = Math.log(value / low) / Math.log(high / low);
  return Math.min(cellsPerAxis - 1, Math.floor(fraction * cellsPerAxis));
}
