import type { QuantityName } from "../planets/quantity.ts";
import { EARTH_MASS, EARTH_RADIUS, JUPITER_MASS, JUPITER_RADIUS, SUN_MASS, SUN_RADIUS } from "../units/constants.ts";

/** A confusion of units: the stated value times `factor` is the true one. */
export interface UnitSlip {
  readonly quantity: QuantityName;
  readonly factor: number;
  /** Completes "would fit if …". */
  readonly words: string;
}

const bothWays = (quantity: QuantityName, factor: number, forward: string, backward: string): UnitSlip[] => [
  { quantity, factor, words: forward },
  { quantity, factor: 1 / factor, words: backward },
];

const thousandfold: readonly QuantityName[] = [
  "mass",
  "minimumMass",
  "radius",
  "density",
  "period",
  "semiMajorAxis",
  "insolation",
  "surfaceGravity",
  "velocityAmplitude",
  "starDensity",
];

const masses = ["mass", "minimumMass"] as const;

/** `minimumMass` as people write it. */
const inWords = (quantity: QuantityName) => quantity.replace(/[A-Z]/g, (capital) => ` ${capital.toLowerCase()}`);

/** The confusions that planet lists are known for. */
export const unitSlips: readonly UnitSlip[] = [
  ...masses.flatMap((quantity) => [
    ...bothWays(
      quantity,
      JUPITER_MASS / EARTH_MASS,
      `${inWords(quantity)} is in Jupiter masses and was read as Earth masses`,
      `${inWords(quantity)} is in Earth masses and was read as Jupiter masses`,
    ),
    ...bothWays(
      quantity,
      SUN_MASS / JUPITER_MASS,
      `${inWords(quantity)} is in solar masses and was read as Jupiter masses`,
      `${inWords(quantity)} is in Jupiter masses and was read as solar masses`,
    ),
  ]),
  ...bothWays(
    "radius",
    JUPITER_RADIUS / EARTH_RADIUS,
    "radius is in Jupiter radii and was read as Earth radii",
    "radius is in Earth radii and was read as Jupiter radii",
  ),
  ...bothWays(
    "radius",
    SUN_RADIUS / JUPITER_RADIUS,
    "radius is in solar radii and was read as Jupiter radii",
    "radius is in Jupiter radii and was read as solar radii",
  ),
  ...bothWays(
    "period",
    2 * Math.PI,
    "period is one radian of the orbit, not a revolution (2π)",
    "period is 2π times too long",
  ),
  ...bothWays("period", 24, "period is in days and was read as hours", "period is in hours and was read as days"),
  ...bothWays("period", 365.25, "period is in years and was read as days", "period is in days and was read as years"),
  ...bothWays(
    "surfaceGravity",
    100,
    "surface gravity is in m/s² and was read as cm/s²",
    "surface gravity is in cm/s² and was read as m/s²",
  ),
  ...thousandfold.flatMap((quantity) =>
    bothWays(
      quantity,
      1000,
      `${inWords(quantity)} is a factor 1000 too small`,
      `${inWords(quantity)} is a factor 1000 too large`,
    ),
  ),
];
