import type { Contrast, ErrorSizes } from "./separation.ts";

/**
 * The largest mass error [kg] with which two compositions are `level` sigma apart while the radius error [m] stays;
 * undefined where no mass error is small enough.
 *   σ_M = sqrt((gap/level)² - σ_R²) / slope
 * Infinite where the curves are flat, so that the mass does not matter.
 * Checked test/inference/precision/requiredErrors.test.ts
 */
export function requiredMassError({ gap, slope }: Contrast, level: number, radiusError: number): number | undefined {
  const room = roomBeside(gap / level, radiusError);
  return room === undefined ? undefined : room / slope;
}

/** The same for the radius error [m] while the mass error [kg] stays. */
export function requiredRadiusError({ gap, slope }: Contrast, level: number, massError: number): number | undefined {
  return roomBeside(gap / level, slope * massError);
}

/**
 * The same for both errors in the ratio σ_M / σ_R [kg/m]; undefined only where the two compositions have one radius.
 *   σ_R = (gap/level) / sqrt(1 + (slope · ratio)²)
 */
export function requiredTogether({ gap, slope }: Contrast, level: number, ratio: number): ErrorSizes | undefined {
  const radius = gap / level / Math.hypot(1, slope * ratio);
  return radius > 0 ? { mass: ratio * radius, radius } : undefined;
}

/** What of an allowed error is left, in quadrature, beside one that stays. */
function roomBeside(allowed: number, staying: number): number | undefined {
  return staying < allowed ? Math.sqrt(allowed ** 2 - staying ** 2) : undefined;
}
