import { boundaryPressure, mantleBoundaries, postPerovskiteDissociation } from "../eos/melting/phaseBoundaries.ts";
import { GPA } from "../units/constants.ts";
import type { EndMember } from "./endMember.ts";
import { endMembers } from "./endMembers.ts";
import { ironAnalogues } from "./ironAnalogues.ts";

export interface SolidSolution {
  readonly magnesium: EndMember;
  readonly iron: EndMember;
}

/** A stretch of pressure with one set of minerals; silica is free only where (Mg + Fe)/Si < 1. */
export interface MantleDomain {
  readonly name: string;
  /** The M2SiO4 mineral; without one it is MSiO3 + MO. */
  readonly olivine?: SolidSolution;
  readonly pyroxene: SolidSolution;
  readonly oxide: SolidSolution;
  readonly silica: EndMember;
  /** Pressure at which the domain begins [Pa], at a temperature [K]. */
  readonly stableFrom: (temperature: number) => number;
  /** What a user of the domain should know. */
  readonly remark?: string;
}

const { forsterite, fayalite, mgWadsleyite, mgRingwoodite, feRingwoodite, enstatite, mgMajorite } = endMembers;
const { mgBridgmanite, feBridgmanite, mgPostPerovskite, fePostPerovskite, periclase, wustite } = endMembers;
const { coesite, stishovite, seifertite } = endMembers;
const { ferrosilite, feWadsleyite, feMajorite } = ironAnalogues;

const oxide: SolidSolution = { magnesium: periclase, iron: wustite };
const majorite: SolidSolution = { magnesium: mgMajorite, iron: feMajorite };

/**
 * The mantle from top to bottom. The transitions of M2SiO4 draw the lines for all minerals: pyroxene is taken to
 * become majorite with wadsleyite (in nature over 10 to 18 GPa) and silica to be coesite down to there (quartz below
 * about 2.5 GPa, stishovite from about 9 GPa).
 */
export const mantleDomains: readonly MantleDomain[] = [
  {
    name: "olivine",
    olivine: { magnesium: forsterite, iron: fayalite },
    pyroxene: { magnesium: enstatite, iron: ferrosilite },
    oxide,
    silica: coesite,
    stableFrom: () => 0,
  },
  {
    name: "wadsleyite",
    olivine: { magnesium: mgWadsleyite, iron: feWadsleyite },
    pyroxene: majorite,
    oxide,
    silica: stishovite,
    stableFrom: (temperature) => boundaryPressure(mantleBoundaries.olivineToWadsleyite, temperature),
  },
  {
    name: "ringwoodite",
    olivine: { magnesium: mgRingwoodite, iron: feRingwoodite },
    pyroxene: majorite,
    oxide,
    silica: stishovite,
    stableFrom: (temperature) => boundaryPressure(mantleBoundaries.wadsleyiteToRingwoodite, temperature),
  },
  {
    name: "bridgmanite",
    pyroxene: { magnesium: mgBridgmanite, iron: feBridgmanite },
    oxide,
    silica: stishovite,
    stableFrom: (temperature) => boundaryPressure(mantleBoundaries.ringwooditeToBridgmanite, temperature),
  },
  {
    name: "post-perovskite",
    pyroxene: { magnesium: mgPostPerovskite, iron: fePostPerovskite },
    oxide,
    silica: seifertite,
    stableFrom: (temperature) => boundaryPressure(mantleBoundaries.bridgmaniteToPostPerovskite, temperature),
    remark: `post-perovskite decomposes from ${postPerovskiteDissociation.toMgSi2O5 / GPA} GPa (Umemoto & Wentzcovitch 2011) and stands in for its products there`,
  },
];
