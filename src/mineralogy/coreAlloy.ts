import { type MixturePart, scaledEos, thermalMixture } from "../eos/thermal/thermalMixture.ts";
import type { ThermalEos } from "../eos/thermal/thermalState.ts";
import { InputError } from "../errors.ts";
import { molarMass } from "./formula.ts";
import { ironCompoundEos, ironCompounds } from "./ironCompounds.ts";

/** What a core holds besides iron. */
export type CoreAlloy =
  /** Mass fractions of the whole core; iron is the rest. */
  | {
      readonly kind: "elements";
      readonly nickel: number;
      readonly sulphur: number;
      readonly silicon: number;
      readonly oxygen: number;
    }
  /** A density lower than iron's by this fraction at every pressure and temperature. */
  | {
      readonly kind: "density-deficit";
      readonly deficit: number;
      /** Whether the deficit was read off the Earth's seismic density, which then cannot confirm it. */
      readonly derivedFromPrem: boolean;
    };

/** Nickel is taken to sit on iron's sites: same volume per atom, heavier atoms. */
const NICKEL_OVER_IRON = molarMass("Ni") / molarMass("Fe");

/**
 * Equation of state of an iron alloy, from that of pure iron (solid or liquid).
 * Formula elements: S, Si and O take iron along as FeS, FeSi and FeO, whose volumes add to those of nickel and the
 *         iron left over; the compounds are solids even in a liquid core, where their volume of melting is missed
 * Throws  InputError `core-alloy` for fractions that are negative or need more iron than there is
 * Checked test/mineralogy/coreAlloy.test.ts
 */
export function coreAlloyEos(iron: ThermalEos, alloy: CoreAlloy): ThermalEos {
  if (alloy.kind === "density-deficit") {
    requireFraction("density deficit", alloy.deficit);
    return scaledEos(iron, 1 - alloy.deficit);
  }
  const fractions = alloyPhases(alloy);
  const parts: MixturePart[] = [
    { eos: iron, massFraction: fractions.iron },
    { eos: scaledEos(iron, NICKEL_OVER_IRON), massFraction: fractions.nickel },
    { eos: ironCompoundEos(ironCompounds.sulphur), massFraction: fractions.FeS },
    { eos: ironCompoundEos(ironCompounds.silicon), massFraction: fractions.FeSi },
    { eos: ironCompoundEos(ironCompounds.oxygen), massFraction: fractions.FeO },
  ];
  return thermalMixture(parts.filter(({ massFraction }) => massFraction > 0));
}

/**
 * Mass fractions of iron, nickel and the compounds that hold the given elements.
 * Checked test/mineralogy/coreAlloy.test.ts
 */
export function alloyPhases(alloy: CoreAlloy & { kind: "elements" }) {
  const { nickel, sulphur, silicon, oxygen } = alloy;
  for (const [name, value] of Object.entries({ nickel, sulphur, silicon, oxygen })) requireFraction(name, value);
  const ironMass = molarMass("Fe");
  const compound = (element: string, fraction: number): number => fraction * (1 + ironMass / molarMass(element));
  const compounds = { FeS: compound("S", sulphur), FeSi: compound("Si", silicon), FeO: compound("O", oxygen) };
  const iron = 1 - nickel - compounds.FeS - compounds.FeSi - compounds.FeO;
  if (!(iron >= 0)) {
    throw new InputError(
      "core-alloy",
      "The core's light elements need more iron than there is to form FeS, FeSi and FeO. Lower them.",
    );
  }
  return { iron, nickel, ...compounds };
}

function requireFraction(name: string, value: number): void {
  if (value >= 0 && value < 1) return;
  throw new InputError("core-alloy", `The core's ${name} is ${value}; it must be at least 0 and below 1.`, {
    found: String(value),
  });
}
