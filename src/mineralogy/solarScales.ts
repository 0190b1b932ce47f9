import type { Source } from "../eos/material.ts";

/** Logarithmic number of atoms, in dex, with its standard error. */
export interface LogNumber {
  readonly logNumber: number;
  readonly sigma: number;
}

/** A composition of the Sun: log10 of numbers of atoms, on the scale where hydrogen is 12. */
export interface SolarScale {
  readonly name: string;
  readonly source: Source;
  readonly elements: Readonly<Record<string, LogNumber>>;
}

const at = (logNumber: number, sigma: number): LogNumber => ({ logNumber, sigma });

/**
 * Solar compositions that stellar abundances in dex refer to; they differ by 0.09 dex in Mg.
 * Checked test/mineralogy/planetFromStar.test.ts
 */
export const solarScales = {
  asplund2021: {
    name: "asplund2021",
    source: {
      citation: "Asplund, Amarsi & Grevesse 2021, Astron. Astrophys. 653, A141, Table 2 (photosphere)",
      doi: "10.1051/0004-6361/202140445",
      note: "Ca and Ni from memory",
    },
    elements: {
      C: at(8.46, 0.04),
      O: at(8.69, 0.04),
      Mg: at(7.55, 0.03),
      Al: at(6.43, 0.03),
      Si: at(7.51, 0.03),
      S: at(7.12, 0.03),
      Ca: at(6.3, 0.03),
      Fe: at(7.46, 0.04),
      Ni: at(6.2, 0.04),
    },
  },
  asplund2009: {
    name: "asplund2009",
    source: {
      citation: "Asplund, Grevesse, Sauval & Scott 2009, Annu. Rev. Astron. Astrophys. 47, 481, Table 1 (photosphere)",
      doi: "10.1146/annurev.astro.46.060407.145222",
      note: "errors from memory",
    },
    elements: { Mg: at(7.6, 0.04), Si: at(7.51, 0.03), Fe: at(7.5, 0.04) },
  },
  lodders2003: {
    name: "lodders2003",
    source: {
      citation: "Lodders 2003, Astrophys. J. 591, 1220 (numbers of atoms per 10^6 Si)",
      doi: "10.1086/375492",
      note: "shifted so that Si is 7.54, its value there (from memory); only ratios matter",
    },
    elements: {
      Mg: at(7.54 + Math.log10(1.02), 0.02),
      Si: at(7.54, 0.02),
      Fe: at(7.54 + Math.log10(0.838), 0.03),
    },
  },
} as const satisfies Record<string, SolarScale>;

export type SolarScaleName = keyof typeof solarScales;
