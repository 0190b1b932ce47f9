import type { PlanetRow } from "../../planets/quantity.ts";
import { constants } from "../../units/constants.ts";
import { eccentricityOf } from "../eccentricity.ts";
import { relationRule } from "../relationRule.ts";

/** A list may give the flux at any point of an eccentric orbit. */
function alongOrbit(row: PlanetRow): [number, number] {
  const eccentricity = eccentricityOf(row);
  return [(1 + eccentricity) ** -2, (1 - eccentricity) ** -2];
}

/** Source  Stefan–Boltzmann law and the inverse-square law; no albedo enters. */
export const insolationFromStar = relationRule(
  {
    quantity: "insolation",
    factor: constants.stefanBoltzmann.value,
    powers: { starTemperature: 4, starRadius: 2, semiMajorAxis: -2 },
    allowed: alongOrbit,
  },
  {
    id: "insolation-star-orbit",
    claim: "The insolation is that of the star's temperature and radius at the planet's distance",
    formula: "S = σT★⁴ (R★/a)², anywhere between pericentre and apocentre",
    source: "Stefan–Boltzmann law",
    otherwise:
      "star and planet may come from different publications, or the unit may not be that of the Earth's insolation",
    remedy: "compute the insolation from star and orbit of one publication",
  },
);
