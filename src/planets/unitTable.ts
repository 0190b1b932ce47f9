import { constants, EARTH_MASS, JUPITER_MASS, JUPITER_RADIUS, SUN_MASS, SUN_RADIUS } from "../units/constants.ts";

export type Dimension =
  | "mass"
  | "length"
  | "density"
  | "time"
  | "temperature"
  | "acceleration"
  | "irradiance"
  | "speed"
  | "angle"
  | "metallicity"
  | "ratio";

/** A unit of a list; `earth` means the Earth's own mass, radius, density, gravity or insolation, and so on. */
export interface Unit {
  /** As used in options: `--unit radius=jupiter`. */
  readonly id: string;
  readonly dimension: Dimension;
  /** SI per unit; for the Earth radius the caller's choice comes in, see `siFactor`. */
  readonly factor: number;
  /** The column holds the decimal logarithm of the value in this unit. */
  readonly isLogarithm?: true;
}

const DAY = constants.day.value;
const YEAR = constants.julianYear.value;
const JUPITER_VOLUME = (4 / 3) * Math.PI * JUPITER_RADIUS ** 3;
const SUN_VOLUME = (4 / 3) * Math.PI * SUN_RADIUS ** 3;
const AU = constants.astronomicalUnit.value;

/**
 * Unit, and the ways in which files and headers spell it: lower case, and only letters, digits and the three planet
 * signs, so that `R_Earth`, `R⊕`, `g cm^-3` and `m/s**2` become `rearth`, `r⊕`, `gcm3` and `ms2`.
 * A spelling may stand for one unit per dimension, e.g. `earth`.
 */
