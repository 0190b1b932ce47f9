import { ModelRangeError } from "../errors.ts";
import { EARTH_FLUX, EARTH_MASS, EARTH_RADIUS, GIGAYEAR } from "../units/constants.ts";

/** What sets the size of a hydrogen–helium envelope besides its mass fraction. SI. */
export interface EnvelopeConditions {
  /** Mass of the whole planet [kg]. */
  readonly planetMass: number;
  /** Flux received from the star [W m^-2]. */
  readonly flux: number;
  /** [s] */
  readonly age: number;
  /** Opacity of the atmosphere, which sets how fast it cools: that of a solar mixture, or enhanced by metals. */
  readonly opacity: "solar" | "enhanced";
}

const FRACTION_EXPONENT = 0.59;
/** The second from memory. */
const AGE_EXPONENT = { enhanced: -0.18, solar: -0.11 } as const;

/** What the grid of models behind the scaling covers: Lopez & Fortney 2014, section 2. */
const grid = {
  planetMass: { unit: "Earth masses", scale: EARTH_MASS, minimum: 1, maximum: 20 },
  flux: { unit: "times the Earth's flux", scale: EARTH_FLUX, minimum: 0.1, maximum: 1000 },
  age: { unit: "Gyr", scale: GIGAYEAR, minimum: 0.1, maximum: 10 },
  massFraction: { unit: "% of the planet's mass", scale: 0.01, minimum: 0.01, maximum: 20 },
} as const;

/**
 * Thickness of a hydrogen–helium envelope [m], from the rocky surface to the radiative–convective boundary.
 * Formula R_env = 2.06 R⊕ (M/M⊕)^-0.21 (f/5 %)^0.59 (F/F⊕)^0.044 (age/5 Gyr)^-0.18, age exponent -0.11 at solar opacity
 * Source  Lopez & Fortney 2014, Astrophys. J. 792, 1, equation 4, doi:10.1088/0004-637X/792/1/1
 * Range   1-20 M⊕, f 0.01-20 %, 0.1-1000 F⊕, 0.1-10 Gyr; f is of the whole planet's mass
 * Throws  ModelRangeError `envelope-grid`
 * Checked test/envelope/lopezFortney.test.ts
 */
export function envelopeThickness(massFraction: number, conditions: EnvelopeConditions): number {
  requireGrid("massFraction", massFraction);
  return thicknessAtFivePercent(conditions) * (massFraction / 0.05) ** FRACTION_EXPONENT;
}

/** The envelope's share of the planet's mass that gives this thickness [m]; the inverse, with the same range. */
export function massFractionOfThickness(thickness: number, conditions: EnvelopeConditions): number {
  const massFraction = 0.05 * (thickness / thicknessAtFivePercent(conditions)) ** (1 / FRACTION_EXPONENT);
  requireGrid("massFraction", massFraction);
  return massFraction;
}

function thicknessAtFivePercent({ planetMass, flux, age, opacity }: EnvelopeConditions): number {
  requireGrid("planetMass", planetMass);
  requireGrid("flux", flux);
  requireGrid("age", age);
  return (
    2.06 *
    EARTH_RADIUS *
    (planetMass / EARTH_MASS) ** -0.21 *
    (flux / EARTH_FLUX) ** 0.044 *
    (age / (5 * GIGAYEAR)) ** AGE_EXPONENT[opacity]
  );
}

function requireGrid(quantity: keyof typeof grid, value: number): void {
  const { unit, scale, minimum, maximum } = grid[quantity];
  // Limits count as inside although they rarely divide exactly.
  const scaled = value / scale;
  if (scaled >= minimum * (1 - 1e-12) && scaled <= maximum * (1 + 1e-12)) return;
  throw new ModelRangeError(
    "envelope-grid",
    `Gas envelope: ${quantity} is ${Number(scaled.toPrecision(6))} ${unit}; the models of Lopez & Fortney 2014 cover ${minimum} to ${maximum}.`,
    { quantity, value, minimum: minimum * scale, maximum: maximum * scale },
  );
}
