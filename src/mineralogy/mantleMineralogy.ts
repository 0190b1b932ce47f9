import { InputError } from "../errors.ts";
import type { EndMember } from "./endMember.ts";
import { molarMass } from "./formula.ts";
import { magnesiumAtoms } from "./ironAnalogues.ts";
import { type MantleDomain, mantleDomains, type SolidSolution } from "./mantleDomains.ts";

/** A mantle in the system MgO–FeO–SiO2, by numbers of atoms. */
export interface MantleComposition {
  /** Mg/Si. */
  readonly magnesiumToSilicon: number;
  /** Fe/(Mg + Fe), 0 for an iron-free mantle; the same in every mineral. */
  readonly ironNumber: number;
}

export interface MineralFraction {
  readonly endMember: EndMember;
  readonly massFraction: number;
}

/** The minerals of one domain of pressure. */
export interface Assemblage {
  readonly domain: MantleDomain;
  /** Only what is present; mass fractions sum to 1. */
  readonly minerals: readonly MineralFraction[];
}

/**
 * Minerals of a mantle in each of its domains, from shallow to deep, by mass balance in closed form. With
 * M = Mg + Fe and r = M/Si, per atom of silicon:
 *   r < 1        r MSiO3 + (1 - r) SiO2
 *   1 <= r <= 2  (r - 1) M2SiO4 + (2 - r) MSiO3
 *   r > 2        M2SiO4 + (r - 2) MO
 * and M2SiO4 = MSiO3 + MO where no such mineral is stable.
 * Range   any Mg/Si above 0, iron number from 0 to below 1; aluminium and calcium are left out
 * Throws  InputError `mantle-composition`
 * Checked test/mineralogy/mantleMineralogy.test.ts
 */
export function mantleMineralogy(composition: MantleComposition): Assemblage[] {
  const { magnesiumToSilicon, ironNumber } = composition;
  if (!(magnesiumToSilicon > 0 && magnesiumToSilicon < Number.POSITIVE_INFINITY)) {
    throw new InputError("mantle-composition", `Mg/Si is ${magnesiumToSilicon}; it must be a number above 0.`, {
      found: String(magnesiumToSilicon),
    });
  }
  if (!(ironNumber >= 0 && ironNumber < 1)) {
    throw new InputError(
      "mantle-composition",
      `The mantle's iron number Fe/(Mg + Fe) is ${ironNumber}; it must be at least 0 and below 1.`,
      { found: String(ironNumber) },
    );
  }
  const cations = magnesiumToSilicon / (1 - ironNumber);
  return mantleDomains.map((domain) => ({ domain, minerals: assemble(domain, cations, ironNumber) }));
}

function assemble(domain: MantleDomain, cations: number, ironNumber: number): MineralFraction[] {
  const { olivine, pyroxene, oxide, silica } = domain;
  const orthosilicate = olivine === undefined ? 0 : Math.min(Math.max(cations - 1, 0), 1);
  const metasilicate = Math.min(cations, 1) - orthosilicate;
  const minerals = [
    ...(olivine ? split(olivine, 2 * orthosilicate, ironNumber) : []),
    ...split(pyroxene, metasilicate, ironNumber),
    ...split(oxide, Math.max(cations - 2 * orthosilicate - metasilicate, 0), ironNumber),
    { endMember: silica, mass: Math.max(1 - cations, 0) * molarMass(silica.formula) },
  ].filter(({ mass }) => mass > 0);
  const total = minerals.reduce((sum, { mass }) => sum + mass, 0);
  return minerals.map(({ endMember, mass }) => ({ endMember, massFraction: mass / total }));
}

/** The end members of a solid solution that holds this many atoms of Mg + Fe. */
function split({ magnesium, iron }: SolidSolution, cations: number, ironNumber: number) {
  const formulaUnits = cations / magnesiumAtoms(magnesium);
  return [
    { endMember: magnesium, mass: formulaUnits * (1 - ironNumber) * molarMass(magnesium.formula) },
    { endMember: iron, mass: formulaUnits * ironNumber * molarMass(iron.formula) },
  ];
}
