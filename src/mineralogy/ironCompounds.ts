import type { Source } from "../eos/material.ts";
import { powerLawGruneisen } from "../eos/thermal/gruneisenLaw.ts";
import type { IsothermBasedEos } from "../eos/thermal/isothermBasedEos.ts";
import { debyeSolid } from "./endMember.ts";

/** Solid compound of iron with one light element, as published. */
export interface IronCompound {
  readonly formula: string;
  readonly volumeCm3PerMol: number;
  readonly bulkModulusGPa: number;
  readonly bulkModulusPrime: number;
  /** Left out where none is published here; the lattice of iron then stands in. */
  readonly vibrations?: { readonly debyeTemperatureK: number; readonly gammaZero: number; readonly q: number };
  readonly source: Source;
}

/** hcp iron of Fei et al. 2016, Geophys. Res. Lett. 43, 6837 (from memory). */
const IRON_VIBRATIONS = { debyeTemperatureK: 422, gammaZero: 1.74, q: 0.78 };

/** The carriers of the light elements in an alloy by additive volumes. */
export const ironCompounds = {
  sulphur: {
    formula: "FeS",
    volumeCm3PerMol: 17.795,
    bulkModulusGPa: 54,
    bulkModulusPrime: 4,
    source: {
      citation: "Fei et al. 1995, Science 268, 1892 (FeS IV)",
      note: "from memory, density 4940 kg/m³ at zero pressure; no thermal parameters: those of iron stand in",
    },
  },
  silicon: {
    formula: "FeSi",
    volumeCm3PerMol: 12.828,
    bulkModulusGPa: 230.6,
    bulkModulusPrime: 4.17,
    vibrations: { debyeTemperatureK: 417, gammaZero: 1.3, q: 1.7 },
    source: {
      citation: "Fischer et al. 2014, J. Geophys. Res. Solid Earth 119, 2810 (B2)",
      note: "from memory, low confidence",
    },
  },
  oxygen: {
    formula: "FeO",
    volumeCm3PerMol: 12.256,
    bulkModulusGPa: 149.4,
    bulkModulusPrime: 3.6,
    vibrations: { debyeTemperatureK: 417, gammaZero: 1.41, q: 0.5 },
    source: {
      citation: "Fischer et al. 2011, Earth Planet. Sci. Lett. 304, 496 (B1)",
      note: "from memory; Stixrude & Lithgow-Bertelloni 2011 have K0 = 179.4 GPa",
    },
  },
} as const satisfies Record<string, IronCompound>;

/** Third-order Birch–Murnaghan isotherm at 300 K with Debye vibrations and a power law for γ. */
export function ironCompoundEos(compound: IronCompound): IsothermBasedEos {
  const { debyeTemperatureK, gammaZero, q } = compound.vibrations ?? IRON_VIBRATIONS;
  return debyeSolid(compound, debyeTemperatureK, powerLawGruneisen(gammaZero, q));
}
