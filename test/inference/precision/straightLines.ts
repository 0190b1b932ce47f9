import type { RadiusCurve } from "../../../src/curve/radiusCurve.ts";
import type { PlanetFamily } from "../../../src/inference/fractionPosterior.ts";

export const wholeRange = { lightest: 1e-3, heaviest: 1e3 };

/** R = start + slope M, for which forecasts with normal errors have closed forms. */
export function straightLine(start: number, slope: number): RadiusCurve {
  return {
    ...wholeRange,
    radius: (mass) => start + slope * mass,
    massWithRadius: (radius) => (slope === 0 ? undefined : (radius - start) / slope),
  };
}

/** R = 1.1 - 0.3 f + slope M. */
export function straightFamily(slope: number): PlanetFamily {
  return { ...wholeRange, member: (f) => straightLine(1.1 - 0.3 * f, slope) };
}
