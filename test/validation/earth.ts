import { fluidLoveNumber } from "../../src/interior/loveNumber.ts";
import { type ProfilePoint, solveProfile } from "../../src/interior/profile.ts";
import { GPA } from "../../src/units/constants.ts";
import prem from "../fixtures/interior/prem.json" with { type: "json" };
import type { Check } from "./check.ts";
import { massOf, shipped, topOf } from "./model.ts";

const PREM = "PREM: Dziewonski & Anderson 1981, Phys. Earth Planet. Inter. 25, 297";
const PREM_G = `${PREM}, its density polynomials integrated with G of CODATA 2022`;
const JPL = "JPL Solar System Dynamics, planetary physical parameters";
/** GM [km³/s²], DE440. */
export const EARTH_GM = 398600.4355;
const SURFACE = 6371;
const DEEP_ENOUGH_KM = 150;
const FROM_BOUNDARY_KM = 50;

type Row = Omit<Check, "body" | "independent">;

/** The Earth with a core whose density is PREM's, and with one from cosmochemistry alone. */
export function earthChecks(): Check[] {
  return [
    ...checks("earth", "core-earth", false),
    ...checks("earth-cosmochemical-core", "core-earth-cosmochemical", true),
  ];
}

function checks(name: string, core: string, independent: boolean): Check[] {
  const { planet, points } = solveProfile(shipped(name), massOf(EARTH_GM), 1001);
  const [coreTop, innerCore] = [topOf(planet, core), topOf(planet, "hcp")];
  const mantleBase = points.find(({ layer }) => layer === "mantle-pyrolite")?.temperature ?? Number.NaN;
  const worst = worstDensity(points);
  const premDensity = density(worst.radius / 1e3);
  const love = fluidLoveNumber({ radius: points.map(({ radius }) => radius), density: points.map((p) => p.density) });
  const row = (
    quantity: string,
    unit: string,
    computed: number,
    reference: number,
    rest: Omit<Row, "quantity" | "unit" | "computed" | "reference">,
  ): Row => ({ quantity, unit, computed, reference, ...rest });
  const rows: Row[] = [
    row("radius", "km", planet.radius / 1e3, 6371.0084, { allowed: 0.005, source: JPL }),
    row("moment of inertia factor, mean", "", planet.inertiaFactor ?? Number.NaN, 0.3308, {
      allowed: 0.005,
      source: PREM,
    }),
    row("core radius", "km", coreTop.radius / 1e3, 3480, { allowed: 0.01, source: PREM }),
    row("inner core radius", "km", innerCore.radius / 1e3, 1221.5, { source: PREM }),
    row("pressure at the centre", "GPa", planet.centralPressure / GPA, 364.09, { allowed: 0.02, source: PREM_G }),
    row("pressure at the core–mantle boundary", "GPa", coreTop.pressure / GPA, 135.84, {
      allowed: 0.02,
      source: PREM_G,
    }),
    row("pressure at the inner core boundary", "GPa", innerCore.pressure / GPA, 329.07, { source: PREM_G }),
    row("temperature at the inner core boundary", "K", innerCore.temperature ?? Number.NaN, 6230, {
      source: "pure iron: Anzellini et al. 2013, Science 340, 464, 6230(500) K at 330 GPa",
    }),
    row("temperature at the base of the mantle", "K", mantleBase, 2450, {
      source: "adiabat of Brown & Shankland 1981, Geophys. J. R. astr. Soc. 66, 579 (from memory)",
    }),
    row("radius where ringwoodite breaks down", "km", topOf(planet, "bridgmanite").radius / 1e3, 5701, {
      source: `${PREM}, the 670 km discontinuity`,
    }),
    row("radius where olivine ends", "km", topOf(planet, "wadsleyite").radius / 1e3, 5971, {
      source: `${PREM}, the 400 km discontinuity`,
    }),
    row("fluid Love number k2", "", love, 0.9331, { source: "Radau–Clairaut equation along the PREM polynomials" }),
    row(
      `density where it differs most (${(SURFACE - worst.radius / 1e3).toFixed(0)} km deep), of all below ${DEEP_ENOUGH_KM} km and over ${FROM_BOUNDARY_KM} km from a boundary`,
      "kg/m3",
      worst.density,
      premDensity,
      { allowed: 0.02, source: PREM },
    ),
  ];
  return rows.map((check) => ({ body: name, independent, ...check, ...missOf(name, check.quantity) }));
}

const REASON =
  "silicon and sulphur from cosmochemistry make up about three quarters of the density deficit: oxygen, carbon or hydrogen is missing, and the compounds' volumes are those of solids";

/** What is missed, as measured: quantities by the words they begin with. */
const misses: Record<string, Record<string, NonNullable<Check["miss"]>>> = {
  "earth-cosmochemical-core": {
    "core radius": { difference: 0.0138, reason: REASON },
    "pressure at the centre": { difference: 0.03, reason: REASON },
    "pressure at the core–mantle boundary": { difference: 0.0253, reason: REASON },
    density: { difference: 0.0412, reason: REASON },
  },
};

function missOf(name: string, quantity: string): Pick<Check, "miss"> {
  const miss = Object.entries(misses[name] ?? {}).find(([start]) => quantity.startsWith(start))?.[1];
  return miss ? { miss } : {};
}

const layers = prem.layers as unknown as readonly [string, number, number, number[]][];

function density(km: number): number {
  const [, , , coefficients] = layers.find(([, , top]) => km <= top) ?? layers[layers.length - 1];
  return 1e3 * coefficients.reduce((sum, c, k) => sum + c * (km / prem.radiusKm) ** k, 0);
}

/** Far from the discontinuities of PREM and of the model, which need not be at the same depth. */
function worstDensity(points: readonly ProfilePoint[]): ProfilePoint {
  const own = points
    .filter(({ radius }, i) => i > 0 && radius === points[i - 1].radius)
    .map(({ radius }) => radius / 1e3);
  const boundaries = [...own, ...layers.map(([, bottom]) => bottom).filter((km) => km > 0)];
  const usable = points.filter(({ radius }) => {
    const km = radius / 1e3;
    return km < SURFACE - DEEP_ENOUGH_KM && boundaries.every((boundary) => Math.abs(km - boundary) >= FROM_BOUNDARY_KM);
  });
  const off = (point: ProfilePoint): number => Math.abs(point.density / density(point.radius / 1e3) - 1);
  return usable.reduce((worst, point) => (off(point) > off(worst) ? point : worst));
}
