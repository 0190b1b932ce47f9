import { G } from "../units/constants.ts";
import { fluidLoveNumber } from "./loveNumber.ts";
import type { Planet } from "./planet.ts";
import { profileOf } from "./profile.ts";

/** Rows of the profile behind the Love number: its error is then 1e-5. */
const ROWS = 500;

/**
 * Fluid Love number k2 of a solved planet, see `fluidLoveNumber`; undefined under gas, whose density is not resolved.
 * Checked test/interior/observables.test.ts
 */
export function planetLoveNumber(planet: Planet): number | undefined {
  if (planet.envelope !== undefined) return undefined;
  const points = profileOf(planet, ROWS);
  return fluidLoveNumber({
    radius: points.map(({ radius }) => radius),
    // Some forms reach zero at the surface, which a table of densities may not hold; nothing weighs on it there.
    density: points.map(({ density }) => Math.max(density, Number.MIN_VALUE)),
  });
}

/** Radius of the innermost layer over that of the planet; undefined where there is but one layer and no gas. */
export function coreRadiusFraction({ boundaries, radius, envelope }: Planet): number | undefined {
  const top = boundaries.find(({ kind }) => kind !== "phase");
  const isWhole = top?.kind === "surface" && envelope === undefined;
  return top === undefined || isWhole ? undefined : top.radius / radius;
}

/** Speed [m/s] that lifts a body from the radius to infinity, √(2GM/R). */
export function escapeSpeed({ mass, radius }: Planet): number {
  return Math.sqrt((2 * G * mass) / radius);
}