const table: readonly (readonly [unit: Unit, spellings: string])[] = [
  [
    { id: "earth", dimension: "mass", factor: EARTH_MASS },
    "earth earths earthmass earthmasses massearth mearth me m⊕ mass⊕ ⊕ mterra geomass mgeo e",
  ],
  [
    { id: "jupiter", dimension: "mass", factor: JUPITER_MASS },
    "jupiter jup jupitermass jupitermasses massjupiter jovmass mjup mjupiter mj m♃ mjov j",
  ],
  [{ id: "sun", dimension: "mass", factor: SUN_MASS }, "sun solar solarmass solarmasses solmass msun msol ms m☉ m⊙ s"],
  [{ id: "kg", dimension: "mass", factor: 1 }, "kg kilogram kilograms"],
  [{ id: "g", dimension: "mass", factor: 1e-3 }, "g gram grams"],
  [
    { id: "earth", dimension: "length", factor: constants.earthRadius.value },
    "earth earths earthradius earthradii earthrad rearth re r⊕ radius⊕ ⊕ rterra georad rgeo e",
  ],
  [
    { id: "jupiter", dimension: "length", factor: JUPITER_RADIUS },
    "jupiter jup jupiterradius jupiterradii jupiterrad jovrad rjup rjupiter rj r♃ rjov j",
  ],
  [
    { id: "sun", dimension: "length", factor: SUN_RADIUS },
    "sun solar solarradius solarradii solrad rsun rsol r☉ r⊙ rs s",
  ],
  [{ id: "au", dimension: "length", factor: AU }, "au astronomicalunit astronomicalunits ua"],
  [{ id: "km", dimension: "length", factor: 1e3 }, "km kilometer kilometers kilometre kilometres"],
  [{ id: "m", dimension: "length", factor: 1 }, "m meter meters metre metres"],
  [{ id: "g-cm3", dimension: "density", factor: 1e3 }, "gcm3 gcc gpercm3"],
  [{ id: "kg-m3", dimension: "density", factor: 1 }, "kgm3 kgperm3"],
  [
    { id: "jupiter", dimension: "density", factor: JUPITER_MASS / JUPITER_VOLUME },
    "jupiter jup rhojup rhoj jovdensity j",
  ],
  [{ id: "sun", dimension: "density", factor: SUN_MASS / SUN_VOLUME }, "sun solar rhosun solardensity rho☉ s"],
  [{ id: "day", dimension: "time", factor: DAY }, "d day days"],
  [{ id: "hour", dimension: "time", factor: 3600 }, "h hr hrs hour hours"],
  [{ id: "year", dimension: "time", factor: YEAR }, "yr yrs year years a"],
  [{ id: "gyr", dimension: "time", factor: 1e9 * YEAR }, "gyr gyrs ga"],
  [{ id: "myr", dimension: "time", factor: 1e6 * YEAR }, "myr"],
  [{ id: "s", dimension: "time", factor: 1 }, "s sec second seconds"],
  [{ id: "k", dimension: "temperature", factor: 1 }, "k kelvin degk"],
  [{ id: "m-s2", dimension: "acceleration", factor: 1 }, "ms2 msec2 mpers2"],
  [{ id: "cm-s2", dimension: "acceleration", factor: 0.01 }, "cms2 cgs"],
  [
    { id: "log-cgs", dimension: "acceleration", factor: 0.01, isLogarithm: true },
    "log10cms2 logcms2 logcgs logg dexcms2 dex",
  ],
  [
    { id: "earth", dimension: "irradiance", factor: constants.solarIrradiance.value },
    "earth earthflux searth fearth s⊕ f⊕ ⊕ earthinsolation",
  ],
  [{ id: "w-m2", dimension: "irradiance", factor: 1 }, "wm2"],
  [{ id: "cgs", dimension: "irradiance", factor: 1e-3 }, "ergscm2 ergcm2s ergs1cm2 cgs"],
  [{ id: "m-s", dimension: "speed", factor: 1 }, "ms ms1 msec mpers"],
  [{ id: "km-s", dimension: "speed", factor: 1e3 }, "kms kms1 kmsec"],
  [{ id: "deg", dimension: "angle", factor: Math.PI / 180 }, "deg degree degrees °"],
  [{ id: "rad", dimension: "angle", factor: 1 }, "rad radian radians"],
  [{ id: "dex", dimension: "metallicity", factor: 1 }, "dex sun feh mh fe_h"],
  [{ id: "1", dimension: "ratio", factor: 1 }, "ratio dimensionless"],
  [{ id: "percent", dimension: "ratio", factor: 0.01 }, "percent %"],
];

const bySpelling = new Map<string, Unit[]>();
for (const [unit, spellings] of table) {
  for (const spelling of spellings.split(" ")) bySpelling.set(spelling, [...(bySpelling.get(spelling) ?? []), unit]);
}

/** The unit that `text` names; with `dimension`, only one of that dimension. Undefined where nothing fits. */
export function findUnit(text: string, dimension?: Dimension): Unit | undefined {
  // CDS tables bracket a unit to say that the column is its decimal logarithm.
  const logarithm = /^\s*\[.*\]\s*$/.test(text) ? "log" : "";
  const spelling = logarithm + text.toLowerCase().replace(/[^a-z0-9⊕♃☉⊙°%]/g, "");
  const units = bySpelling.get(spelling) ?? (logarithm === "" ? [] : (bySpelling.get(spelling.slice(3)) ?? []));
  return dimension === undefined ? units[0] : units.find((unit) => unit.dimension === dimension);
}

/** Units of a dimension by their option names. */
export const unitIds = (dimension: Dimension): string[] =>
  table.filter(([unit]) => unit.dimension === dimension).map(([unit]) => unit.id);

export const unitById = (id: string, dimension: Dimension): Unit | undefined =>
  table.find(([unit]) => unit.dimension === dimension && unit.id === id)?.[0];

/** SI per unit, with the Earth radius [m] the user has chosen. */
export const siFactor = (unit: Unit, earthRadius: number): number =>
  unit.id === "earth" && unit.dimension === "length" ? earthRadius : unit.factor;
