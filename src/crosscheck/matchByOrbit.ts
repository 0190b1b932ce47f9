import type { PlanetRow } from "../planets/quantity.ts";
import { groupBy } from "./groupBy.ts";
import type { StepResult } from "./listMatch.ts";
import { pairUp } from "./pairUp.ts";

/** Pairs rows whose stars coincide on the sky within `separation` [rad] and whose periods agree within `tolerance`. */
export function matchByOrbit(
  rows: readonly PlanetRow[],
  others: readonly PlanetRow[],
  separation: number,
  tolerance: number,
): StepResult {
  const zone = (row: PlanetRow) => Math.floor((row.quantities.declination?.value ?? Number.NaN) / separation);
  const zones = groupBy(others, (row) => String(zone(row)));
  const candidates = new Map(
    rows.map((row) => {
      const near = [-1, 0, 1].flatMap((step) => zones.get(String(zone(row) + step)) ?? []);
      return [row, near.filter((other) => sameOrbit(row, other, separation, tolerance))] as const;
    }),
  );
  return pairUp(candidates, "position-and-period");
}

function sameOrbit(a: PlanetRow, b: PlanetRow, separation: number, tolerance: number): boolean {
  const periods = [a.quantities.period?.value, b.quantities.period?.value];
  const [first, second] = periods;
  if (!first || !second || !(Math.abs(Math.log(first / second)) <= tolerance)) return false;
  return angularDistance(a, b) <= separation;
}

/** Great-circle distance [rad] by the haversine, exact for small angles; NaN without positions. */
function angularDistance(a: PlanetRow, b: PlanetRow): number {
  const of = (row: PlanetRow) => [
    row.quantities.rightAscension?.value ?? Number.NaN,
    row.quantities.declination?.value ?? Number.NaN,
  ];
  const [raA = 0, decA = 0] = of(a);
  const [raB = 0, decB = 0] = of(b);
  const square = (x: number) => Math.sin(x / 2) ** 2;
  return 2 * Math.asin(Math.sqrt(square(decA - decB) + Math.cos(decA) * Math.cos(decB) * square(raA - raB)));
}
