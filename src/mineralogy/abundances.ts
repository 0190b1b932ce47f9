import { InputError } from "../errors.ts";
import { type LogNumber, type SolarScaleName, solarScales } from "./solarScales.ts";

/** Numbers of atoms of the elements of a star or planet, up to a common factor; errors independent. */
export type Abundances = Readonly<Record<string, LogNumber>>;

/** Elements that become rock or metal here; more would be read but not used. */
const USED = ["Mg", "Si", "Fe", "Al", "Ca", "Ni", "S"];

/** `Fe/Mg=0.81` or `[Fe/H]=0.05`, either with an optional `+-0.03`. */
const RATIO = /^([A-Z][a-z]?)\/Mg=([^+±]+)(?:(?:\+-|±)(.+))?$/;
const DEX = /^\[([A-Z][a-z]?)\/H\]=(.+?)(?:(?:\+-|±)(.+))?$/;

/** The Sun itself on one of the scales. */
export function solarAbundances(scale: SolarScaleName): Abundances {
  return solarScales[scale].elements;
}

/**
 * Reads abundances from text: number ratios to magnesium, `Fe/Mg=0.81+-0.04,Si/Mg=0.91`, or logarithms relative to a
 * named solar scale, `[Fe/H]=0.05+-0.03,[Mg/H]=0.1,[Si/H]=0.02`, which needs that scale. Not both.
 * Throws  InputError `abundances`
 * Checked test/mineralogy/abundances.test.ts
 */
export function parseAbundances(text: string, scale?: SolarScaleName): Abundances {
  const entries = text.split(",").map((entry) => entry.trim());
  const logarithmic = entries.some((entry) => entry.startsWith("["));
  if (logarithmic && scale === undefined) {
    throw refuse(text, `Name the solar scale they refer to: ${Object.keys(solarScales).join(", ")}.`);
  }
  const abundances: Record<string, LogNumber> = logarithmic ? {} : { Mg: { logNumber: 0, sigma: 0 } };
  for (const entry of entries) {
    const [element, number] = scale !== undefined && logarithmic ? readDex(entry, scale) : readRatio(entry);
    if (!USED.includes(element)) throw refuse(entry, `Give ${USED.join(", ")}; ${element} is not used.`);
    if (element in abundances) throw refuse(entry, `Give every element once; ${element} has its value already.`);
    abundances[element] = number;
  }
  for (const element of ["Mg", "Si", "Fe"]) {
    if (!(element in abundances)) throw refuse(text, `Add ${element}, without which there is no planet to build.`);
  }
  return abundances;
}

/** These abundances with elements they lack, in the Sun's proportion to magnesium; its errors are left out. */
export function withSolarProportions(abundances: Abundances, elements: readonly string[]): Abundances {
  const sun = solarAbundances("asplund2021");
  const added = elements.map((element): [string, LogNumber] => {
    const logNumber = abundances.Mg.logNumber + sun[element].logNumber - sun.Mg.logNumber;
    return [element, { logNumber, sigma: 0 }];
  });
  return { ...Object.fromEntries(added), ...abundances };
}

/** Only these elements of the abundances. */
export function pick(abundances: Abundances, elements: readonly string[]): Abundances {
  return Object.fromEntries(Object.entries(abundances).filter(([element]) => elements.includes(element)));
}

function readRatio(entry: string): [string, LogNumber] {
  const [, element, value, error = "0"] = RATIO.exec(entry) ?? [];
  const [ratio, sigma] = [Number(value), Number(error)];
  if (element === undefined || !(ratio > 0 && ratio < 1e6) || !(sigma >= 0 && sigma < ratio)) {
    throw refuse(entry, "Write a number ratio to magnesium like Fe/Mg=0.81+-0.04, its error smaller than itself.");
  }
  return [element, { logNumber: Math.log10(ratio), sigma: sigma / (ratio * Math.LN10) }];
}

function readDex(entry: string, scale: SolarScaleName): [string, LogNumber] {
  const [, element, value, error = "0"] = DEX.exec(entry) ?? [];
  const [excess, sigma] = [Number(value), Number(error)];
  if (element === undefined || !(Math.abs(excess) < 5) || !(sigma >= 0 && sigma < 5)) {
    throw refuse(entry, "Write a logarithm relative to the Sun like [Fe/H]=0.05+-0.03, in dex.");
  }
  const sun: LogNumber | undefined = solarAbundances(scale)[element];
  if (sun === undefined) throw refuse(entry, `The scale ${scale} has no ${element} here; use asplund2021.`);
  return [element, { logNumber: sun.logNumber + excess, sigma }];
}

function refuse(found: string, remedy: string): InputError {
  return new InputError("abundances", `The abundances "${found}" cannot be used.`, { found, remedy });
}
