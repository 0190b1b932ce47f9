import { GPA } from "../../units/constants.ts";
import type { Source } from "../material.ts";

/** A solid–solid boundary P = P0 + slope (T - T0), the Clapeyron slope taken as constant. SI. */
export interface PhaseBoundary {
  readonly low: string;
  readonly high: string;
  readonly pressureZero: number;
  /** [K] */
  readonly temperatureZero: number;
  /** Clapeyron slope [Pa/K]. */
  readonly slope: number;
  /** How far published values of P0 spread, as half a range [Pa]. */
  readonly spread: number;
  readonly source: Source;
}

/** Pressure at which two phases are in equilibrium [Pa]. */
export function boundaryPressure(boundary: PhaseBoundary, temperature: number): number {
  return boundary.pressureZero + boundary.slope * (temperature - boundary.temperatureZero);
}

/** P0 and its spread in GPa, slope in MPa/K. */
const boundary = (
  low: string,
  high: string,
  [pressure, temperatureZero, slope, spread]: readonly [number, number, number, number],
  source: Source,
): PhaseBoundary => ({
  low,
  high,
  pressureZero: pressure * GPA,
  temperatureZero,
  slope: (slope * GPA) / 1000,
  spread: spread * GPA,
  source,
});

const review = "reviews of mantle phase relations, e.g. Frost 2008, Elements 4, 171";

/**
 * Boundaries of the Mg-rich mantle, in order of depth. A two-phase loop is drawn as its middle.
 * Checked test/eos/melting/phaseBoundaries.test.ts
 */
export const mantleBoundaries = {
  olivineToWadsleyite: boundary("olivine", "wadsleyite", [13.9, 1775, 3.25, 0.3], {
    citation: review,
    note: "from memory: 13.8 to 14 GPa at 1750 to 1800 K, 2.5 to 4 MPa/K",
  }),
  wadsleyiteToRingwoodite: boundary("wadsleyite", "ringwoodite", [17.75, 1800, 5, 0.5], {
    citation: review,
    note: "from memory: 17.5 to 18 GPa near 1800 K, 4 to 6 MPa/K",
  }),
  ringwooditeToBridgmanite: boundary("ringwoodite", "bridgmanite + periclase", [23.4, 1900, -1.7, 1.2], {
    citation: review,
    note: "from memory: 23.4 GPa near 1900 K, -0.4 to -3 MPa/K; Irifune et al. 1998, Science 279, 1698 have 21.1(2) GPa at 1873 K on an older pressure scale",
  }),
  bridgmaniteToPostPerovskite: boundary("bridgmanite", "post-perovskite", [130, 2500, 7, 5], {
    citation: "Ono & Oganov 2005, Earth Planet. Sci. Lett. 236, 914",
    doi: "10.1016/j.epsl.2005.06.001",
    note: "other slopes: 7.5 (Tsuchiya et al. 2004), 9.6 to 9.9 (Oganov & Ono 2004), 13.3 MPa/K (Tateno et al. 2009)",
  }),
} as const satisfies Record<string, PhaseBoundary>;

/**
 * Where MgSiO3 post-perovskite decomposes [Pa], at 0 K: first to MgO + MgSi2O5, then to MgO + SiO2. The slopes are
 * large and negative but not known here in number, and no equation of state of the products is at hand: a silicate
 * beyond the first pressure is post-perovskite extrapolated, and should be called so.
 * Source  Umemoto & Wentzcovitch 2011, Earth Planet. Sci. Lett. 311, 225, abstract
 */
export const postPerovskiteDissociation = { toMgSi2O5: 900 * GPA, toSiO2: 2100 * GPA } as const;
