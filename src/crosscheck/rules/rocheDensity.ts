import { G } from "../../units/constants.ts";
import { relationRule } from "../relationRule.ts";

/** Radius of the Roche lobe over distance × cube root of the mass ratio. */
const PACZYNSKI = 0.46224;

/**
 * The lobe of a centrally condensed body, the weakest demand: a fluid of even density needs 1.4 times this density.
 * Source  Paczyński 1971, ARA&A 9, 183, eq. 4 (from memory); with Kepler's third law the star drops out
 */
export const rocheDensity = relationRule(
  {
    quantity: "mass",
    factor: (4 * Math.PI ** 2) / (PACZYNSKI ** 3 * G),
    powers: { radius: 3, period: -2 },
    allowed: () => [1, Number.POSITIVE_INFINITY],
  },
  {
    id: "roche-density",
    claim: "The planet is dense enough not to overflow its Roche lobe at its period",
    formula: "M ≥ 4π²R³ / (0.462³ G P²), i.e. ρ ≥ 3π / (0.462³ G P²)",
    source: "Paczyński 1971, ARA&A 9, 183, with Kepler's third law",
    otherwise: "radius, mass or period is wrong; no such body lasts",
    remedy: "check period and radius against the reference",
  },
);
