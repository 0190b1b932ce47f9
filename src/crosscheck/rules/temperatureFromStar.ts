import type { PlanetRow } from "../../planets/quantity.ts";
import { eccentricityOf } from "../eccentricity.ts";
import { relationRule } from "../relationRule.ts";
import { temperatureRange } from "../temperatureRange.ts";

function alongOrbit(row: PlanetRow): [number, number] {
  const eccentricity = eccentricityOf(row);
  const [lowest, highest] = temperatureRange;
  return [lowest * (1 + eccentricity) ** -0.5, highest * (1 - eccentricity) ** -0.5];
}

/** Assumptions about albedo and redistribution: temperatureRange.ts. */
export const temperatureFromStar = relationRule(
  {
    quantity: "equilibriumTemperature",
    factor: Math.SQRT1_2,
    powers: { starTemperature: 1, starRadius: 0.5, semiMajorAxis: -0.5 },
    allowed: alongOrbit,
  },
  {
    id: "temperature-star-orbit",
    claim: "The equilibrium temperature is one the star can cause at the planet's distance",
    formula:
      "T = T★ √(R★/2a) [f(1 − A)]^¼, Bond albedo A from 0 to 0.8, redistribution f from 1 (whole planet) to 8/3 (none), anywhere between pericentre and apocentre",
    source: "Cowan & Agol 2011, ApJ 729, 54, eq. 3–4 (numbers from memory)",
    otherwise: "the temperature may be a measured one, or of a young planet that still glows by itself",
    remedy: "compute the temperature from star and orbit of one publication, and state albedo and redistribution",
  },
);
